import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { JointChoice } from '@/geometry/core/layout';
import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { TapeBlade } from '../measure/TapeBlade';
import { Field } from '../ui/Field';
import { Chips, Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { BladeField } from './BladeField';
import { someLength } from './length-checks';
import { inSentence, jointWord, topName, wallName } from './tops-choice';

/** Front of a first diagonal, inches: a person stands before it. Common practice. */
const DIAGONAL = 18;

/** A corner's joint: its kind, which run goes through, where it is put together. */
export function JointPanel({ between }: { readonly between: readonly [string, string] }) {
  const { plan, layout, run, mayEdit } = useOpenJob();
  const joint = plan.joints.find((j) => j.between.join() === between.join());
  if (!joint) return null;
  const stored = layout.joints.find((j) => between.every((id) => j.between.includes(id)));
  const choice: JointChoice = stored ?? { between, kind: 'miter', assembled: 'shop' };
  const set = (change: Partial<JointChoice>, what: string) => {
    const { through, width, angle, ...rest } = { ...choice, ...change };
    run(
      {
        kind: 'setJoint',
        joint: {
          ...rest,
          ...(rest.kind === 'butt' && { through: through ?? between[0] }),
          ...(rest.kind === 'diagonal' && { width: width ?? DIAGONAL, ...(angle !== undefined && { angle }) }),
        },
      },
      `joint ${joint.letters.join(' to ')}, ${what}`,
    );
  };
  const straight = joint.kind === 'square' || joint.kind === 'step';
  const fine = layout.step.endsWith('mm') ? '0.5 mm' : '1/32';
  return (
    <View style={styles.panel}>
      <TapeBlade inches={joint.length} step={layout.step} name="Joint, back to front" height={56} hook={false} />
      {mayEdit && !straight && <KindChips choice={choice} corner={joint.corner} set={set} />}
      {!mayEdit && <Text>{jointWord(joint.kind)}</Text>}
      {straight && (
        <Text kind="second">{`${jointWord(joint.kind)}: the walls run on almost straight here, so there is nothing to miter.`}</Text>
      )}
      {choice.kind === 'diagonal' && !straight && <DiagonalFields choice={choice} corner={joint.corner} set={set} />}
      {mayEdit && (
        <Segmented
          label="Put together"
          options={[
            { value: 'shop', label: 'In the shop' },
            { value: 'site', label: 'On site' },
          ]}
          value={choice.assembled}
          onChange={(assembled) => set({ assembled }, assembled === 'shop' ? 'in the shop' : 'on site')}
        />
      )}
      <Text kind="second">
        {`Corner ${joint.corner.toFixed(2)} degrees, cut at ${joint.angles[0].toFixed(2)} and ${joint.angles[1].toFixed(2)} to the back edges.`}
      </Text>
      <Text kind="second">
        {`The corner’s own uncertainty opens it by ${say(joint.openingPerSd, fine)} at the end, the seasons by up to ${say(joint.seasonal, fine)} where it is not glued.`}
      </Text>
    </View>
  );
}

interface JointFieldsProps {
  readonly choice: JointChoice;
  /** Interior angle, degrees. */
  readonly corner: number;
  readonly set: (change: Partial<JointChoice>, what: string) => void;
}

function KindChips({ choice, corner, set }: JointFieldsProps) {
  const { layout } = useOpenJob();
  const [left, right] = choice.between;
  const through = choice.through ?? left;
  const name = (id: string) => {
    const run = layout.runs.find((r) => r.id === id);
    return run ? wallName(layout, run.wall) : id;
  };
  const pick = (value: string) => {
    if (value === 'miter') set({ kind: 'miter' }, 'miter');
    else if (value === 'diagonal') set({ kind: 'diagonal' }, 'diagonal');
    else set({ kind: 'butt', through: value }, `butt, ${inSentence(topName(layout, value))} goes through`);
  };
  return (
    <Chips
      label="Kind of joint"
      options={[
        { value: 'miter', label: 'Miter' },
        { value: left, label: `Butt, ${name(left)} through` },
        { value: right, label: `Butt, ${name(right)} through` },
        { value: 'diagonal', label: 'Diagonal front', disabled: corner >= 180 },
      ]}
      value={choice.kind === 'butt' ? through : choice.kind}
      onChange={pick}
    />
  );
}

/** Width of the diagonal front, and the angle it leaves the left-hand run at. */
function DiagonalFields({ choice, corner, set }: JointFieldsProps) {
  const { layout, mayEdit } = useOpenJob();
  const even = (180 - corner) / 2;
  const [text, setText] = useState(choice.angle === undefined ? '' : String(choice.angle));
  const [error, setError] = useState<string | undefined>();
  const store = () => {
    const plain = text.replace('°', '').replace(',', '.').trim();
    if (plain === '') {
      setError(undefined);
      if (choice.angle !== undefined) set({ angle: undefined }, 'the same angle on both sides');
      return;
    }
    const angle = Number(plain);
    const most = 180 - corner;
    if (!Number.isFinite(angle) || angle <= 0 || angle >= most)
      return setError(`Type degrees between 0 and ${most.toFixed(1)}, or leave it empty for the same on both sides.`);
    setError(undefined);
    if (angle !== choice.angle) set({ angle }, `${angle} degrees`);
  };
  return (
    <>
      <BladeField
        label="Width of the diagonal"
        note="along its front"
        inches={choice.width ?? null}
        check={someLength('The diagonal')}
        onLength={(width) => set({ width }, `diagonal ${say(width, layout.step)} wide`)}
      />
      <Field
        label="Angle to the left-hand front, degrees"
        kind="decimal"
        autoComplete="off"
        value={text}
        disabled={!mayEdit}
        onChange={setText}
        onBlur={store}
        onSubmit={store}
        error={error}
        hint={`Empty: the same on both sides, ${even.toFixed(1)} degrees.`}
      />
    </>
  );
}

const styles = StyleSheet.create({ panel: { gap: space.m } });
