import { View } from 'react-native';

import { seasonRemedies } from '@/geometry/wood/joint-season';
import { speciesOf } from '@/geometry/wood/species';
import { sizeText } from '@/geometry/findings/words';
import { useOpenJob } from '../editor/JobProvider';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { Fine } from './Fine';
import { Section } from './Part';

/** How far each joint opens or its legs swing with the seasons, and what makes it less. */
export function JointSeasons() {
  const { plan, layout } = useOpenJob();
  if (plan.joints.length === 0) return null;
  const edge = speciesOf(layout.material.species)?.radial.value ?? plan.movement.coefficient;
  return (
    <Section title="Joints and the seasons">
      {plan.joints.map((joint) => {
        const name = joint.letters.join(' to ');
        const glued = joint.assembled === 'shop';
        return (
          <View key={joint.between.join('|')} style={{ gap: space.xs }}>
            <Fine
              label={glued ? `${name}, glued: swing of the longer leg's end` : `${name} opens by`}
              inches={glued ? joint.swing : joint.seasonal}
              from="Seasonal opening of a joint"
              note={glued ? 'the slots and the wall gap have to take it' : 'at its far end, at the worst season'}
            />
            {seasonRemedies(joint, plan.movement, edge).map((way) => (
              <Text key={way.text} kind="small">
                {glued ? `${way.text}.` : `${way.text}: ${sizeText(way.seasonal, layout.step)}.`}
              </Text>
            ))}
          </View>
        );
      })}
    </Section>
  );
}
