import { StyleSheet, View } from 'react-native';

import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { PieceLetter } from '../ui/PieceLetter';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { HoldButton } from './HoldButton';
import { pieceDifferences, sameOnTape, type PieceDifference } from './plan-differences';
import { useBefore, type BeforeWhat } from './use-before';

export interface ComparePanelProps {
  readonly what: BeforeWhat;
  readonly onWhat: (what: BeforeWhat) => void;
  readonly onHold: (held: boolean) => void;
}

/** Now against before: held, the drawing shows the tops as they were; below, what is different in numbers. */
export function ComparePanel({ what, onWhat, onHold }: ComparePanelProps) {
  const { plan, layout } = useOpenJob();
  const { revision, before } = useBefore(what, true);
  const differences = before ? pieceDifferences(before.plan, plan, layout.step) : [];
  return (
    <View style={styles.panel}>
      <Segmented
        label="Compare with"
        options={[
          { value: 'change', label: 'The last change' },
          {
            value: 'revision',
            label: revision === null ? 'No revision yet' : `Revision ${revision}`,
            disabled: revision === null,
          },
        ]}
        value={what}
        onChange={onWhat}
      />
      <HoldButton label={before ? 'Hold to see it' : 'Nothing to compare with'} disabled={!before} onHold={onHold} />
      {!before && what === 'change' && <Text kind="second">You have changed nothing yet that could be undone.</Text>}
      {before && (
        <>
          <Text kind="second">{`Now, against the tops ${before.words}.`}</Text>
          {differences.length === 0 ? (
            <Text kind="second">Every piece has the same size.</Text>
          ) : (
            <View role="list" aria-label="Pieces that differ">
              {differences.map((difference) => (
                <View key={`${difference.kind} ${difference.letter}`} role="listitem" style={styles.row}>
                  <PieceLetter letter={difference.letter} />
                  <View style={styles.words}>
                    <DifferenceWords difference={difference} />
                  </View>
                </View>
              ))}
            </View>
          )}
        </>
      )}
    </View>
  );
}

function DifferenceWords({ difference }: { readonly difference: PieceDifference }) {
  const { layout } = useOpenJob();
  const length = (inches: number) => say(inches, layout.step);
  if (difference.kind === 'gone') return <Text>gone</Text>;
  if (difference.kind === 'new')
    return <Text>{`new: back ${length(difference.back)}, front ${length(difference.front)}`}</Text>;
  const changed = (['back', 'front', 'depth'] as const).filter(
    (edge) => !sameOnTape(difference[edge][0], difference[edge][1], layout.step),
  );
  return (
    <>
      {changed.map((edge) => (
        <Text key={edge}>{`${edge} ${length(difference[edge][0])}, now ${length(difference[edge][1])}`}</Text>
      ))}
    </>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.m },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 48,
    paddingVertical: space.xs,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
  words: { flex: 1, minWidth: 0 },
});
