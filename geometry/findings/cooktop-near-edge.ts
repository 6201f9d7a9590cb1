import { constant, sourceText } from '../wood/sourced';
import { cutoutName, type Rule } from './facts';
import { finding } from './finding';
import { MAKER } from './sources';
import { stripWidths } from './strip-widths';
import { capital, sizePair } from './words';

export const COOKTOP_CLEAR = constant(
  'Wood between a cooktop cutout and an edge',
  2.5,
  'in',
  'our choice',
  "no published figure was found; the maker's instructions come first",
);

/** A cooktop cut too near to an edge of the top. */
export const cooktopNearEdge: Rule = (facts) =>
  facts.tops.cutouts.flatMap((cutout) => {
    if (cutout.kind !== 'cooktop') return [];
    const widths = stripWidths(facts, cutout);
    const [side, least] = Object.entries(widths).reduce((a, b) => (b[1] < a[1] ? b : a)) as [string, number];
    if (least >= COOKTOP_CLEAR.value) return [];
    const [is, limit] = sizePair(Math.max(least, 0), COOKTOP_CLEAR.value, facts.layout.step);
    return [
      finding({
        code: 'cooktop-near-edge',
        severity: 'warn',
        text: `${capital(cutoutName(facts, cutout))} is ${is} from the ${side} of the top; keep ${limit} unless its maker allows less.`,
        action: "Check the maker's clearances before cutting, and move it if they ask for more.",
        at: { cutout: cutout.id, pieces: cutout.letters },
        source: `${sourceText(COOKTOP_CLEAR)}; ${MAKER}`,
      }),
    ];
  });
