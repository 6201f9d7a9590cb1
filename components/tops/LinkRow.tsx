import { StyleSheet, View } from 'react-native';

import { Icon } from '../ui/Icon';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';

export interface LinkRowProps {
  readonly title: string;
  /** What it is now. */
  readonly value: string;
  readonly onPress: () => void;
}

/** A row that leads to what it names. */
export function LinkRow({ title, value, onPress }: LinkRowProps) {
  return (
    <Press style={styles.row} hoverGround={color.chalkT} aria-label={`${title}, ${value}`} onPress={onPress}>
      <View style={styles.words}>
        <Text kind="label" hidden>
          {title}
        </Text>
        <Text kind="small" hidden>
          {value}
        </Text>
      </View>
      <Icon name="next" size={20} tone="ink2" />
    </Press>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 56,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
    outlineOffset: -3,
  },
  words: { flex: 1, minWidth: 0 },
});
