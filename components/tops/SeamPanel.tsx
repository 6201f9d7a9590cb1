import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';

import { seamAlternatives } from '@/geometry/seams/seam-alternatives';
import { inches as say } from '@/geometry/top/sentence';
import { solvedRoom } from '@/geometry/top/solved-room';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { TapeBlade } from '../measure/TapeBlade';
import { Button } from '../ui/Button';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import { LinkRow } from './LinkRow';
import { wallLength } from './length-checks';
import { topName, wallName } from './tops-choice';
import { useTopsPad } from './tops-pad';
import { seamEdit } from './use-tops-drag';

const NUDGE = 1 / 16;
/** Two places nearer than this are one, inches. */
const SAME = 1 / 64;

/** Where a seam is, how much of it shows, and how to move it without dragging. */
export function SeamPanel({ letters }: { readonly letters: readonly [string, string] }) {
  const { plan, layout, run, mayEdit } = useOpenJob();
  const open = useTopsPad();
  const seam = plan.seams.find((s) => s.letters.join() === letters.join());
  if (!seam) return null;
  const pin = layout.seams.find((p) => p.on === seam.on && Math.abs(p.at - seam.at) < SAME);
  const sink = layout.cutouts.find((cutout) => cutout.on === seam.on && cutout.kind === 'sink');
  const move = (at: number) => {
    const { edit, label } = seamEdit(pin?.at ?? null, seam.on, at, say(at, layout.step));
    run(edit, label);
  };
  const wall = layout.runs.find((r) => r.id === seam.on)?.wall;
  const length = wall === undefined ? null : wallLength(plan, wall);
  const check = (at: number): string | null => {
    if (length !== null && at >= length)
      return `Wall ${wallName(layout, wall!)} is ${say(length, layout.step)} long; the seam has to lie on it.`;
    return at > 0 ? null : 'The seam has to lie on its run.';
  };
  const step = layout.step;
  const movable = mayEdit && !seam.edge;
  const hidden = seam.inCutout ? 'The rest falls in the cutout.' : 'All of it shows.';
  const from =
    wall === undefined ? 'from the island’s left end' : `from the left end of wall ${wallName(layout, wall)}`;
  const title = `Seam ${letters.join(' to ')}, ${from}`;
  return (
    <View style={styles.panel}>
      {movable && sink && (
        <Button
          label="Sink centre"
          icon={Math.abs(sink.centre - seam.at) < SAME ? 'check' : 'sink'}
          pressed={Math.abs(sink.centre - seam.at) < SAME}
          onPress={() => move(sink.centre)}
        />
      )}
      <View style={styles.nudges}>
        {movable && <Nudge sign="−" spoken="One sixteenth to the left" onPress={() => move(seam.at - NUDGE)} />}
        <View style={styles.grow}>
          <TapeBlade
            inches={seam.at}
            step={step}
            name={title}
            height={60}
            hook={movable}
            onPress={movable ? () => open({ title, now: seam.at, check, onLength: move }) : undefined}
          />
        </View>
        {movable && <Nudge sign="+" spoken="One sixteenth to the right" onPress={() => move(seam.at + NUDGE)} />}
      </View>
      <Text kind="second" align="center">
        {seam.edge ? 'along the grain, from the front edge' : from}
      </Text>
      <View style={styles.visible} role="status">
        <View style={styles.grow}>
          <Text kind="label">Visible seam</Text>
          <Text kind="small">{`${hidden} ${topName(layout, seam.on)}.`}</Text>
        </View>
        <Fraction inches={seam.visible} step={step} bold size={24} />
      </View>
      {mayEdit && !seam.edge && (
        <>
          {pin ? (
            <Button
              label="Let the seam find its own place"
              wide
              onPress={() => run({ kind: 'unpinSeam', on: pin.on, at: pin.at }, 'seam let go')}
            />
          ) : (
            <Text kind="small">This place was worked out. Moving it pins it.</Text>
          )}
          <OtherPlaces
            on={seam.on}
            at={seam.at}
            single={plan.seams.filter((s) => s.on === seam.on).length === 1}
            onMove={move}
          />
        </>
      )}
    </View>
  );
}

function Nudge({
  sign,
  spoken,
  onPress,
}: {
  readonly sign: string;
  readonly spoken: string;
  readonly onPress: () => void;
}) {
  return (
    <Press style={styles.nudge} hoverGround={color.chalkT} aria-label={spoken} onPress={onPress}>
      <Text kind="strong" size={20} hidden>
        {sign}
      </Text>
      <Fraction inches={NUDGE} step="1/16" size={20} unit={false} silent bold />
    </Press>
  );
}

/** Other places the shop's limits allow, with what each would show. Only where one seam parts the run: others move together. */
function OtherPlaces(props: {
  readonly on: string;
  readonly at: number;
  readonly single: boolean;
  readonly onMove: (at: number) => void;
}) {
  const { plan, layout, settings } = useOpenJob();
  const { on, at, single } = props;
  const sets = useMemo(
    () =>
      plan.room && single
        ? seamAlternatives(
            { ...layout, seams: layout.seams.filter((p) => p.on !== on) },
            solvedRoom(plan.room, layout.room),
            settings,
          )
        : [],
    [plan.room, layout, settings, on, single],
  );
  const others = apart(sets.flatMap((set) => (set.on === on && set.at.length === 1 ? [{ at: set.at[0]!, visible: set.visible }] : [])), at); // prettier-ignore
  if (others.length === 0) return null;
  return (
    <View>
      <Text kind="rowTitle" level={3}>
        Other places
      </Text>
      {others.map((set) => (
        <LinkRow
          key={set.at}
          title={`At ${say(set.at, layout.step)}`}
          value={`${say(set.visible, layout.step)} would show`}
          onPress={() => props.onMove(set.at)}
        />
      ))}
    </View>
  );
}

/** At most four places, none within 3 in of where the seam is or of a better one. */
function apart<T extends { readonly at: number }>(places: readonly T[], now: number): T[] {
  const kept: T[] = [];
  for (const place of places) {
    if ([now, ...kept.map((k) => k.at)].every((at) => Math.abs(at - place.at) >= 3)) kept.push(place);
  }
  return kept.slice(0, 4);
}

const styles = StyleSheet.create({
  panel: { gap: space.m },
  nudges: { flexDirection: 'row', alignItems: 'center', gap: space.s },
  nudge: {
    width: 64,
    minHeight: 60,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: space.s,
    borderWidth: 1.5,
    borderColor: color.ink,
    borderRadius: radius.control,
    backgroundColor: color.card,
  },
  grow: { flex: 1, minWidth: 0 },
  visible: { flexDirection: 'row', alignItems: 'center', gap: space.m },
});
