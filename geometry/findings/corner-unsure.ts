import { constant, sourceText } from '../wood/sourced';
import { jointAtCorner } from './corner-joint-of';
import { cornerName, type Rule } from './facts';
import { finding } from './finding';
import { sizePair } from './words';

export const UNSURE_LIMIT = constant(
  'Opening that a corner may leave for its own doubt',
  1 / 16,
  'in',
  'our choice',
  '',
);

/** A measured corner whose doubt would open its joint further than that. */
export const cornerUnsure: Rule = (facts) =>
  (facts.fit?.corners ?? []).flatMap((corner) => {
    const joint = corner.measured ? jointAtCorner(facts, corner.between) : null;
    if (!joint || joint.openingPerSd <= UNSURE_LIMIT.value) return [];
    const [opens, limit] = sizePair(joint.openingPerSd, UNSURE_LIMIT.value, facts.layout.step);
    return [
      finding({
        code: 'corner-unsure',
        severity: 'note',
        text: `Corner ${cornerName(facts, corner.between)} is known to ${corner.sdDeg.toFixed(2)} degrees: joint ${joint.letters[0]} to ${joint.letters[1]} may open ${opens}, over ${limit}.`,
        action: 'Tape the corner again with longer marks, or take the diagonal the room screen names.',
        at: { corner: corner.between, joint: joint.between },
        source: sourceText(UNSURE_LIMIT),
      }),
    ];
  });
