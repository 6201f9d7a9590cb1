import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Layout } from '@/geometry/core/layout';
import { inches } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { FractionPad, type PadLength } from '../measure/FractionPad';
import { space } from '../ui/tokens';
import { CornerPad } from './CornerPad';
import { PadStrip } from './PadStrip';
import { isTaken, nextTarget, observationOf, targetName, walkOf, wantsCross, type Target } from './tape-walk';
import type { CornerCheck } from './use-corner-check';
import { useReading } from './use-reading';
import { useSecondThought } from './use-second-thought';
import type { RoomView } from './use-room-view';

export interface ReadingPadProps {
  readonly view: RoomView;
  readonly target: Target;
  readonly check: CornerCheck | null;
  /** A key typed on the drawing that opened the pad. */
  readonly firstKey?: string;
}

/** The pad for one target: types it, stores it, and walks on to the next that is missing. */
export function ReadingPad({ view, target, check, firstKey }: ReadingPadProps) {
  const { layout } = useOpenJob();
  const next = nextTarget(layout, null, target);
  const skip = next ? () => view.open(next) : undefined;
  const shared = { view, next: nextKey(layout, target, next), onSkip: skip, firstKey };
  if (check) return <CornerPad key={observationOf(target)} check={check} {...shared} />;
  if (target.kind === 'corner') return null;
  return <LengthPad key={`${observationOf(target)} ${view.replace}`} target={target} {...shared} />;
}

/** Where Next goes: what is still missing, a cross while there are too few spare readings, or back to the report. */
function nextKey(layout: Layout, target: Target, next: Target | null) {
  if (next) return { label: targetName(layout, next), icon: 'next' } as const;
  const cross = wantsCross(layout, isTaken(layout, target) && target.kind !== 'wall' ? 0 : 1);
  return cross ? ({ label: 'A cross', icon: 'next' } as const) : ({ label: 'Done', icon: 'check' } as const);
}

interface LengthPadProps {
  readonly view: RoomView;
  readonly target: Exclude<Target, { kind: 'corner' }>;
  readonly next: { readonly label: string; readonly icon: 'next' | 'check' };
  readonly onSkip?: () => void;
  readonly firstKey?: string;
}

function LengthPad({ view, target, next, onSkip, firstKey }: LengthPadProps) {
  const { layout, run } = useOpenJob();
  const toReading = useReading();
  const name = targetName(layout, target);
  const readings = target.kind === 'wall' ? (layout.room.walls.find((w) => w.id === target.wall)?.length ?? []) : [];
  const [way, setWay] = useState(view.replace === null ? 'again' : String(view.replace));
  const refuse = useSecondThought((value) => longerThanTheRest(layout, target, value));
  const store = (length: PadLength) => {
    const reading = toReading(length);
    const label = `${name[0]!.toLowerCase()}${name.slice(1)}, ${length.text}`;
    const done =
      target.kind === 'tie'
        ? run({ kind: 'setTie', tie: { id: target.id ?? freshTieId(layout), from: target.from, to: target.to, length: reading } }, label) // prettier-ignore
        : way === 'again'
          ? run({ kind: 'addReading', wall: target.wall, reading }, label)
          : run({ kind: 'replaceReading', wall: target.wall, index: Number(way), reading }, label);
    if (done) view.goOn(target);
  };
  const walk = walkOf(layout, null);
  const at = walk.findIndex((one) => observationOf(one) === observationOf(target));
  const strip =
    readings.length > 0
      ? {
          label: 'A second tape, or in place of one',
          options: [
            { value: 'again', label: readings.length === 1 ? 'Second tape' : 'One more tape' },
            ...readings.map((reading, i) => ({ value: String(i), label: `Replace ${reading.text}` })),
          ],
          value: way,
          onChange: setWay,
        }
      : { label: at < 0 ? 'Between two marks' : `${at + 1} of ${walk.length}` };
  return (
    <View style={styles.pad}>
      <PadStrip {...strip} onSkip={onSkip} />
      <FractionPad
        title={name}
        hint={readings.length > 0 && way === 'again' ? 'taped again' : target.kind === 'tie' ? 'mark to mark' : 'corner to corner'} // prettier-ignore
        next={next}
        firstKey={firstKey}
        start={way === 'again' ? undefined : readings[Number(way)]?.text}
        key={way}
        check={refuse}
        onNext={store}
        onCancel={view.stopTyping}
      />
    </View>
  );
}

const freshTieId = ({ room: { ties } }: Layout): string => {
  let n = ties.length + 1;
  while (ties.some((tie) => tie.id === `t${n}`)) n++;
  return `t${n}`;
};

/** In a closed room no wall is as long as all the others together. */
export function longerThanTheRest(layout: Layout, target: Target, value: number): string | null {
  const { walls, closed } = layout.room;
  if (target.kind !== 'wall' || !closed) return null;
  const others = walls.filter((wall) => wall.id !== target.wall);
  if (others.some((wall) => wall.length.length === 0)) return null;
  const rest = others.reduce((sum, wall) => sum + wall.length[0]!.value, 0);
  if (value < rest) return null;
  return `All other walls together are ${inches(rest, layout.step)} long, so this one cannot be ${inches(value, layout.step)} and the room still close.`;
}

const styles = StyleSheet.create({ pad: { gap: space.xs } });
