import type { AddedStep, WorkPlan } from '../core/layout';
import type { Step } from './types';

/** A step of the order of work as a crew sees it: generated or added, with what somebody changed. */
export interface WorkStep extends Step {
  /** Stays when the words change: name of the generated step, or id of an added one. */
  readonly key: string;
  /** Keys of the steps that have to be done before, whatever the order. */
  readonly needs: readonly string[];
  readonly added: boolean;
  /** Words, caution or hours are not the generated ones. */
  readonly changed: boolean;
  /** Why it is left out; null when it is done. */
  readonly skipped: string | null;
}

const NOTHING_CHANGED: WorkPlan = { changes: [], added: [], order: [] };

/** Steps that need not wait for the ones before them in the generated order, and for which of those they still wait. */
const FREE: readonly { readonly step: RegExp; readonly from: RegExp }[] = [
  // The house can be made ready at any time before the tops come.
  { step: /^Clear and level/, from: /./ },
  // Edges and openings are shaped on the same glued-up tops, whichever first.
  { step: /^Profile the edges/, from: /^Cut the openings$/ },
  // Which site joint is drawn together first is the crew's to say, unless they share a piece.
  { step: /^Close .* on site/, from: /^Close .* on site/ },
];

const free = (step: string, from: string): boolean => FREE.some((rule) => rule.step.test(step) && rule.from.test(from));

/**
 * The order of work with what somebody changed: added steps, words, hours, steps left out, another order as far as the
 * work allows it.
 *
 * @param steps - as generated, in order
 * @returns every generated and added step once; none before one that it needs
 */
export function arrangeWork(steps: readonly Step[], work: WorkPlan = NOTHING_CHANGED): readonly WorkStep[] {
  const changes = new Map(work.changes.map((change) => [change.id, change]));
  const needs = needsOf(steps);
  const generated = steps.map((step): WorkStep => {
    const change = changes.get(step.step);
    const caution = change?.caution ?? step.caution;
    return {
      ...step,
      key: step.step,
      step: change?.text ?? step.step,
      hours: change?.hours ?? step.hours,
      ...(caution !== undefined && { caution }),
      needs: needs.get(step.step) ?? [],
      added: false,
      changed: change?.text !== undefined || change?.caution !== undefined || change?.hours !== undefined,
      skipped: change?.skipped ?? null,
    };
  });
  const all = work.added.reduce(
    (list, item) => insertAdded(list, addedStep(item, changes.get(item.id))),
    generated.slice() as readonly (WorkStep & { readonly before?: string })[],
  );
  return inOrder(all, work.order);
}

function addedStep(item: AddedStep, change: WorkPlan['changes'][number] | undefined): WorkStep & { before?: string } {
  const caution = change?.caution ?? item.caution;
  return {
    key: item.id,
    step: change?.text ?? item.text,
    part: item.part,
    after: [],
    needs: [],
    hours: change?.hours ?? item.hours,
    waitHours: 0,
    pieces: [],
    tools: [],
    consumables: [],
    ...(caution && { caution }),
    added: true,
    changed: false,
    skipped: change?.skipped ?? null,
    ...(item.before !== undefined && { before: item.before }),
  };
}

function insertAdded<T extends WorkStep & { readonly before?: string }>(list: readonly T[], step: T): readonly T[] {
  const named = list.findIndex((one) => one.key === step.before);
  const afterPart = list.findLastIndex((one) => one.part === step.part) + 1;
  const at = named >= 0 ? named : afterPart > 0 ? afterPart : step.part === 'shop' ? 0 : list.length;
  return [...list.slice(0, at), step, ...list.slice(at)];
}

/** For each step the ones it cannot go before: all that it follows, however far back, but those it is free from. */
function needsOf(steps: readonly Step[]): ReadonlyMap<string, readonly string[]> {
  const followed = new Map<string, Set<string>>();
  for (const step of steps) {
    const all = new Set<string>();
    for (const name of step.after) {
      all.add(name);
      for (const earlier of followed.get(name) ?? []) all.add(earlier);
    }
    followed.set(step.step, all);
  }
  const byName = new Map(steps.map((step) => [step.step, step]));
  return new Map(
    steps.map(({ step, pieces }) => [
      step,
      [...(followed.get(step) ?? [])].filter((name) => {
        const shared = byName.get(name)?.pieces.some((letter) => pieces.includes(letter)) ?? false;
        return !free(step, name) || (/^Close /.test(step) && shared);
      }),
    ]),
  );
}

/** As somebody put them, and never one before what it needs; steps that are not in the list stay behind their forerunner. */
function inOrder<T extends WorkStep>(steps: readonly T[], order: readonly string[]): readonly WorkStep[] {
  const present = new Set(steps.map((step) => step.key));
  const ranked = order.filter((key) => present.has(key));
  const listed = new Set(ranked);
  steps.forEach((step, i) => {
    if (listed.has(step.key)) return;
    const before = steps[i - 1]?.key;
    ranked.splice(before === undefined ? 0 : ranked.indexOf(before) + 1, 0, step.key);
    listed.add(step.key);
  });
  const rank = new Map(ranked.map((key, i) => [key, i]));
  const waiting = steps.slice().sort((a, b) => rank.get(a.key)! - rank.get(b.key)!);
  const done = new Set<string>();
  const arranged: WorkStep[] = [];
  while (waiting.length > 0) {
    const at = waiting.findIndex((step) => step.needs.every((key) => done.has(key) || !present.has(key)));
    const [next] = waiting.splice(Math.max(0, at), 1);
    done.add(next!.key);
    arranged.push(next!);
  }
  return arranged;
}

/**
 * The keys in the order in which this step has changed places with its neighbour, or null when the work does not allow it.
 *
 * @param by - -1 earlier, 1 later
 */
export function moveStep(steps: readonly WorkStep[], key: string, by: -1 | 1): readonly string[] | null {
  const at = steps.findIndex((step) => step.key === key);
  const other = steps[at + by];
  const step = steps[at];
  if (!step || !other) return null;
  const [first, second] = by === -1 ? [other, step] : [step, other];
  if (second.needs.includes(first.key)) return null;
  const keys = steps.map((one) => one.key);
  [keys[at], keys[at + by]] = [keys[at + by]!, keys[at]!];
  return keys;
}

/** The steps that are done, as the dated schedule takes them: each follows what it needs. */
export const stepsToDate = (steps: readonly WorkStep[]): readonly Step[] =>
  steps.filter((step) => step.skipped === null).map((step) => ({ ...step, step: step.key, after: step.needs }));
