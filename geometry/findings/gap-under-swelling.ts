import { leastBackGap, swellingOf } from '../wood/movement';
import { runName, size, type Rule } from './facts';
import { finding } from './finding';
import { MOVEMENT_SOURCE } from './sources';
import { capital, sizePair } from './words';

/** A back gap that the top outgrows in its wettest season. */
export const gapUnderSwelling: Rule = (facts) =>
  facts.tops.runs.flatMap((laid) => {
    const run = facts.runById.get(laid.id);
    const swelling = swellingOf(laid.depth, facts.movement);
    if (!run || run.backGap >= swelling) return [];
    const [gap, grows] = sizePair(run.backGap, swelling, facts.layout.step);
    return [
      finding({
        code: 'gap-under-swelling',
        severity: 'stop',
        text: `${capital(runName(facts, run.id))} has a back gap of ${gap} and grows ${grows} by the wettest season.`,
        action: `Make the back gap ${size(facts, leastBackGap(laid.depth, facts.movement))} or more, or let the slabs settle in damper air before cutting.`,
        at: { run: run.id, wall: run.wall },
        source: MOVEMENT_SOURCE,
      }),
    ];
  });
