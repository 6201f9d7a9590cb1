import { sizeText } from '@/geometry/findings/words';
import { backsplashHeight, bracketNeeds, ledgerNeeds, plumbGap, shimsOf } from '@/geometry/wood/level-support';
import { cabinetsOf } from '@/geometry/wood/under';
import { wallLabel } from '@/geometry/core/layout';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { Text } from '../ui/Text';
import { Fact } from './Fact';
import { Section } from './Part';
import { useWalls } from './use-walls';

/** What has to stand level and lie under the tops before they come, and what leaning walls do to the backsplash. */
export function SupportCard() {
  const { plan, layout } = useOpenJob();
  const walls = useWalls();
  const { step } = layout;
  const say = (inches: number) => sizeText(inches, step);
  const cabinets = cabinetsOf(walls, layout.bases);
  const wallOf = (id: string) =>
    wallLabel(
      Math.max(
        0,
        layout.room.walls.findIndex((wall) => wall.id === id),
      ),
    );
  const baseOf = (id: string) => {
    const base = layout.bases.find((one) => one.id === id);
    return base ? `${base.label ?? base.kind} on wall ${wallOf(base.wall)}` : id;
  };
  const needs = [
    ...bracketNeeds(cabinets),
    ...plan.joints.flatMap((joint) =>
      ledgerNeeds(
        joint,
        joint.between.flatMap((id) => layout.runs.find((run) => run.id === id)?.wall ?? []),
        cabinets,
      ),
    ),
  ];
  const level = layout.site.cabinetsOutOfLevel;
  const high = backsplashHeight(layout);
  const leaning = layout.room.walls.filter((wall) => (wall.outOfPlumb ?? 0) !== 0);
  return (
    <Section title="Level and support">
      <Fact
        label="Cabinets out of level"
        value={level === undefined ? 'not measured' : <Fraction inches={level} step={step} bold />}
        from="Cabinets out of level along a kitchen"
      />
      {shimsOf(layout.bases).map((shim) => (
        <Fact
          key={shim.base}
          label={`Shim under the ${baseOf(shim.base)}`}
          value={<Fraction inches={shim.thickness} step={step} bold />}
        />
      ))}
      {needs.map((need) => (
        <Fact
          key={`${need.kind} ${need.wall} ${need.from}`}
          label={
            need.kind === 'ledger'
              ? `Ledger on wall ${wallOf(need.wall)}`
              : `Bracket or rail on wall ${wallOf(need.wall)}`
          }
          value={`${say(need.from)} to ${say(need.to)}`}
          note={need.kind === 'ledger' ? 'no cabinet carries the corner' : 'the opening is too wide to span alone'}
          from={
            need.kind === 'ledger'
              ? 'Bare wall at a corner that counts as a corner without a cabinet'
              : 'Opening that a top spans without a bracket'
          }
        />
      ))}
      {needs.length === 0 && <Text kind="second">Every corner and opening that is drawn is carried.</Text>}
      {leaning.map((wall) => (
        <Fact
          key={wall.id}
          label={`Wall ${wallOf(wall.id)} leans ${(wall.outOfPlumb ?? 0) > 0 ? 'away' : 'in'}`}
          note={`over a backsplash of ${say(high)}`}
          value={
            <Fraction inches={Math.abs(plumbGap(wall, high))} step={step.endsWith('mm') ? '0.5 mm' : '1/32'} bold />
          }
          from="Backsplash height when it is not drawn"
        />
      ))}
    </Section>
  );
}
