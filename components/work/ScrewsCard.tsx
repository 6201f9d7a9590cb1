import { sizeText } from '@/geometry/findings/words';
import { jobSettings } from '@/geometry/wood/job-settings';
import { screwFor } from '@/geometry/wood/screws';
import { speciesOf } from '@/geometry/wood/species';
import { pilotHole, ultimateWithdrawalLb } from '@/geometry/wood/withdrawal';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { Banner } from '../ui/Banner';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { Fact } from './Fact';
import { Section } from './Part';

const LONGEST = 'longest';

/** The screw from below: chosen from stock, with what it bites, leaves and holds. */
export function ScrewsCard() {
  const { layout, plan, settings, run, mayEdit } = useOpenJob();
  const { fixing, material, step } = layout;
  const { screws } = settings;
  const screw = screwFor(fixing.rail, material.thickness, jobSettings(layout, settings).screws);
  const chosen = fixing.screw ?? 0;
  const species = speciesOf(material.species);
  const pilot = species && pilotHole(species.gravity12.value, screws.shank);
  const lengths = [...new Set([...screws.lengths, ...(chosen > 0 ? [chosen] : [])])].sort((a, b) => a - b);
  const wrong = screw.left < screws.leftAbove || screw.bite < screws.leastBite;
  return (
    <Section title="Screws from below">
      <Select
        label="Length"
        options={[
          { value: LONGEST, label: 'Longest that is safe' },
          ...lengths.map((length) => ({ value: String(length), label: sizeText(length, step) })),
        ]}
        value={chosen > 0 ? String(chosen) : LONGEST}
        disabled={!mayEdit}
        onChange={(next) =>
          run({ kind: 'setFixing', value: { screw: next === LONGEST ? 0 : Number(next) } }, 'screw length')
        }
        hint={`Through ${sizeText(fixing.rail, step)} of rail or corner block into ${sizeText(material.thickness, step)} of top.`}
      />
      {wrong && (
        <Banner
          look="attention"
          fact={
            screw.left < screws.leftAbove ? 'This screw comes too near to the face.' : 'This screw bites too little.'
          }
          act={`${sizeText(screws.leftAbove, step)} of wood is the least above the point, ${sizeText(screws.leastBite, step)} the least bite.`}
        />
      )}
      <Fact label="Screw" value={<Fraction inches={screw.length} step={step} bold />} />
      <Fact label="Bites" value={<Fraction inches={screw.bite} step={step} bold />} from="Least bite of a screw" />
      <Fact
        label="Left above the point"
        value={<Fraction inches={screw.left} step={step} bold />}
        from="Wood above a screw point"
      />
      <Fact
        label="Clear of ends, cutouts and joints"
        value={<Fraction inches={screws.edgeDistance} step={step} bold />}
        from="Screw clear of ends, cutouts and joints"
      />
      {species && screw.bite > 0 && (
        <Fact
          label="Pulls out at, on average"
          value={`${Math.round(ultimateWithdrawalLb(species.gravity12.value, screws.shank, screw.bite))} lb`}
          note="clear wood in tests; a fixing carries a small share"
          from="Screw hold in side grain"
        />
      )}
      <Fact
        label="Pilot hole"
        value={pilot ? `${pilot.toFixed(3)} in` : 'none needed'}
        note={pilot ? 'drill it, with a stop at the bite' : undefined}
        from="Pilot hole"
      />
      <Fact
        label="Slot behind, across the grain"
        value={<Fraction inches={plan.movement.slot} step={step} bold />}
        from="Change of width across the grain"
      />
      <Text kind="second">
        Front line in round holes, fixed. Behind it slots, long way across the grain, screw with a washer, not tight.
        Never glue the top to the cabinets.
      </Text>
    </Section>
  );
}
