import { StyleSheet, View } from 'react-native';

import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';

/** Stands where a job will be while its code or its layout is on the way. */
export function OpeningJob() {
  return (
    <View style={styles.page} role="status">
      <Text kind="second">Opening the job</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1, alignItems: 'center', justifyContent: 'center', padding: space.l, backgroundColor: color.paper },
});
