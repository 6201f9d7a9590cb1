import { checkOverhang } from '@/geometry/wood/overhang';
import { speciesOf } from '@/geometry/wood/species';
import { CAUTIONS } from '@/geometry/wood/cautions';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { Text } from '../ui/Text';
import { Fact } from './Fact';
import { IslandHangs } from './IslandHangs';
import { Section } from './Part';

/** How far this wood may hang over with nobody's brackets under it, as advice. */
export function OverhangCard() {
  const { layout } = useOpenJob();
  const { material, step } = layout;
  const species = speciesOf(material.species);
  if (!species) return null;
  const longest = (way: 'along' | 'across') =>
    checkOverhang(species, material.grain, way, 12, material.thickness).longest;
  return (
    <Section title="Overhangs and seating">
      <Fact
        label="Across the grain, at most"
        note="a seat along an island's long side"
        value={<Fraction inches={longest('across')} step={step} bold />}
        from="Sag of an overhang"
      />
      <Fact
        label="Along the grain, at most"
        note="past the end of a run or an island"
        value={<Fraction inches={longest('along')} step={step} bold />}
        from="Load on the edge of an overhang"
      />
      {layout.islands.map((island) => (
        <IslandHangs key={island.id} island={island} />
      ))}
      <Text kind="second">
        {`For a 12 in strip with 100 lb on its edge, sag up to a 180th of the overhang. Further out, put brackets or a rail under it. ${CAUTIONS.strength.text}`}
      </Text>
    </Section>
  );
}
