import { baseReach } from '../wood/under';
import { basesUnder, runName, size, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { capital } from './words';

/** A top over a dishwasher: steam comes up under its front edge. */
export const dishwasherSteam: Rule = (facts) =>
  facts.tops.runs.flatMap((laid) =>
    basesUnder(facts, laid).flatMap((base) => {
      const wall = facts.wallById.get(laid.wall);
      if (!wall || base.kind !== 'dishwasher') return [];
      const [from, to] = baseReach(wall, base);
      const over = Math.min(to, laid.backTo) - Math.max(from, laid.backFrom);
      if (over <= 0) return [];
      return [
        finding({
          code: 'dishwasher-steam',
          severity: 'note',
          text: `${capital(runName(facts, laid.id))} lies over ${size(facts, over)} of dishwasher: steam wets the underside and the front edge.`,
          action: 'Seal the underside twice there and fix the steam guard that its maker supplies.',
          at: { run: laid.id, base: base.id },
          source: PRACTICE,
        }),
      ];
    }),
  );
