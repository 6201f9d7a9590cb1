import { backGaps } from '../wood/back-gaps';
import { shrinkageOf } from '../wood/movement';
import { runName, size, type Rule } from './facts';
import { finding } from './finding';
import { MOVEMENT_SOURCE } from './sources';
import { capital, sizePair } from './words';

/** A gap that is covered when the top is set and no longer when the wood has shrunk. */
export const gapOpensInWinter: Rule = (facts) =>
  facts.tops.runs.flatMap((laid) => {
    const run = facts.runById.get(laid.id);
    const wall = facts.wallById.get(laid.wall);
    const covers = facts.layout.fixing.backsplash;
    if (!run || !wall || run.side === 'back' || covers <= 0) return [];
    const { most } = backGaps(laid, run.backGap, wall);
    const shrinkage = shrinkageOf(laid.depth, facts.movement);
    if (most > covers || most + shrinkage <= covers) return [];
    const [gap, limit] = sizePair(most + shrinkage, covers, facts.layout.step);
    return [
      finding({
        code: 'gap-opens-in-winter',
        severity: 'warn',
        text: `${capital(runName(facts, run.id))} shrinks ${size(facts, shrinkage)} by the driest season: the gap at the wall opens to ${gap} and the backsplash covers ${limit}.`,
        action: 'Take a thicker backsplash, or scribe closer as far as the swelling allows.',
        at: { run: run.id, wall: run.wall },
        source: MOVEMENT_SOURCE,
      }),
    ];
  });
