import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { useWorkPart } from './work-part';

export interface FactProps {
  readonly label: ReactNode;
  /** The figure: text, or a Fraction. */
  readonly value: ReactNode;
  readonly note?: ReactNode;
  /** Name of its line in 'Where from'. */
  readonly from?: string;
}

/** One figure with what it is, and the way to the line that says where it is from. */
export function Fact({ label, value, note, from }: FactProps) {
  return (
    <View style={styles.row}>
      <View style={styles.words}>
        <Text kind="label">{label}</Text>
        {note && <Text kind="small">{note}</Text>}
        {from && <FromLink line={from} />}
      </View>
      <View style={styles.value}>{typeof value === 'string' ? <Text kind="strong">{value}</Text> : value}</View>
    </View>
  );
}

/** Leads to a line of 'Where from'. */
export function FromLink({ line, label = 'Where from' }: { readonly line: string; readonly label?: string }) {
  const { showLine } = useWorkPart();
  return (
    <Press
      onPress={() => showLine(line)}
      aria-label={`Where from: ${line}`}
      style={styles.from}
      hitSlop={{ top: 6, bottom: 6 }}
    >
      <Text kind="small" tone="chalk" style={styles.line}>
        {label}
      </Text>
    </Press>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 56,
    paddingVertical: space.xs,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
  words: { flex: 1, minWidth: 0 },
  value: { flexShrink: 0, maxWidth: '55%', alignItems: 'flex-end' },
  from: { alignSelf: 'flex-start', minHeight: 44, minWidth: 44, justifyContent: 'center' },
  line: { textDecorationLine: 'underline' },
});
