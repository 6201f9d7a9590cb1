import { makeColumn } from './column';
import { createMixSearch, type FoundPlan, type MixStep } from './mix-search';
import { groupsOf, recut } from './regroup';
import type { SearchState } from './search-state';

/** Work spent on a mix at first sight; twice as much whenever all undecided ones are looked at again. */
const FIRST_EFFORT = 20_000;
/** Most slabs of a group that is cut again, and groups already tried that may come up in a row before other work is done. */
const LARGEST_GROUP = 4;
const MOST_IDLE = 200;

/**
 * Mixes from the cheapest on. While none stays undecided, that alone leads to the best plan; from then on work is shared
 * between mixes at the lower end, mixes half way up to the best plan, and cutting a few slabs of that plan again.
 */
export function improve(state: SearchState, values: readonly number[]): void {
  const { context, below } = state;
  const mixes = createMixSearch(context, state.learnt, values);
  const regroup = createRegrouping(state, values);
  let effort = FIRST_EFFORT;
  let turn = 0;
  const over = (): boolean => state.done() || context.spend(0);

  const step = (atLeast: number): MixStep => {
    const result = mixes.step(below(), atLeast, effort);
    if (result.kind === 'found') state.offer(result.plan.patterns, result.plan.picked);
    state.raise(mixes.lower());
    return result;
  };

  while (!over()) {
    const { kind } = turn % 3 === 2 ? step((mixes.lower() + below()) / 2) : step(0);
    if (over()) return;
    if (mixes.undecided.length === 0 && kind === 'moved') continue;
    turn++;
    regroup(effort);
    if (turn % 3 !== 0 && kind === 'done') {
      if (mixes.undecided.length === 0) return;
      effort *= 2;
      mixes.reopen();
    }
  }
}

/** Cuts groups of slabs of the best plan again, each group once as long as it stays the same. */
function createRegrouping(state: SearchState, values: readonly number[]): (effort: number) => void {
  const tried = new Set<string>();
  let of: FoundPlan | null = null;
  let groups = groupsOf(2, 2);
  return (effort) => {
    const begun = state.spent();
    for (let idle = 0; idle < MOST_IDLE && state.spent() - begun < 2 * effort;) {
      const plan = state.plan();
      if (!plan || plan.patterns.length < 2 || state.done() || state.context.spend(0)) return;
      if (plan !== of) groups = groupsOf(plan.patterns.length, LARGEST_GROUP);
      of = plan;
      const group = groups.next().value as number[];
      const key = groupKey(plan, group);
      if (tried.has(key)) {
        idle++;
        continue;
      }
      tried.add(key);
      const better = recut(state.context, plan.patterns, group, values);
      if (better) state.offer([...plan.patterns.filter((_, i) => !group.includes(i)), ...better], plan.picked);
    }
  };
}

const groupKey = (plan: FoundPlan, group: readonly number[]): string =>
  group
    .map((i) => makeColumn(plan.patterns[i]!).key)
    .sort()
    .join(' ');
