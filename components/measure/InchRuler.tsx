import { StyleSheet, View } from 'react-native';

import { splitLength, spokenLength } from '@/geometry/tape/format-length';
import { Press } from '../ui/Press';
import { color } from '../ui/tokens';
import { webStyle } from '../ui/web-style';

import { FractionParts } from './Fraction';
import { keepFocus } from './keep-focus';

export interface InchRulerProps {
  /** 1 to 15, or null. */
  readonly lit: number | null;
  readonly onMark: (sixteenths: number) => void;
  /** px of one row, 51 when left out. */
  readonly rowHeight?: number;
}

const ROWS = [
  [0, 1, 2, 3, 4, 5, 6, 7],
  [8, 9, 10, 11, 12, 13, 14, 15],
] as const;

/** One inch of tape in two rows of eight marks; each is a button. */
export function InchRuler({ lit, onMark, rowHeight = 51 }: InchRulerProps) {
  return (
    <View style={styles.rows} role="group" aria-label="One inch of tape">
      {ROWS.map((marks) => (
        <View key={marks[0]} style={[styles.row, { height: rowHeight }]}>
          {marks.map((mark) => (
            <Mark key={mark} mark={mark} lit={mark !== 0 && lit === mark} onPress={() => onMark(mark)} />
          ))}
        </View>
      ))}
    </View>
  );
}

function Mark({ mark, lit, onPress }: { readonly mark: number; readonly lit: boolean; readonly onPress: () => void }) {
  const { numerator, denominator } = splitLength(mark / 16, '1/16');
  const ink = lit ? 'tape' : 'tapeInk';
  return (
    <Press
      onPress={onPress}
      onMouseDown={keepFocus}
      aria-label={mark === 0 ? 'no fraction' : spokenLength(mark / 16, '1/16')}
      aria-pressed={lit}
      style={[styles.mark, lit && styles.lit]}
    >
      <View style={[styles.tick, tickOf(mark), { backgroundColor: color[ink] }]} />
      {mark === 0 ? (
        <FractionParts whole="0" size={20} tone={ink} bold />
      ) : (
        <FractionParts numerator={String(numerator)} denominator={String(denominator)} size={24} tone={ink} bold />
      )}
    </Press>
  );
}

/** Like on a tape: the longer the tick, the bigger the part. */
function tickOf(mark: number): { readonly width: number; readonly height: number } {
  if (mark % 8 === 0) return { width: 3, height: 11 };
  if (mark % 4 === 0) return { width: 3, height: 9 };
  if (mark % 2 === 0) return { width: 3, height: 6.5 };
  return { width: 2.5, height: 4 };
}

const styles = StyleSheet.create({
  rows: { gap: 5 },
  row: {
    flexDirection: 'row',
    backgroundColor: color.tape,
    borderWidth: 1.5,
    borderColor: color.tapeInk,
  },
  mark: { flex: 1, minWidth: 0, alignItems: 'center', justifyContent: 'center', paddingTop: 8 },
  lit: { backgroundColor: color.tapeInk },
  tick: { position: 'absolute', top: 0, ...webStyle({ left: '50%', transform: 'translateX(-50%)' }) },
});
