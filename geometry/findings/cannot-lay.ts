import type { LayProblem } from '../top/types';
import type { Facts, Rule } from './facts';
import { finding } from './finding';
import { seamNearCutout } from './seam-near-cutout';
import { seamNearEnd } from './seam-near-end';
import { seamUnsupported } from './seam-unsupported';
import { shortPiece } from './short-piece';
import { inPersonsWords } from './top-words';

/** What the tops could not be laid as drawn: every problem the layout itself reports. */
export const cannotLay: Rule = (facts) =>
  facts.tops.problems
    .filter((problem) => !saidOfTheSeam(facts, problem))
    .map(({ code, message, severity, at }) =>
      finding({
        code: 'cannot-lay',
        severity: severity ?? 'stop',
        text: inPersonsWords(facts, message),
        action: 'Change the drawing there; the rest is laid all the same.',
        at: { run: at.run, wall: at.wall, cutout: at.cutout, detail: [code, at.joint].filter(Boolean).join(' ') },
        source: 'plane geometry',
      }),
    );

/** A pin in a bad place gets a finding of its own, at its seam, that carries the same advice. */
function saidOfTheSeam(facts: Facts, { code, at }: LayProblem): boolean {
  if (code !== 'pin-not-allowed') return false;
  return [seamUnsupported, seamNearCutout, seamNearEnd, shortPiece].some((rule) =>
    rule(facts).some((found) => (found.at.seam?.on ?? found.at.run) === at.run),
  );
}
