import type { Rule } from './facts';
import { finding } from './finding';
import { listText } from './words';

/** A section assembled in the shop that the house may not let in. */
export const sectionWontGoIn: Rule = (facts) =>
  facts.passages.flatMap(({ letters, obstacle }) =>
    obstacle === null
      ? []
      : [
          finding({
            code: 'section-wont-go-in',
            severity: 'warn',
            text: `${listText(letters)} may not go in: ${obstacle}.`,
            action:
              letters.length > 1 ? 'Join it on site, or find another way in.' : 'Place a seam, or find another way in.',
            at: { pieces: letters },
            source: 'plane geometry, carried level or on edge, not tilted',
          }),
        ],
  );
