import { StyleSheet, View } from 'react-native';

import { Text } from './Text';
import { color } from './tokens';

/** How many findings wait; only for the eye, the words beside it say it too. */
export function CountDisc({ count }: { readonly count: number }) {
  return (
    <View style={styles.disc} aria-hidden>
      <Text kind="strong" tone="onchalk" size={13} align="center" tabular>
        {count > 99 ? '99+' : String(count)}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  disc: {
    minWidth: 20,
    height: 20,
    borderRadius: 10,
    paddingHorizontal: 4,
    alignItems: 'center',
    justifyContent: 'center',
    backgroundColor: color.red,
  },
});
