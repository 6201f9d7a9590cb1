import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Reading } from '@/geometry/core/layout';
import { wallLabel } from '@/geometry/core/layout';
import { useOpenJob } from '../editor/JobProvider';
import { useSession } from '../api/use-session';
import { FractionPad, type PadLength } from '../measure/FractionPad';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { marksThatFit, triangleAngle, triangleProblem } from './corner-marks';
import { isTaken, nextTarget, observationOf, targetName, type Target } from './tape-walk';
import type { RoomView } from './use-room-view';

export interface ReadingPadProps {
  readonly view: RoomView;
  readonly target: Target;
  /** A key typed on the drawing that opened the pad. */
  readonly firstKey?: string;
}

/** The pad for one target: types it, stores it, and walks on to the next that is missing. */
export function ReadingPad({ view, target, firstKey }: ReadingPadProps) {
  const { layout } = useOpenJob();
  const next = nextTarget(layout, view.room.fit?.next ?? null, target);
  const goOn = () => (next ? view.open(next) : view.select(null));
  const nextLabel = next
    ? ({ label: targetName(layout, next), icon: 'next' } as const)
    : ({ label: 'Done', icon: 'check' } as const);
  const shared = { view, goOn, nextLabel, firstKey };
  if (target.kind === 'corner') return <CornerPad key={observationOf(target)} target={target} {...shared} />;
  return <LengthPad key={observationOf(target)} target={target} {...shared} />;
}

interface PadProps<T extends Target> {
  readonly view: RoomView;
  readonly target: T;
  readonly goOn: () => void;
  readonly nextLabel: { readonly label: string; readonly icon: 'next' | 'check' };
  readonly firstKey?: string;
}

/** Who reads and when goes with every reading. */
function useReading(): (length: PadLength) => Reading {
  const { me } = useSession();
  return ({ text, value }) => ({ text, value, by: me?.name, at: new Date().toISOString() });
}

function LengthPad({ view, target, goOn, nextLabel, firstKey }: PadProps<Exclude<Target, { kind: 'corner' }>>) {
  const { layout, run } = useOpenJob();
  const toReading = useReading();
  const name = targetName(layout, target);
  const again = isTaken(layout, target);
  const store = (length: PadLength) => {
    const reading = toReading(length);
    const label = `${name[0]!.toLowerCase()}${name.slice(1)}, ${length.text}`;
    const done =
      target.kind === 'wall'
        ? run({ kind: 'addReading', wall: target.wall, reading }, label)
        : run(
            {
              kind: 'setTie',
              tie: { id: target.id ?? freshTieId(layout.room.ties), from: target.from, to: target.to, length: reading },
            },
            label,
          );
    if (done) goOn();
  };
  return (
    <FractionPad
      title={name}
      hint={target.kind === 'tie' ? 'corner to corner' : again ? 'second tape' : 'corner to corner'}
      next={nextLabel}
      firstKey={firstKey}
      check={(value) => (value > 0 ? null : 'A length of nothing is no reading. Tape it again.')}
      onNext={store}
      onCancel={view.stopTyping}
    />
  );
}

const freshTieId = (ties: readonly { readonly id: string }[]): string => {
  let n = ties.length + 1;
  while (ties.some((tie) => tie.id === `t${n}`)) n++;
  return `t${n}`;
};

function CornerPad({ view, target, goOn, nextLabel, firstKey }: PadProps<Extract<Target, { kind: 'corner' }>>) {
  const { layout, run } = useOpenJob();
  const toReading = useReading();
  const [left, right] = target.between;
  const lengthOf = (id: string) => view.room.fit?.walls.find((w) => w.id === id)?.adjusted ?? Infinity;
  const options = useMemo(() => marksThatFit(lengthOf(left), lengthOf(right)), [left, right, view.room]); // eslint-disable-line react-hooks/exhaustive-deps
  const corner = layout.room.corners.find((c) => c.between.join() === target.between.join());
  const taken = corner?.triangle;
  const [marks, setMarks] = useState(taken ? ([taken.a.value, taken.b.value] as const) : options[0]!);
  const [way, setWay] = useState<'triangle' | 'protractor'>('triangle');
  const label = (id: string) => wallLabel(layout.room.walls.findIndex((w) => w.id === id));
  const name = targetName(layout, target);
  const [a, b] = marks;
  const storeTriangle = (length: PadLength) => {
    const mark = (value: number): Reading => ({ text: String(value), value });
    const triangle = { a: mark(a), b: mark(b), c: toReading(length) };
    if (run({ kind: 'setTriangle', between: target.between, triangle }, `corner ${name.slice(7)}, ${length.text}`))
      goOn();
  };
  return (
    <View style={styles.corner}>
      <Segmented
        label="How to check the corner"
        labelHidden
        options={[
          { value: 'triangle', label: 'Tape' },
          { value: 'protractor', label: 'Protractor' },
        ]}
        value={way}
        onChange={setWay}
      />
      {way === 'protractor' ? (
        <ProtractorField name={name} target={target} goOn={goOn} nextLabel={nextLabel.label} />
      ) : (
        <>
          <Segmented
            label={`Mark ${a} in along ${label(left)} and ${b} in along ${label(right)} from the corner. Tape mark to mark.`}
            options={options.map((option) => ({ value: option.join(), label: option.join(' and ') }))}
            value={marks.join()}
            onChange={(next) => setMarks(options.find((option) => option.join() === next) ?? options[0]!)}
          />
          <FractionPad
            title={name}
            hint="mark to mark"
            next={nextLabel}
            firstKey={firstKey}
            check={(value) => triangleProblem(a, b, value, layout.step)}
            aside={(value) => (
              <AngleAside angle={value === null ? null : triangleAngle(a, b, value, corner?.nominal ?? 90)} />
            )}
            onNext={storeTriangle}
            onCancel={view.stopTyping}
          />
        </>
      )}
    </View>
  );
}

function AngleAside({ angle }: { readonly angle: number | null }) {
  return <Text kind="second">{angle === null ? 'no angle yet' : `= ${angle.toFixed(1)}°`}</Text>;
}

function ProtractorField({
  name,
  target,
  goOn,
  nextLabel,
}: {
  readonly name: string;
  readonly target: Extract<Target, { kind: 'corner' }>;
  readonly goOn: () => void;
  readonly nextLabel: string;
}) {
  const { layout, run } = useOpenJob();
  const corner = layout.room.corners.find((c) => c.between.join() === target.between.join());
  const [text, setText] = useState(corner?.angle === undefined ? '' : String(corner.angle));
  const [error, setError] = useState<string | undefined>();
  const store = () => {
    const angle = Number(text.replace('°', '').replace(',', '.'));
    if (text.trim() === '' || !Number.isFinite(angle) || angle < 1 || angle > 359)
      return setError('Type the angle on the room’s side in degrees, such as 90.9.');
    setError(undefined);
    if (run({ kind: 'setAngle', between: target.between, angle }, `${name.toLowerCase()}, ${angle} degrees`)) goOn();
  };
  return (
    <View style={styles.protractor}>
      <Field
        label={`${name}, degrees on the room’s side`}
        kind="decimal"
        autoComplete="off"
        value={text}
        onChange={setText}
        onSubmit={store}
        error={error}
        hint="Both legs flat on the walls, over the whole length of the protractor."
        autoFocus
      />
      <Button label={nextLabel} look="primary" wide height={56} onPress={store} />
    </View>
  );
}

const styles = StyleSheet.create({
  corner: { gap: space.s },
  protractor: { gap: space.l, paddingVertical: space.m },
});
