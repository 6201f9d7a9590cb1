import { constant, sourceText } from '../wood/sourced';
import { jointName, size, type Rule } from './facts';
import { finding } from './finding';

export const NEEDS_CONNECTORS = constant('Joint that is aligned by connectors', 12, 'in', 'common practice', '');

/** A joint long enough for connectors on which none has a place. */
export const jointNoConnectors: Rule = (facts) =>
  facts.joints.flatMap((joint) => {
    if (joint.connectors.length > 0 || joint.length < NEEDS_CONNECTORS.value) return [];
    return [
      finding({
        code: 'joint-no-connectors',
        severity: 'warn',
        text: `${jointName(joint)} is ${size(facts, joint.length)} long and no connector has a place on it; from ${size(facts, NEEDS_CONNECTORS.value)} on it should have one.`,
        action: 'Take smaller connectors, or move the cutout away from the joint.',
        at: { joint: joint.between, pieces: joint.letters },
        source: sourceText(NEEDS_CONNECTORS),
      }),
    ];
  });
