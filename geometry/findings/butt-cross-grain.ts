import { widthChange } from '../wood/movement';
import { jointName, type Rule } from './facts';
import { finding } from './finding';
import { seasonLimit, seasonSeverity } from './season-limits';
import { MOVEMENT_SOURCE } from './sources';
import { sizePair } from './words';

/** Grain running across at a butt joint: one run's width works against the other's length, which does not move. */
export const buttCrossGrain: Rule = (facts) =>
  facts.joints.flatMap((joint) => {
    if (joint.kind !== 'butt') return [];
    const { make, summer, winter } = facts.movement.emc;
    const [driest, wettest] = [Math.min(make, summer, winter), Math.max(make, summer, winter)];
    const change = widthChange(joint.length, facts.movement.coefficient, driest, wettest);
    const severity = seasonSeverity(change, facts.layout.climate.heated);
    if (severity === null) return [];
    const [moves, limit] = sizePair(change, seasonLimit(change), facts.layout.step);
    return [
      finding({
        code: 'butt-cross-grain',
        severity,
        text: `${jointName(joint)}: the grain runs across at the butt, and one side grows and shrinks ${moves} past the other through the year, over ${limit}.`,
        action: 'Glue only the front third and let the rest slide on slotted connectors, or make it a miter.',
        at: { joint: joint.between, pieces: joint.letters },
        source: MOVEMENT_SOURCE,
      }),
    ];
  });
