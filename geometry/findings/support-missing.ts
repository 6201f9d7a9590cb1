import { bracketNeeds, ledgerNeeds, SPAN_LIMIT, type SupportNeed } from '../wood/level-support';
import { sourceText } from '../wood/sourced';
import { size, wallName, wallsOf, type Facts, type Rule } from './facts';
import { finding } from './finding';
import type { Finding } from './types';
import { sizePair } from './words';

/** Corners with no cabinet under the joint, and openings wider than a top spans. */
export const supportMissing: Rule = (facts) => [
  ...facts.tops.joints
    .flatMap((joint) => ledgerNeeds(joint, wallsOf(facts, joint), facts))
    .map((need) => ledger(facts, need)),
  ...bracketNeeds(facts).flatMap((need) =>
    (facts.runsByWall.get(need.wall) ?? []).some((run) => run.backFrom < need.to && run.backTo > need.from)
      ? [bracket(facts, need)]
      : [],
  ),
];

function ledger(facts: Facts, { wall, from, to }: SupportNeed): Finding {
  return finding({
    code: 'ledger-needed',
    severity: 'note',
    text: `On wall ${wallName(facts, wall)} the last ${size(facts, to - from)} at the corner have no cabinet under the top.`,
    action: `Screw a ledger of ${size(facts, to - from)} to the wall at cabinet height.`,
    at: { wall, detail: 'ledger' },
    source: 'common practice',
  });
}

function bracket(facts: Facts, { wall, from, to, base }: SupportNeed): Finding {
  const [wide, limit] = sizePair(to - from, SPAN_LIMIT.value, facts.layout.step);
  return finding({
    code: 'bracket-needed',
    severity: 'warn',
    text: `The opening on wall ${wallName(facts, wall)} is ${wide} wide; a top spans ${limit} without a bracket.`,
    action: 'Fix brackets or a rail to both neighbors.',
    at: { wall, base: base ?? undefined },
    source: sourceText(SPAN_LIMIT),
  });
}
