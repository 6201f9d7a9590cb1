import { accessBelow } from '../wood/under';
import { jointName, wallsOf, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { drawboltsAlong } from '../wood/drawbolts';

/** A joint that is to be bolted together on site where no hand gets in from below. */
export const jointNoAccess: Rule = (facts) =>
  facts.tops.joints.flatMap((joint) => {
    if (joint.assembled !== 'site') return [];
    if (accessBelow(facts, wallsOf(facts, joint), joint.from, joint.to) !== 'none') return [];
    return [
      finding({
        code: 'joint-no-access',
        severity: 'stop',
        text: `${jointName(joint)} needs ${drawboltsAlong(joint.length).length} drawbolts turned from below, and the base under it has no access.`,
        action: 'Assemble it in the shop and check that it gets in, or open the base from inside.',
        at: { joint: joint.between, pieces: joint.letters },
        source: PRACTICE,
      }),
    ];
  });
