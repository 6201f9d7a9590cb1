import { backGaps } from '../wood/back-gaps';
import { runName, size, wallName, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { sizePair } from './words';

/** A gap behind the top, wide where the wall is hollow, that the backsplash does not cover. */
export const gapNotCovered: Rule = (facts) =>
  facts.tops.runs.flatMap((laid) => {
    const run = facts.runById.get(laid.id);
    const wall = facts.wallById.get(laid.wall);
    const covers = facts.layout.fixing.backsplash;
    if (!run || !wall || run.side === 'back') return [];
    const { most, mostAt } = backGaps(laid, run.backGap, wall);
    if (most <= covers) return [];
    const [gap, limit] = sizePair(most, covers, facts.layout.step);
    return [
      finding({
        code: 'gap-not-covered',
        severity: 'warn',
        text: `Behind ${runName(facts, run.id)} the gap is ${gap} at ${size(facts, mostAt)} along wall ${wallName(facts, wall.id)}; ${covers > 0 ? `the backsplash covers ${limit}` : `there is no backsplash (${limit}) to cover it`}.`,
        action:
          covers > 0
            ? 'Scribe the back edge to the wall or take a thicker backsplash.'
            : 'Scribe the back edge to the wall or add a backsplash.',
        at: { run: run.id, wall: wall.id },
        source: PRACTICE,
      }),
    ];
  });
