import { StyleSheet, View } from 'react-native';

import type { Reading } from '@/geometry/core/layout';
import { useOpenJob } from '../editor/JobProvider';
import { CornerBadge } from '../measure/CornerBadge';
import { Fraction } from '../measure/Fraction';
import { LengthField } from '../measure/LengthField';
import { TapeBlade } from '../measure/TapeBlade';
import { Button } from '../ui/Button';
import { Icon } from '../ui/Icon';
import { IconButton } from '../ui/IconButton';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { BowPanel } from './BowPanel';
import { NoteButton } from './NoteButton';
import { observationOf, targetName, type Target } from './tape-walk';
import type { RoomView } from './use-room-view';
import { WallBases } from './WallBases';

/** What is selected on the drawing: its readings, and for a wall what stands along it. */
export function SelectedPanel({ view, target }: { readonly view: RoomView; readonly target: Target }) {
  const { layout, mayEdit } = useOpenJob();
  return (
    <View style={styles.panel}>
      <View style={styles.title}>
        <View style={styles.grow}>
          <Text kind="sheetTitle" level={2}>
            {targetName(layout, target)}
          </Text>
        </View>
        {target.kind === 'wall' && <TapedTimes wall={target.wall} />}
        <IconButton icon="close" label="Back to the report" onPress={() => view.select(null)} />
      </View>
      {target.kind === 'wall' && <WallReadings view={view} target={target} />}
      {target.kind === 'corner' && <CornerReadings view={view} target={target} />}
      {target.kind === 'tie' && <TieReading view={view} target={target} />}
      {mayEdit && <TrustChoice target={target} />}
      {target.kind === 'wall' && <WallShape view={view} wall={target.wall} />}
      {target.kind === 'wall' && <WallBases view={view} wall={target.wall} />}
      {mayEdit && <NoteButton target={target} />}
    </View>
  );
}

/** How the wall itself is: its bow, and whether it leans. */
function WallShape({ view, wall: id }: { readonly view: RoomView; readonly wall: string }) {
  const { layout, run, mayEdit } = useOpenJob();
  const wall = layout.room.walls.find((w) => w.id === id)!;
  const name = targetName(layout, { kind: 'wall', wall: id }).toLowerCase();
  return (
    <>
      <BowPanel view={view} wall={wall} />
      <LengthField
        label="Out of plumb, in one foot of height"
        hint="Plus leans away from the room, minus into it."
        value={wall.outOfPlumb ?? null}
        step={layout.step}
        signed
        disabled={!mayEdit}
        check={(lean) => (Math.abs(lean) > 6 ? 'A wall does not lean over 6 in in one foot.' : null)}
        onLength={(outOfPlumb) => run({ kind: 'setPlumb', wall: id, outOfPlumb }, `${name}, out of plumb`)}
      />
    </>
  );
}

interface PanelProps<T extends Target> {
  readonly view: RoomView;
  readonly target: T;
}

function WallReadings({ view, target }: PanelProps<Extract<Target, { kind: 'wall' }>>) {
  const { layout, plan, run, mayEdit } = useOpenJob();
  const wall = layout.room.walls.find((w) => w.id === target.wall)!;
  const name = targetName(layout, target);
  const fit = plan.room?.walls.find((w) => w.id === target.wall);
  return (
    <>
      <TapeBlade
        inches={wall.length[0]?.value ?? null}
        step={layout.step}
        name={name}
        height={56}
        state={wall.length.length > 1 ? 'twice' : 'set'}
        onPress={mayEdit ? () => view.open(target) : undefined}
      />
      {wall.length.map((reading, index) => (
        <View key={index} style={styles.row}>
          <View style={styles.grow}>
            <Text kind="label">{`${ordinal(index)} tape${whoWhen(reading)}`}</Text>
          </View>
          <Fraction inches={reading.value} step={layout.step} />
          {mayEdit && (
            <IconButton
              icon="pencil"
              label={`Replace the ${ordinal(index).toLowerCase()} tape of ${name.toLowerCase()}`}
              onPress={() => view.open(target, index)}
            />
          )}
          {mayEdit && (
            <IconButton
              icon="bin"
              label={`Take away the ${ordinal(index).toLowerCase()} tape of ${name.toLowerCase()}`}
              onPress={() =>
                run({ kind: 'removeReading', wall: wall.id, index }, `${name.toLowerCase()}, ${reading.text}`)
              }
            />
          )}
        </View>
      ))}
      {fit && wall.length.length > 0 && (
        <View style={styles.row}>
          <View style={styles.grow}>
            <Text kind="label">The room says</Text>
          </View>
          <Fraction inches={fit.adjusted} step={layout.step.endsWith('mm') ? layout.step : '1/32'} />
        </View>
      )}
      {mayEdit && (
        <Button
          label={wall.length.length > 0 ? 'Tape it again' : 'Tape it'}
          icon="tape"
          wide
          onPress={() => view.open(target)}
        />
      )}
    </>
  );
}

function CornerReadings({ view, target }: PanelProps<Extract<Target, { kind: 'corner' }>>) {
  const { layout, plan, run, mayEdit } = useOpenJob();
  const same = (c: { readonly between: readonly string[] }) => c.between.join() === target.between.join();
  const corner = layout.room.corners.find(same);
  const fit = plan.room?.corners.find(same);
  const name = targetName(layout, target);
  const checked = corner?.triangle !== undefined || corner?.angle !== undefined;
  return (
    <>
      <CornerBadge
        corner={name.replace('Corner ', '')}
        angleDeg={fit?.measured ? fit.angleDeg : null}
        nominalDeg={corner?.nominal}
        onPress={mayEdit ? () => view.open(target) : undefined}
      />
      <Text kind="second">
        {corner?.triangle
          ? `Marks at ${corner.triangle.a.text} and ${corner.triangle.b.text}, tape ${corner.triangle.c.text}.`
          : corner?.angle !== undefined
            ? `Protractor: ${corner.angle} degrees.`
            : `Drawn at ${corner?.nominal ?? 90} degrees. A guess until it is checked.`}
      </Text>
      {fit?.measured && <Text kind="second">{`Known to ${fit.sdDeg.toFixed(2)} degrees.`}</Text>}
      {mayEdit && (
        <Button
          label={checked ? 'Check it again' : 'Check the corner'}
          icon="corner"
          wide
          onPress={() => view.open(target)}
        />
      )}
      {mayEdit && checked && (
        <Button
          label="Take the check away"
          look="danger"
          wide
          onPress={() => run({ kind: 'clearCorner', between: target.between }, name.toLowerCase())}
        />
      )}
    </>
  );
}

function TieReading({ view, target }: PanelProps<Extract<Target, { kind: 'tie' }>>) {
  const { layout, run, mayEdit } = useOpenJob();
  const tie = layout.room.ties.find((t) => t.id === target.id);
  const name = targetName(layout, target);
  return (
    <>
      <TapeBlade
        inches={tie?.length.value ?? null}
        step={layout.step}
        name={name}
        height={56}
        onPress={mayEdit ? () => view.open(target) : undefined}
      />
      {mayEdit && tie && (
        <Button
          label="Take this cross away"
          look="danger"
          wide
          onPress={() => {
            if (run({ kind: 'removeTie', tie: tie.id }, name.toLowerCase())) view.select(null);
          }}
        />
      )}
    </>
  );
}

/** A person may know better than the fit: trust a reading, or leave it out. */
function TrustChoice({ target }: { readonly target: Target }) {
  const { layout, run } = useOpenJob();
  const observation = observationOf(target);
  const { trust, ignore } = layout.room;
  const value = trust.includes(observation) ? 'trust' : ignore.includes(observation) ? 'ignore' : 'weigh';
  if (target.kind === 'tie' && target.id === null) return null;
  return (
    <Segmented
      label="In the fit"
      options={[
        { value: 'weigh', label: 'Weigh it' },
        { value: 'trust', label: 'Trust it' },
        { value: 'ignore', label: 'Leave it out' },
      ]}
      value={value}
      onChange={(next) =>
        run({ kind: 'markReading', observation, mark: next === 'weigh' ? null : next }, `${observation}, ${next}`)
      }
    />
  );
}

/** "Taped twice" with its tick, as on the blade. */
function TapedTimes({ wall }: { readonly wall: string }) {
  const { layout } = useOpenJob();
  const count = layout.room.walls.find((w) => w.id === wall)?.length.length ?? 0;
  if (count < 2) return null;
  return (
    <View style={styles.chip}>
      <Icon name="check" size={18} tone="chalk" />
      <Text kind="label">{count === 2 ? 'Taped twice' : `Taped ${count} times`}</Text>
    </View>
  );
}

const ORDINALS = ['First', 'Second', 'Third', 'Fourth', 'Fifth', 'Sixth'];
const ordinal = (index: number): string => ORDINALS[index] ?? `${index + 1}th`;

function whoWhen(reading: Reading): string {
  const time = reading.at
    ? new Date(reading.at).toLocaleTimeString(undefined, { hour: 'numeric', minute: '2-digit' })
    : '';
  return [reading.by, time].filter(Boolean).length > 0 ? `, ${[reading.by, time].filter(Boolean).join(' ')}` : '';
}

const styles = StyleSheet.create({
  panel: { gap: space.m },
  title: { flexDirection: 'row', alignItems: 'center', gap: space.s },
  grow: { flex: 1, minWidth: 0 },
  chip: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 6,
    minHeight: 36,
    paddingHorizontal: space.m,
    borderWidth: 1,
    borderColor: color.ink,
    borderRadius: 4,
  },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 44,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
});
