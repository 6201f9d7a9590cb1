import { endDistances } from '../wood/connectors';
import { jointName, size, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';

/** Connectors that had to move in from the shop's usual place because a point is sharp. */
export const connectorNearPoint: Rule = (facts) =>
  facts.joints.flatMap((joint) => {
    const { firstFromEnd, cover } = facts.settings.connectors;
    const ends = endDistances(joint.angles, facts.settings.connectors);
    const moved = (['back', 'front'] as const).filter((_, i) => ends[i]! > firstFromEnd);
    if (moved.length === 0 || joint.connectors.length === 0) return [];
    const places = moved.map((end) => `${size(facts, ends[end === 'back' ? 0 : 1])} from the ${end} point`);
    return [
      finding({
        code: 'connector-near-point',
        severity: 'note',
        text: `${jointName(joint)}: the first connector sits ${places.join(' and ')} instead of ${size(facts, firstFromEnd)}, to keep ${size(facts, cover)} of wood at the sharp edge.`,
        action: 'Mark it from the sheet, not from the other joints.',
        at: { joint: joint.between, pieces: joint.letters },
        source: PRACTICE,
      }),
    ];
  });
