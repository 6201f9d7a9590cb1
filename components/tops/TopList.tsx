import { View } from 'react-native';

import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Text } from '../ui/Text';
import { LinkRow } from './LinkRow';
import { topName, topsOf } from './tops-choice';

/** Every run, island and strip, also those that could not be laid, with what is wrong about each. */
export function TopList({
  onChoose,
  onAdd,
}: {
  readonly onChoose: (name: string) => void;
  readonly onAdd: () => void;
}) {
  const { layout, plan, mayEdit } = useOpenJob();
  return (
    <View>
      {mayEdit && <Button label="Add a top" icon="plus" wide onPress={onAdd} />}
      <View role="list" aria-label="Tops">
        {topsOf(layout).map(({ id }) => {
          const problem = plan.tops.problems.find((p) => p.at.run === id);
          return (
            <View key={id} role="listitem">
              <LinkRow
                title={topName(layout, id)}
                value={problem?.message ?? sizeWords(layout, plan.pieces, id)}
                onPress={() => onChoose(`top ${id}`)}
              />
            </View>
          );
        })}
      </View>
      {topsOf(layout).length === 0 && <Text kind="second">Nothing is laid yet.</Text>}
    </View>
  );
}

type Job = ReturnType<typeof useOpenJob>;

/** "25 in deep, pieces Q, R". */
function sizeWords(layout: Job['layout'], pieces: Job['plan']['pieces'], id: string): string {
  const depth =
    layout.runs.find((r) => r.id === id)?.depth ??
    layout.islands.find((i) => i.id === id)?.depth ??
    layout.strips.find((s) => s.id === id)?.width;
  const letters = pieces.filter((piece) => piece.on === id).map((piece) => piece.letter);
  const size = depth === undefined ? '' : `${say(depth, layout.step)} deep`;
  return letters.length === 0
    ? `${size}, not laid`
    : `${size}, ${letters.length === 1 ? 'piece' : 'pieces'} ${letters.join(', ')}`;
}
