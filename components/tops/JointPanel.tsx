import type { JointChoice } from '@/geometry/core/layout';
import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { TapeBlade } from '../measure/TapeBlade';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { jointWord, topName } from './tops-targets';

/** A corner's joint: its kind, which run goes through, where it is put together. */
export function JointPanel({ between }: { readonly between: readonly [string, string] }) {
  const { plan, layout, run, mayEdit } = useOpenJob();
  const joint = plan.joints.find((j) => j.between.join() === between.join());
  if (!joint) return null;
  const stored = layout.joints.find((j) => between.every((id) => j.between.includes(id)));
  const choice: JointChoice = stored ?? { between, kind: 'miter', assembled: 'shop' };
  const set = (change: Partial<JointChoice>, what: string) => {
    const { through, width, ...rest } = { ...choice, ...change };
    run(
      {
        kind: 'setJoint',
        joint: {
          ...rest,
          ...(rest.kind === 'butt' && { through: through ?? between[0] }),
          ...(rest.kind === 'diagonal' && width !== undefined && { width }),
        },
      },
      `joint ${joint.letters.join(' to ')}, ${what}`,
    );
  };
  const straight = joint.kind === 'square' || joint.kind === 'step';
  return (
    <>
      <TapeBlade inches={joint.length} step={layout.step} name="Joint, back to front" height={56} hook={false} />
      <Text kind="second">
        {`Corner ${joint.corner.toFixed(2)} degrees, cut at ${joint.angles[0].toFixed(2)} and ${joint.angles[1].toFixed(2)} to the back edges.`}
      </Text>
      <Text kind="second">
        {`The corner’s own uncertainty opens it by ${say(joint.openingPerSd, layout.step.endsWith('mm') ? '0.5 mm' : '1/32')} at the end, the seasons by up to ${say(joint.seasonal, layout.step.endsWith('mm') ? '0.5 mm' : '1/32')} where it is not glued.`}
      </Text>
      {straight && <Text kind="second">{`${jointWord(joint.kind)}: the walls run on almost straight here.`}</Text>}
      {mayEdit && !straight && (
        <Segmented
          label="Kind"
          options={[
            { value: 'miter', label: 'Miter' },
            { value: 'butt', label: 'Butt joint' },
          ]}
          value={choice.kind === 'diagonal' ? null : choice.kind}
          onChange={(kind) => set({ kind }, jointWord(kind).toLowerCase())}
        />
      )}
      {mayEdit && choice.kind === 'butt' && (
        <Segmented
          label="Goes through"
          options={between.map((id) => ({ value: id, label: topName(layout, id) }))}
          value={choice.through ?? between[0]}
          onChange={(through) => set({ through }, `${topName(layout, through).toLowerCase()} goes through`)}
        />
      )}
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
    </>
  );
}
