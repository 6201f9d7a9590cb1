import { seasonRemedies } from '../wood/joint-season';
import { speciesOf } from '../wood/species';
import { jointName, size, type Facts, type Rule } from './facts';
import { finding } from './finding';
import { seasonLimit, seasonSeverity } from './season-limits';
import { MOVEMENT_SOURCE } from './sources';
import { sizePair } from './words';

/** A joint closed on site that opens with the seasons. */
export const miterOpens: Rule = (facts) =>
  facts.joints.flatMap((joint) => {
    const severity = seasonSeverity(joint.seasonal, facts.layout.climate.heated);
    if (joint.assembled !== 'site' || severity === null) return [];
    const [opens, limit] = sizePair(joint.seasonal, seasonLimit(joint.seasonal), facts.layout.step);
    const cold = facts.layout.climate.heated ? '' : ' The house is unheated in winter, so it works every year.';
    return [
      finding({
        code: 'miter-opens',
        severity,
        text: `${jointName(joint)} opens up to ${opens} with the seasons, over ${limit}.${cold}`,
        action: remedy(facts, joint),
        at: { joint: joint.between, pieces: joint.letters },
        source: MOVEMENT_SOURCE,
      }),
    ];
  });

function remedy(facts: Facts, joint: Facts['joints'][number]): string {
  const edge = speciesOf(facts.layout.material.species)?.radial.value ?? facts.movement.coefficient;
  const best = seasonRemedies(joint, facts.movement, edge)[0];
  const glue = 'Glue it in the shop so that the corner swings instead';
  return best
    ? `${best.text}: then it opens ${size(facts, best.seasonal)}. Or ${glue[0]!.toLowerCase()}${glue.slice(1)}.`
    : `${glue}.`;
}
