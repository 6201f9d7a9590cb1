import { cheapestMix } from '../bound/cheapest-mix';
import type { Copy, Problem } from '../model/problem';
import type { Proof, ProvenCut } from '../search/context';
import type { Learnt, SmallMix } from '../search/mix-search';
import type { NestChosen, NestEvidence, NestPriceTag, NestValuation, NestValue } from '../types';

const MIX_NODES = 200_000;

/** Only those cuts and mixes without which the bound would not stand, in the words of the plan. */
export function evidenceFor(problem: Problem, lower: number, { cuts, tooSmall }: Learnt): NestEvidence {
  const program = { prices: problem.stock.map((s) => s.price), counts: problem.stock.map((s) => s.count) };
  const stands = (keptCuts: readonly ProvenCut[], keptMixes: readonly SmallMix[]): boolean =>
    keptCuts.length > 0 &&
    cheapestMix({ ...program, cuts: keptCuts, tooSmall: keptMixes }, lower, MIX_NODES).kind === 'none';
  let mixes: readonly SmallMix[] = tooSmall;
  for (const mix of tooSmall) {
    const fewer = mixes.filter((m) => m !== mix);
    if (stands(cuts, fewer)) mixes = fewer;
  }
  let needed: readonly ProvenCut[] = cuts;
  for (const cut of cuts) {
    const fewer = needed.filter((c) => c !== cut || c.proof === null);
    if (stands(fewer, mixes)) needed = fewer;
  }
  return {
    valuations: needed.flatMap((cut) => (cut.proof ? [valuation(problem, cut.proof)] : [])),
    tooSmall: mixes.map((mix) => ({
      ...valuation(problem, mix.proof),
      slabs: problem.stock.flatMap((s) =>
        mix.slabs[s.index]! > 0 ? [{ stock: s.slab.id, count: mix.slabs[s.index]! }] : [],
      ),
      choices: chosen(problem, mix.picked),
    })),
  };
}

/** The options that a plan cuts, in the instance's own choices. */
export const chosen = (problem: Problem, picked: readonly number[]): NestChosen[] =>
  picked.flatMap((o, c) => problem.choices[c]!.options[o]!.picks);

/** What one of each part is worth; the members of a group share its value. */
export function priceTags(problem: Problem, value: readonly number[], copies: readonly Copy[]): NestPriceTag[] {
  const tags = new Map<string, number>();
  for (const { item, ids } of copies) for (const id of ids) tags.set(id, value[item]! / ids.length);
  return [...tags].map(([id, cents]) => ({ id, cents }));
}

function valuation(problem: Problem, { value, penalties }: Proof): NestValuation {
  const copies = distinctCopies(problem);
  const inWords = (amounts: readonly number[]): NestValue[] =>
    copies.flatMap(({ item, ids }) => (amounts[item]! > 0 ? [{ parts: ids, cents: amounts[item]! }] : []));
  return { values: inWords(value), penalties: penalties.map(inWords) };
}

/** Each part or glued group of any option once. */
function distinctCopies(problem: Problem): Copy[] {
  const byIds = new Map<string, Copy>();
  const all = [problem.fixed, ...problem.choices.flatMap((c) => c.options)].flatMap((o) => o.copies);
  for (const copy of all) byIds.set(JSON.stringify(copy.ids), copy);
  return [...byIds.values()];
}
