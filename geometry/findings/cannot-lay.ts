import type { Rule } from './facts';
import { finding } from './finding';

/** What the tops could not be laid as drawn: every problem the layout itself reports. */
export const cannotLay: Rule = (facts) =>
  facts.tops.problems.map(({ code, message, at }) =>
    finding({
      code: 'cannot-lay',
      severity: 'stop',
      text: message,
      action: 'Change the drawing there; the rest is laid all the same.',
      at: { run: at.run, wall: at.wall, cutout: at.cutout, detail: [code, at.joint].filter(Boolean).join(' ') },
      source: 'plane geometry',
    }),
  );
