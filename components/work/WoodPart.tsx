import { useMemo } from 'react';

import { leastBackGap, shrinkageOf, swellingOf } from '@/geometry/wood/movement';
import { SPECIES, speciesOf } from '@/geometry/wood/species';
import { yearOfWidth } from '@/geometry/wood/year-of-width';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { Banner } from '../ui/Banner';
import { Segmented } from '../ui/Segmented';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { ClimateCard } from './ClimateCard';
import { Fact } from './Fact';
import { Fine } from './Fine';
import { JointSeasons } from './JointSeasons';
import { LoadsCard } from './LoadsCard';
import { OverhangCard } from './OverhangCard';
import { Cards, Section } from './Part';
import { YearChart } from './YearChart';

const capital = (text: string): string => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;

/** Species, climate, what the year does to the tops, weights and overhangs. */
export function WoodPart() {
  const { layout, plan } = useOpenJob();
  const { movement } = plan;
  const deepest = Math.max(0, ...layout.runs.map((run) => run.depth), ...layout.islands.map((one) => one.depth));
  const depth = deepest > 0 ? deepest : layout.material.slabDepth;
  const gap = Math.min(...layout.runs.filter((run) => run.depth === depth).map((run) => run.backGap), Infinity);
  const months = useMemo(
    () => yearOfWidth(layout.climate, depth, movement.coefficient),
    [layout.climate, depth, movement.coefficient],
  );
  return (
    <Cards>
      <ClimateCard />
      <SpeciesCard />
      <Section title="Movement across the grain">
        <Fact
          label="Depth"
          value={<Fraction inches={depth} step={layout.step} bold />}
          note="the deepest run or island"
        />
        <Fine
          label="Grows by, at the wettest"
          inches={swellingOf(depth, movement)}
          from="Change of width across the grain"
        />
        <Fine
          label="Shrinks by, at the driest"
          inches={shrinkageOf(depth, movement)}
          from="Change of width across the grain"
        />
        <Fine label="Largest change in the year" inches={movement.acrossPerDepth} />
        <Fine
          label="Gap at the wall, at least"
          inches={leastBackGap(depth, movement)}
          from="Back gap"
          note="its growth, up to the next 1/16"
        />
        <Fine label="Slot for the rearmost screws" inches={movement.slot} from="Screw shank, #10" />
        {movement.extrapolated && (
          <Banner
            icon="look"
            fact="Past 6 to 14 % of moisture."
            act="The coefficients were measured inside that range; outside they are a guess."
          />
        )}
        {!layout.climate.heated && (
          <Banner
            icon="look"
            fact="Unheated in winter."
            act="Joints open and gaps change more than in a heated house."
          />
        )}
      </Section>
      <Section title="The year">
        <YearChart months={months} gap={Number.isFinite(gap) ? gap : 0} />
      </Section>
      <JointSeasons />
      <LoadsCard />
      <OverhangCard />
    </Cards>
  );
}

function SpeciesCard() {
  const { layout, plan, run, mayEdit } = useOpenJob();
  const { species: key, grain } = layout.material;
  const species = speciesOf(key);
  const names = [...new Set([...SPECIES.map((one) => one.key), key])];
  const cell = (what: string) => (species ? `${species.key}: ${what}` : undefined);
  return (
    <Section title="Wood">
      <Select
        label="Species"
        options={names.map((name) => ({ value: name, label: capital(name) }))}
        value={key}
        disabled={!mayEdit}
        onChange={(name) => run({ kind: 'setMaterial', value: { species: name } }, `wood ${name}`)}
      />
      <Segmented
        label="Growth rings in the staves"
        options={[
          { value: 'mixed', label: 'Mixed' },
          { value: 'flat', label: 'Flat' },
          { value: 'edge', label: 'Edge' },
        ]}
        value={grain}
        disabled={!mayEdit}
        onChange={(next) => run({ kind: 'setMaterial', value: { grain: next } }, `${next} grain`)}
      />
      {species ? (
        <>
          <Fact label="In the handbook" value={species.handbookName} />
          <Fact
            label="Radial, per 1 %"
            value={species.radial.value.toFixed(5)}
            from={cell('change of width, radial')}
          />
          <Fact
            label="Tangential, per 1 %"
            value={species.tangential.value.toFixed(5)}
            from={cell('change of width, tangential')}
          />
          <Fact
            label="Used here, per 1 %"
            value={plan.movement.coefficient.toFixed(5)}
            from={grain === 'mixed' ? 'Coefficient of mixed staves' : undefined}
          />
          <Fact
            label="Specific gravity at 12 %"
            value={species.gravity12.value.toFixed(2)}
            from={cell('specific gravity at 12 %')}
          />
          {species.hardnessLbf && (
            <Fact
              label="Side hardness"
              value={`${Math.round(species.hardnessLbf.value)} lbf`}
              from={cell('side hardness')}
            />
          )}
        </>
      ) : (
        <Text kind="second">{`${capital(key)} is not in the tables: the liveliest and heaviest wood that is stands in for it.`}</Text>
      )}
    </Section>
  );
}
