import { StyleSheet, View } from 'react-native';

import { wallLabel } from '@/geometry/core/layout';
import { toRadians } from '@/geometry/core/angle';
import { useOpenJob } from '../editor/JobProvider';
import { bearingOf, extend, lengthOf, traceEdit, type Sketch } from '../editor/tools/sketch';
import { Button } from '../ui/Button';
import { MoreMenu } from '../ui/Menu';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import type { Draw } from './use-draw';

/** Ways a new wall can leave the last one, for those who do not draw: degrees it turns to the right. */
const TURNS = [
  { label: 'Inside corner', degrees: 90 },
  { label: 'Bay, 135', degrees: 45 },
  { label: 'Outside corner', degrees: -90 },
  { label: 'Straight on', degrees: 0 },
] as const;

/** Length of a wall that is added by a button, inches; the tape finds the true one. */
const ADDED = 60;

/** Everything the drawing can do, as a list: add, break, move by arrows, take away, close, mirror. */
export function DrawPanel({ draw, onDone }: { readonly draw: Draw; readonly onDone: () => void }) {
  const { layout } = useOpenJob();
  const { sketch } = draw;
  const chosen = draw.state.selected?.startsWith('wall ') ? draw.state.selected.slice(5) : null;
  return (
    <View style={styles.panel}>
      <View aria-live="polite">
        <Text kind="sheetTitle" level={2}>
          Draw the walls
        </Text>
        <Text kind="second">{hint(draw)}</Text>
      </View>
      {!sketch.closed && sketch.walls.length > 0 && <AddWall sketch={sketch} />}
      <View role="list" aria-label="Walls as drawn">
        {sketch.walls.map((id, i) => (
          <View key={id} role="listitem" style={[styles.row, chosen === id && styles.on]}>
            <Press
              style={styles.name}
              hoverGround={color.chalkT}
              aria-pressed={chosen === id}
              onPress={() => draw.select(`wall ${id}`)}
            >
              <Text kind="strong">{`Wall ${wallLabel(i)}`}</Text>
              <Text kind="second">{`about ${Math.round(lengthOf(sketch, i))} in`}</Text>
            </Press>
            <MoreMenu
              label={`More for wall ${wallLabel(i)}`}
              items={[
                { key: 'split', label: 'Split in two', onPress: () => draw.breakWall(id, 'split') },
                {
                  key: 'corner',
                  label: 'Put in an outside corner',
                  icon: 'corner',
                  onPress: () => draw.breakWall(id, 'outside corner'),
                },
                { key: 'pipe', label: 'Put in a pipe column', onPress: () => draw.breakWall(id, 'pipe column') },
                {
                  key: 'bin',
                  label: takeAway(layout.bases.filter((base) => base.wall === id).length),
                  icon: 'bin',
                  danger: true,
                  onPress: () => draw.removeWall(id),
                },
              ]}
            />
          </View>
        ))}
      </View>
      <View style={styles.buttons}>
        {draw.ring && <Button label={draw.ring.label} onPress={draw.ring.act} />}
        {sketch.walls.length > 0 && <Button label="Mirror" icon="turn" onPress={draw.mirror} />}
      </View>
      {sketch.walls.length > 0 && (
        <Button label="Done drawing" look="primary" icon="check" wide height={56} onPress={onDone} />
      )}
    </View>
  );
}

const takeAway = (standing: number): string =>
  standing === 0 ? 'Take the wall away' : `Take the wall away, with ${standing} on it`;

function hint({ sketch, state }: Draw): string {
  if (sketch.walls.length === 0)
    return state.first
      ? 'Now tap where the first wall ends.'
      : 'Tap where the first wall begins, at your left, or drag along it.';
  if (sketch.closed) return 'Drag a corner or a wall. The tape decides in the end.';
  return 'Tap to add a wall from the open end. Drag a corner or a wall to move it.';
}

/** The next wall without drawing it. */
function AddWall({ sketch }: { readonly sketch: Sketch }) {
  const { run } = useOpenJob();
  const add = (degrees: number) => {
    const bearing = (bearingOf(sketch, sketch.walls.length - 1) ?? 0) - toRadians(degrees);
    const [x, y] = sketch.points.at(-1)!;
    const to = [x + ADDED * Math.cos(bearing), y + ADDED * Math.sin(bearing)] as const;
    run(traceEdit(extend(sketch, 'right', [Math.round(to[0]), Math.round(to[1])])), 'a wall');
  };
  return (
    <View style={styles.add}>
      <Text kind="label">Add a wall at the right</Text>
      <View style={styles.buttons} role="group" aria-label="Add a wall at the right">
        {TURNS.map(({ label, degrees }) => (
          <Button key={label} label={label} height={44} onPress={() => add(degrees)} />
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.m },
  row: { flexDirection: 'row', alignItems: 'center', borderBottomWidth: 1, borderBottomColor: color.line },
  on: { backgroundColor: color.chalkT },
  name: {
    flex: 1,
    minHeight: 52,
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    paddingHorizontal: space.s,
  },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
  add: { gap: space.s },
});
