import type { Rule } from './facts';
import { finding } from './finding';
import { FINISHES } from '../wood/finish';

/** No finish at all: the top stains, and moves as fast as the air changes. */
export const finishNone: Rule = ({ layout, tops }) =>
  layout.finish.kind === 'none' && tops.pieces.length > 0
    ? [
        finding({
          code: 'finish-none',
          severity: 'warn',
          text: 'The top gets no finish; one coat on all faces is the least against stains and cupping.',
          action: 'Choose a finish, the same on top and underside.',
          at: { detail: 'finish' },
          source: FINISHES.none.moisture.source,
        }),
      ]
    : [];
