import { StyleSheet, View } from 'react-native';

import { Press } from './Press';
import { STAGES, type Stage } from './StageChip';
import { Text } from './Text';
import { color } from './tokens';
import { webStyle } from './web-style';

export interface StageRulerProps {
  /** How many jobs stand at each stage. */
  readonly counts: Readonly<Partial<Record<Stage, number>>>;
  /** Stages shown; without New when left out, as on the jobs list. */
  readonly stages?: readonly Stage[];
  /** The stage the list is narrowed to. */
  readonly chosen?: Stage | null;
  /** Narrows the list; pressing the chosen one again shows all. */
  readonly onChoose?: (stage: Stage | null) => void;
}

/** A ruler with one mark a stage and the number of jobs under it. */
export function StageRuler({ counts, stages = STAGES.slice(1), chosen = null, onChoose }: StageRulerProps) {
  return (
    <View style={styles.ruler} role="group" aria-label="Jobs by stage">
      {stages.map((stage) => {
        const count = counts[stage] ?? 0;
        const on = chosen === stage;
        const body = (
          <>
            <View style={[styles.ticks, ticks]} aria-hidden />
            <View style={styles.words}>
              <Text kind="sheetTitle" size={28} tone={on ? 'chalk' : 'ink'}>
                {String(count)}
              </Text>
              <Text kind="label" tone={on ? 'chalk' : 'ink'}>
                {stage}
              </Text>
            </View>
          </>
        );
        if (!onChoose) {
          return (
            <View key={stage} style={styles.part}>
              {body}
            </View>
          );
        }
        return (
          <Press
            key={stage}
            aria-label={`${count} ${stage}`}
            aria-pressed={on}
            onPress={() => onChoose(on ? null : stage)}
            hoverGround={color.chalkT}
            style={[styles.part, on && styles.on]}
          >
            {body}
          </Press>
        );
      })}
    </View>
  );
}

/** Short, middle and long ticks of a ruler, px apart and px long. */
const TICKS = [
  [8, 6],
  [16, 8],
  [32, 12],
  [64, 15],
] as const;

const ticks = webStyle({
  backgroundImage: TICKS.map(() => `linear-gradient(90deg, transparent calc(100% - 1.5px), ${color.ink2} 0)`).join(
    ', ',
  ),
  backgroundSize: TICKS.map(([every, long]) => `${every}px ${long}px`).join(', '),
  backgroundRepeat: 'repeat-x',
});

const styles = StyleSheet.create({
  ruler: { flexDirection: 'row', flexWrap: 'wrap' },
  part: {
    flexGrow: 1,
    flexBasis: 120,
    minHeight: 68,
    borderLeftWidth: 2,
    borderLeftColor: color.ink,
    outlineOffset: -3,
  },
  on: { backgroundColor: color.chalkT, borderLeftColor: color.chalk },
  ticks: { height: 16, marginRight: 14 },
  words: {
    flexDirection: 'row',
    alignItems: 'baseline',
    flexWrap: 'wrap',
    columnGap: 8,
    paddingLeft: 12,
    paddingTop: 8,
  },
});
