import type { Problem } from '../model/problem';
import type { NestPlanSlab } from '../types';
import { cutTree, type Leaf, type RowNode } from './cut-tree';
import { leafOutline } from './leaf-outline';
import { offcutsOf } from './offcuts';
import type { Pattern } from './pattern';
import { nameCuts } from './name-cuts';
import { sawCuts } from './saw-cuts';

/**
 * Places, saw cuts and offcuts of every pattern, with each copy given the id of a part it stands for.
 *
 * @param picked - option of each choice that the patterns cut
 * @throws RangeError when a pattern does not fit its slab or cuts more copies than there are
 */
export function assemble(problem: Problem, patterns: readonly Pattern[], picked: readonly number[]): NestPlanSlab[] {
  const copies = [problem.fixed, ...problem.choices.map((choice, c) => choice.options[picked[c]!]!)].flatMap(
    (o) => o.copies,
  );
  const waiting = problem.items.map((item) =>
    copies.filter((copy) => copy.item === item.index).map((copy) => copy.ids),
  );
  return patterns.map((pattern) => {
    const stock = problem.stock[pattern.stock]!;
    const tree = cutTree(problem, pattern);
    if (!tree) throw new RangeError(`a pattern is longer than slab ${stock.slab.id}`);
    const leaves = leavesOf(tree);
    const ids = new Map<string, readonly string[]>();
    const named = leaves.map((leaf) => {
      const key = `${leaf.item}/${leaf.copy}`;
      if (!ids.has(key)) {
        const next = waiting[leaf.item]!.shift();
        if (!next) throw new RangeError('a pattern cuts more copies than there are');
        ids.set(key, next);
      }
      return { leaf, id: ids.get(key)![leaf.memberIndex]!, outline: leafOutline(leaf) };
    });
    return {
      stock: stock.slab.id,
      parts: named.map(({ leaf: { x, y, turned, over }, id }) => ({ id, x, y, turned, turnedOver: over })),
      cuts: nameCuts(sawCuts(tree, problem.kerf), named),
      offcuts: offcutsOf(tree, stock.slab, stock.trim, problem.kerf, problem.instance.reuseMin),
    };
  });
}

/** Parts of a tree from left to right, front to back. */
function leavesOf(row: RowNode): Leaf[] {
  return row.pieces.flatMap(({ node }) => (node.kind === 'part' ? [node] : node.lanes.flatMap(leavesOf)));
}
