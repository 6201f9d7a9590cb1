import { toRadians } from '../core/angle';
import { endsAtCorner, jointAtCorner } from './corner-joint-of';
import { cornerName, size, type Rule } from './facts';
import { finding } from './finding';
import { degrees } from './words';

/** A corner that a cut depends on and nobody measured: it is only drawn at its angle, and one degree is its doubt. */
export const cornerNotMeasured: Rule = (facts) =>
  (facts.fit?.corners ?? []).flatMap((corner) => {
    if (corner.measured) return [];
    const joint = jointAtCorner(facts, corner.between);
    if (!joint && !endsAtCorner(facts, corner.between)) return [];
    const run = corner.between.flatMap((wall) => facts.runsByWall.get(wall) ?? [])[0];
    const length = joint?.length ?? run?.depth ?? 0;
    return [
      finding({
        code: 'corner-not-measured',
        severity: 'warn',
        text: `Corner ${cornerName(facts, corner.between)} was not measured and counts as ${degrees(corner.angleDeg)}; 1 degree off leaves ${size(facts, length * toRadians(1))} open over ${size(facts, length)}.`,
        action: 'Tape a triangle at it: 36 in on one wall, 48 in on the other, and across.',
        at: { corner: corner.between, joint: joint?.between },
        source: 'assumed corners count with a standard deviation of 1 degree',
      }),
    ];
  });
