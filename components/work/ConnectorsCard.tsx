import { View } from 'react-native';

import { sizeText } from '@/geometry/findings/words';
import { endDistances } from '@/geometry/wood/connectors';
import { CONNECTOR_SIZES } from '@/geometry/wood/connector-sizes';
import { drawboltsAlong } from '@/geometry/wood/drawbolts';
import { jobSettings } from '@/geometry/wood/job-settings';
import { accessBelow, cabinetsOf } from '@/geometry/wood/under';
import type { Plan } from '@/geometry/plan/types';
import { useOpenJob } from '../editor/JobProvider';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { FromLink } from './Fact';
import { Section } from './Part';
import { useWalls } from './use-walls';

const OWN = 'own';

/** Connectors of each joint with their places, and how each joint is drawn together. */
export function ConnectorsCard() {
  const { plan, layout, settings, run, mayEdit } = useOpenJob();
  const { step, fixing } = layout;
  const { connectors } = jobSettings(layout, settings);
  const own = settings.connectors;
  return (
    <Section title="Joints">
      <Select
        label="Connector"
        options={[
          { value: OWN, label: `The shop's own: ${own.kind}, ${sizeText(own.width, step)} wide` },
          ...CONNECTOR_SIZES.map(({ name }) => ({ value: name, label: name })),
        ]}
        value={CONNECTOR_SIZES.find(({ name }) => name === fixing.connector)?.name ?? OWN}
        disabled={!mayEdit}
        onChange={(next) => run({ kind: 'setFixing', value: { connector: next === OWN ? '' : next } }, 'connector')}
        hint={`Mortise ${sizeText(connectors.width, step)} wide, ${sizeText(connectors.depth, step)} deep in each piece, every ${sizeText(connectors.spacing, step)}.`}
      />
      <FromLink
        line={
          CONNECTOR_SIZES.some(({ name }) => name === fixing.connector)
            ? `${fixing.connector ?? ''}: mortise width`
            : 'Mortise width'
        }
      />
      {plan.joints.length === 0 && <Text kind="second">No joint in this job.</Text>}
      {plan.joints.map((joint) => (
        <OneJoint key={joint.between.join('|')} joint={joint} />
      ))}
      <FromLink line="Wood left beside a mortise" />
    </Section>
  );
}

function OneJoint({ joint }: { readonly joint: Plan['joints'][number] }) {
  const { layout, settings } = useOpenJob();
  const walls = useWalls();
  const { step } = layout;
  const { connectors } = jobSettings(layout, settings);
  const say = (inches: number) => sizeText(inches, step);
  const [atBack, atFront] = endDistances(joint.angles, connectors);
  const moved = [
    ...(atBack > connectors.firstFromEnd ? [`${say(atBack)} from the back point`] : []),
    ...(atFront > connectors.firstFromEnd ? [`${say(atFront)} from the front point`] : []),
  ];
  const ids = joint.between.flatMap((id) => layout.runs.find((run) => run.id === id)?.wall ?? []);
  const access = accessBelow(cabinetsOf(walls, layout.bases), ids, joint.from, joint.to);
  return (
    <View style={{ gap: space.xs, paddingVertical: space.s }}>
      <Text kind="strong">{`${joint.letters.join(' to ')}, ${say(joint.length)} long, put together in the ${joint.assembled === 'shop' ? 'shop' : 'house'}`}</Text>
      <Text kind="second">
        {joint.connectors.length > 0
          ? `${joint.connectors.length} connectors, centers from the back point: ${joint.connectors.map(say).join(', ')}.`
          : 'No connector fits.'}
      </Text>
      {moved.length > 0 && (
        <Text kind="second">
          {`The first stands ${moved.join(' and ')}: nearer to the acute point its mortise would come through the edge.`}
        </Text>
      )}
      <Text kind="second">{boltWords(joint, access, say)}</Text>
    </View>
  );
}

function boltWords(
  joint: Plan['joints'][number],
  access: ReturnType<typeof accessBelow>,
  say: (inches: number) => string,
): string {
  if (joint.assembled === 'shop') return 'Glued in the shop: see under Wood whether the section gets in.';
  const bolts = `Drawbolts from below at ${drawboltsAlong(joint.length).map(say).join(', ')}`;
  if (access === 'open') return `${bolts}. A hand gets in from below.`;
  if (access === 'none')
    return 'No hand gets in from below: put it together in the shop, and check that the section gets in.';
  return `${bolts}. No cabinet is drawn below: make sure that a hand gets in.`;
}
