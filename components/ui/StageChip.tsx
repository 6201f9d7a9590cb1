import { StyleSheet, View } from 'react-native';

import { Text } from './Text';
import { color } from './tokens';

/** The stages of a job in order. */
export const STAGES = ['New', 'Measured', 'Drawn', 'Signed off', 'Cut', 'Fitted'] as const;

export type Stage = (typeof STAGES)[number];

/** px of the five bars, rising. */
const HEIGHTS = [10, 12, 14, 17, 20] as const;

/** How far a job is: five rising bars and the word. */
export function StageChip({ stage }: { readonly stage: Stage }) {
  const reached = STAGES.indexOf(stage);
  return (
    <View style={styles.chip}>
      <View style={styles.bars} aria-hidden>
        {HEIGHTS.map((height, index) => (
          <View key={height} style={[styles.bar, { height }, index < reached && styles.done]} />
        ))}
      </View>
      <Text kind="label">{stage}</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  chip: { flexDirection: 'row', alignItems: 'center', gap: 10 },
  bars: { flexDirection: 'row', alignItems: 'flex-end', gap: 3 },
  bar: { width: 10, borderWidth: 1.5, borderColor: color.edge },
  done: { backgroundColor: color.chalk, borderColor: color.chalk },
});
