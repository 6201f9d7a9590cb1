import type { Item, Option, Problem } from '../model/problem';
import { FIT } from '../model/tolerance';
import type { MixCut } from './cheapest-mix';

/**
 * The area bound as a cut on what is bought, valid for every plan whatever its cuts: parts lie at least a kerf apart, so
 * each may be swollen by half a kerf all round without two of them overlapping, inside a slab swollen the same way. A
 * convex part of area A and girth P swells to A + P k/2 + pi (k/2)^2 (Steiner's formula).
 */
export function areaCut(problem: Problem): MixCut {
  const half = problem.kerf / 2;
  const swollen = problem.items.map((item) => swollenArea(item, half));
  const need = (option: Option): number => option.need.reduce((sum, n, i) => sum + n * swollen[i]!, 0);
  return {
    worth: problem.stock.map((s) => Math.max(0, s.usable + 2 * half + FIT) * (s.depth + 2 * half + FIT)),
    need: need(problem.fixed),
    optionNeed: problem.choices.map((choice) => choice.options.map(need)),
  };
}

function swollenArea(item: Item, half: number): number {
  return item.members.reduce((sum, { shape }) => {
    const girth = shape.outline.reduce((total, [x, y], i) => {
      const [nx, ny] = shape.outline[(i + 1) % shape.outline.length]!;
      return total + Math.hypot(nx - x, ny - y);
    }, 0);
    return sum + shape.area + girth * half + Math.PI * half * half;
  }, 0);
}
