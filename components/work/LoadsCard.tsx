import { View } from 'react-native';

import { longestRoundCorner } from '@/geometry/top/corridor';
import { CAUTIONS } from '@/geometry/wood/cautions';
import { sectionLoads, type SectionLoad } from '@/geometry/wood/section-loads';
import { sizeText } from '@/geometry/findings/words';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { Banner } from '../ui/Banner';
import { Table } from '../ui/Table';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { Fact, FromLink } from './Fact';
import { Section } from './Part';

/** What is carried in one go: weight, hands, and the way into the house. */
export function LoadsCard() {
  const { plan, layout } = useOpenJob();
  const { access, step } = layout;
  const loads = sectionLoads(plan.tops, plan.pieces);
  if (loads.length === 0) return null;
  return (
    <Section title="Carrying it in" broad>
      <Table
        label="What is carried in one go"
        rows={loads}
        rowKey={(load) => load.letters.join('')}
        rowLabel={(load) => load.letters.join(', ')}
        minWidth={520}
        columns={[
          {
            key: 'letters',
            title: 'Pieces',
            width: 90,
            cell: (load) => <Text kind="strong">{load.letters.join(' ')}</Text>,
          },
          {
            key: 'weight',
            title: 'Weight',
            width: 96,
            align: 'right',
            cell: (load) => <Text tabular>{`${Math.round(load.weightLb)} lb`}</Text>,
          },
          {
            key: 'long',
            title: 'Longest',
            width: 110,
            align: 'right',
            cell: (load) => <Fraction inches={load.span} step={step} />,
          },
          { key: 'hands', title: 'People', share: 2, cell: (load) => <Text>{handsWords(load)}</Text> },
          {
            key: 'index',
            title: 'Lifting index',
            width: 110,
            align: 'right',
            cell: (load) => (
              <Text tabular tone={load.hands.liftingIndex > 1 ? 'red' : 'ink'}>
                {load.hands.liftingIndex.toFixed(1)}
              </Text>
            ),
          },
        ]}
      />
      <View style={{ gap: space.s }}>
        {plan.passages.map((way) => (
          <Text key={way.letters.join('')} kind="second">
            {way.obstacle
              ? `${way.letters.join(', ')} may not go in: ${way.obstacle}.`
              : `${way.letters.join(', ')} goes in ${way.onEdge ? 'on edge' : 'flat'}.`}
          </Text>
        ))}
      </View>
      <Fact label="Door" value={`${sizeText(access.doorWidth, step)} by ${sizeText(access.doorHeight, step)}`} />
      {access.corridor && (
        <Fact
          label="Longest round the corridor's corner, on edge"
          value={
            <Fraction inches={longestRoundCorner(...access.corridor, layout.material.thickness)} step={step} bold />
          }
          from="Longest round a corner"
        />
      )}
      {access.clearLength !== null && (
        <Fact
          label="Longest that stairs let through"
          value={<Fraction inches={access.clearLength} step={step} bold />}
        />
      )}
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l }}>
        <FromLink line="Weight of a piece" label="Weight" />
        <FromLink line="People to carry" label="People" />
        <FromLink line="Lifting index" label="Lifting index: over 1 is heavy" />
      </View>
      <Banner icon="look" fact="Lifting." act={CAUTIONS.lifting.text} />
    </Section>
  );
}

function handsWords({ hands }: SectionLoad): string {
  if (hands.people === 4) return 'Four, a lifting aid, or join on site';
  return `${['One', 'Two', 'Three'][hands.people - 1]}, good for ${Math.round(hands.capacityLb ?? 0)} lb`;
}
