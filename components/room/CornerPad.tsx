import { useEffect, useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Reading } from '@/geometry/core/layout';
import { inches } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { cornerWord } from '../measure/CornerBadge';
import { FractionPad, type PadLength } from '../measure/FractionPad';
import { LengthField } from '../measure/LengthField';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { squareTape, triangleAngle, triangleProblem } from './corner-marks';
import { PadStrip, type PadStripProps } from './PadStrip';
import { observationOf, targetName } from './tape-walk';
import type { CornerCheck } from './use-corner-check';
import { useReading } from './use-reading';
import { useSecondThought } from './use-second-thought';
import type { RoomView } from './use-room-view';

export interface CornerPadProps {
  readonly view: RoomView;
  readonly check: CornerCheck;
  readonly next: { readonly label: string; readonly icon: 'next' | 'check' };
  readonly onSkip?: () => void;
  readonly firstKey?: string;
}

/** Checks a corner: two marks and the tape across, or a protractor. */
export function CornerPad({ view, check, next, onSkip, firstKey }: CornerPadProps) {
  const { layout, run } = useOpenJob();
  const toReading = useReading();
  const [own, setOwn] = useState(false);
  const { target, marks, corner, way } = check;
  const [a, b] = marks;
  const nominal = corner?.nominal ?? 90;
  const name = targetName(layout, target);
  const refuse = useSecondThought((c: number) => triangleProblem(a, b, c, layout.step));
  const store = (length: PadLength) => {
    const mark = (value: number): Reading => ({ text: inches(value, layout.step), value });
    const triangle = { a: mark(a), b: mark(b), c: toReading(length) };
    if (run({ kind: 'setTriangle', between: target.between, triangle }, `corner ${name.slice(7)}, ${length.text}`))
      view.goOn(target);
  };
  const strip: PadStripProps = {
    options: [
      ...check.sizes.slice(0, 3).map((size) => ({ value: size.join(), label: size.join(' and ') })),
      { value: 'own', label: 'Other marks' },
      { value: 'protractor', label: 'Protractor' },
    ],
    value: way === 'protractor' ? 'protractor' : own ? 'own' : marks.join(),
    label: 'How to check the corner',
    onChange: (value) => {
      check.setWay(value === 'protractor' ? 'protractor' : 'triangle');
      setOwn(value === 'own');
      const size = check.sizes.find((one) => one.join() === value);
      if (size) check.setMarks(size);
    },
    onSkip,
  };
  if (way === 'protractor')
    return (
      <View style={styles.pad}>
        <PadStrip {...strip} />
        <Protractor view={view} check={check} name={name} label={next.label} />
      </View>
    );
  return (
    <View style={styles.pad}>
      <PadStrip {...strip} />
      {own && <OwnMarks check={check} />}
      <FractionPad
        key={`${observationOf(target)} ${marks.join()}`}
        title="Mark to mark"
        hint={`${nominal === 90 || nominal === 270 ? 'square' : `${nominal}°`} is ${inches(squareTape(a, b, nominal), '1/16')}`}
        next={next}
        firstKey={firstKey}
        check={refuse}
        aside={(value) => <Angle check={check} value={value} nominal={nominal} />}
        onNext={store}
        onCancel={view.stopTyping}
      />
    </View>
  );
}

/** The angle the reading would give; it also tells the picture what stands on the pad. */
function Angle(props: { readonly check: CornerCheck; readonly value: number | null; readonly nominal: number }) {
  const { check, value, nominal } = props;
  useEffect(() => check.setLive(value), [value]); // eslint-disable-line react-hooks/exhaustive-deps
  const [a, b] = check.marks;
  const angle = value === null ? null : triangleAngle(a, b, value, nominal);
  if (angle === null) return <Text kind="second">{value === null ? '' : 'no angle'}</Text>;
  return (
    <View style={styles.angle}>
      <Text kind="number" size={19}>{`${angle.toFixed(1)}°`}</Text>
      <Text kind="label">{cornerWord(angle, nominal)}</Text>
    </View>
  );
}

function OwnMarks({ check }: { readonly check: CornerCheck }) {
  const { layout } = useOpenJob();
  const [a, b] = check.marks;
  const long = (value: number) => (value < 3 ? 'Marks under 3 in from the corner say nothing about its angle.' : null);
  return (
    <View style={styles.own}>
      <View style={styles.grow}>
        <LengthField
          label={`Mark on ${check.labels[0]}`}
          value={a}
          step={layout.step}
          check={long}
          onLength={(value) => check.setMarks([value, b])}
        />
      </View>
      <View style={styles.grow}>
        <LengthField
          label={`Mark on ${check.labels[1]}`}
          value={b}
          step={layout.step}
          check={long}
          onLength={(value) => check.setMarks([a, value])}
        />
      </View>
    </View>
  );
}

function Protractor(props: {
  readonly view: RoomView;
  readonly check: CornerCheck;
  readonly name: string;
  readonly label: string;
}) {
  const { view, check, name } = props;
  const { run } = useOpenJob();
  const { target, corner } = check;
  const [text, setText] = useState(corner?.angle === undefined ? '' : String(corner.angle));
  const [error, setError] = useState<string | undefined>();
  const store = () => {
    const angle = Number(text.replace('°', '').replace(',', '.'));
    if (text.trim() === '' || !Number.isFinite(angle) || angle < 1 || angle > 359)
      return setError('Type the angle on the room’s side in degrees, from 1 to 359, such as 90.9.');
    setError(undefined);
    if (run({ kind: 'setAngle', between: target.between, angle }, `${name.toLowerCase()}, ${angle} degrees`))
      view.goOn(target);
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
      <Button label={props.label} spoken={`Next: ${props.label}`} look="primary" wide height={56} onPress={store} />
    </View>
  );
}

const styles = StyleSheet.create({
  pad: { gap: space.s },
  angle: { flexDirection: 'row', alignItems: 'baseline', gap: 6 },
  own: { flexDirection: 'row', gap: space.m },
  grow: { flex: 1, minWidth: 0 },
  protractor: { gap: space.l, paddingVertical: space.m },
});
