import type { NestError, NestInstance, NestPart } from '../types';
import { groupItem, singleItem, type PlainItem } from './glue';
import type { PartShape } from './part-shape';
import type { Choice, Copy, Item, Option, Problem, Stock } from './problem';
import { FIT } from './tolerance';
import { inches, problem, validate } from './validate';

/** Most ways that choices tied together by groups may be settled. */
const MOST_TIED_OPTIONS = 4096;

type Picks = Option['picks'];

/** The problem behind an instance: equal parts merged, groups glued, choices that share a group joined; or what is wrong with it. */
export function normalise(instance: NestInstance): Problem | NestError {
  const checked = validate(instance);
  if ('error' in checked) return checked;
  const stock = instance.stock.map((slab, index): Stock => {
    const trim = slab.trim ?? instance.trim;
    const count = slab.count ?? Infinity;
    return { index, slab, trim, count, usable: slab.length - 2 * trim, depth: slab.depth, price: slab.price };
  });
  const items = createItems(instance, checked.shapes);
  const blocks = tiedBlocks(instance);
  const inBlocks = new Set(
    blocks.flatMap((b) => [...b.fixed, ...b.choices.flatMap((c) => instance.choices![c]!.options.flat())]),
  );
  const fixed = items.option(new Set(instance.parts.map((p) => p.id).filter((id) => !inBlocks.has(id))), []);
  const tooBig = fixed.copies.find((copy) => !fitsSome(items.list[copy.item]!, stock));
  if (tooBig) return fitError(instance, items.list[tooBig.item]!, tooBig.ids, stock);
  const choices: Choice[] = [];
  for (const block of blocks) {
    const settled = blockOptions(instance, block, items.option);
    if ('error' in settled) return settled;
    const options = settled.filter((o) => o.copies.every((copy) => fitsSome(items.list[copy.item]!, stock)));
    if (options.length === 0) {
      const copy = settled[0]!.copies.find((c) => !fitsSome(items.list[c.item]!, stock))!;
      return fitError(instance, items.list[copy.item]!, copy.ids, stock);
    }
    choices.push({ options });
  }
  const pad = (o: Option): Option => ({ ...o, need: items.list.map((_, i) => o.need[i] ?? 0) });
  return {
    instance,
    kerf: instance.kerf,
    items: items.list,
    stock,
    fixed: pad(fixed),
    choices: choices.map((c) => ({ options: c.options.map(pad) })),
  };
}

/** Collects items, giving equal ones the same index. */
function createItems(instance: NestInstance, shapes: readonly PartShape[]) {
  const list: Item[] = [];
  const byKey = new Map<string, number>();
  const partIndex = new Map(instance.parts.map((p, i) => [p.id, i]));

  function add(item: PlainItem): number {
    const key = itemKey(item);
    let index = byKey.get(key);
    if (index === undefined) {
      index = list.length;
      byKey.set(key, index);
      list.push({ ...item, index });
    }
    return index;
  }

  /** Everything cut when these parts are: groups first (of those members that are cut), then what is left of each part. */
  function option(ids: ReadonlySet<string>, picks: Picks): Option {
    const left = new Map<string, number>();
    for (const id of ids) left.set(id, instance.parts[partIndex.get(id)!]!.count ?? 1);
    const copies: Copy[] = [];
    for (const group of instance.groups ?? []) {
      const members = group.parts.filter((id) => (left.get(id) ?? 0) > 0);
      if (members.length < 2) continue;
      members.forEach((id) => left.set(id, left.get(id)! - 1));
      const parts = members.map((id) => partIndex.get(id)!);
      const glued = parts.map((part) => ({ part, shape: shapes[part]!, turn: allows(instance.parts[part]!.turn) }));
      copies.push({ item: add(groupItem(glued, instance.kerf)), ids: members });
    }
    const grouped = new Set((instance.groups ?? []).flatMap((g) => g.parts));
    for (const [id, count] of left) {
      const part = partIndex.get(id)!;
      const { turn, turnOver } = instance.parts[part]!;
      // A group of which only one member is cut still keeps that member face up.
      const over = allows(turnOver) && !(grouped.has(id) && count === (instance.parts[part]!.count ?? 1));
      const item = count > 0 ? add(singleItem(part, shapes[part]!, allows(turn), over)) : -1;
      for (let n = 0; n < count; n++) copies.push({ item, ids: [id] });
    }
    const need = list.map(() => 0);
    copies.forEach((copy) => need[copy.item]!++);
    return { copies, need, picks };
  }
  return { list, option };
}

const allows = (move: NestPart['turn']): boolean => move !== false;

function itemKey(item: PlainItem): string {
  const numbers = item.members.flatMap((m) => [m.at, ...m.shape.outline.flat()]);
  return `${item.turn}${item.over}|${numbers.map((x) => x.toFixed(9)).join()}`;
}

interface Block {
  readonly choices: readonly number[];
  readonly fixed: readonly string[];
}

/** Choices tied together by groups that hold parts of both, each with the always-cut parts of those groups. */
function tiedBlocks(instance: NestInstance): Block[] {
  const choices = instance.choices ?? [];
  const owner = new Map<string, number>();
  choices.forEach((choice, c) => choice.options.flat().forEach((id) => owner.set(id, c)));
  const root = choices.map((_, c) => c);
  const find = (c: number): number => (root[c] === c ? c : find(root[c]!));
  const fixed = new Map<string, number>();
  for (const group of instance.groups ?? []) {
    const tied = group.parts.flatMap((id) => owner.get(id) ?? []);
    if (tied.length === 0) continue;
    tied.forEach((c) => (root[find(c)] = find(tied[0]!)));
    group.parts.filter((id) => !owner.has(id)).forEach((id) => fixed.set(id, tied[0]!));
  }
  return [...new Set(choices.map((_, c) => find(c)))].map((r) => ({
    choices: choices.flatMap((_, c) => (find(c) === r ? [c] : [])),
    fixed: [...fixed].filter(([, c]) => find(c) === r).map(([id]) => id),
  }));
}

function blockOptions(
  instance: NestInstance,
  block: Block,
  option: (ids: ReadonlySet<string>, picks: Picks) => Option,
): Option[] | NestError {
  let combos: Picks[] = [[]];
  for (const c of block.choices) {
    const choice = instance.choices![c]!;
    combos = combos.flatMap((picks) => choice.options.map((_, o) => [...picks, { id: choice.id, option: o }]));
    if (combos.length > MOST_TIED_OPTIONS)
      return problem(
        'bad_choice',
        ['choices', c],
        `Choice ${choice.id} is tied by groups to too many others: ${combos.length} ways.`,
      );
  }
  return combos.map((picks) => {
    const ids = new Set(block.fixed);
    picks.forEach((pick, k) =>
      instance.choices![block.choices[k]!]!.options[pick.option]!.forEach((id) => ids.add(id)),
    );
    return option(ids, picks);
  });
}

const fitsSome = (item: Item, stock: readonly Stock[]): boolean =>
  stock.some((s) => s.count > 0 && item.depth <= s.depth + FIT && item.box <= s.usable + FIT);

function fitError(instance: NestInstance, item: Item, ids: readonly string[], stock: readonly Stock[]): NestError {
  const trims = Math.min(...stock.map((s) => 2 * s.trim));
  const need = `at least ${inches(item.box + trims)} long and ${inches(item.depth)} deep`;
  const what = ids.length > 1 ? `The parts ${ids.join(', ')}, cut from one slab, fit` : `Part ${ids[0]} fits`;
  const path = ['parts', instance.parts.findIndex((p) => p.id === ids[0])];
  return problem(
    'part_fits_no_slab',
    path,
    `${what} no slab: ${ids.length > 1 ? 'they need' : 'it needs'} one ${need}.`,
  );
}
