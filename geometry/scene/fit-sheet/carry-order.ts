import type { Plan } from '../../plan/types';
import { sectionLoads, type SectionLoad } from '../../wood/section-loads';

/** One carry: what is set as the first, the second … */
export interface Carry extends SectionLoad {
  readonly n: number;
}

/**
 * The order in which sections are carried in and set: those that most others meet first, so that every later one is
 * pushed against what lies already; among equals the longest first, while there is room to turn. Strips come last.
 */
export function carryOrder(plan: Plan): readonly Carry[] {
  const meets = new Map<string, number>();
  for (const { letters } of [...plan.joints, ...plan.seams])
    for (const letter of letters) meets.set(letter, (meets.get(letter) ?? 0) + 1);
  const strips = new Set(plan.pieces.filter((piece) => piece.kind === 'strip').map((piece) => piece.letter));
  const rank = (load: SectionLoad): readonly [number, number, number] => [
    load.letters.some((letter) => strips.has(letter)) ? 1 : 0,
    -load.letters.reduce((sum, letter) => sum + (meets.get(letter) ?? 0), 0),
    -load.span,
  ];
  return sectionLoads(plan.tops, plan.pieces)
    .map((load, i) => ({ load, i, rank: rank(load) }))
    .sort((a, b) => a.rank[0] - b.rank[0] || a.rank[1] - b.rank[1] || a.rank[2] - b.rank[2] || a.i - b.i)
    .map(({ load }, i) => ({ ...load, n: i + 1 }));
}
