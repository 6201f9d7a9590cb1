import type { NestInstance, NestPlan } from '@/geometry/nest/types';
import type { NestFinding } from './finding';

/** Slabs that exist in the number used, and every part cut as often as asked for, with one whole option of each choice. */
export function checkSupply(instance: NestInstance, plan: NestPlan): NestFinding[] {
  return [...checkStock(instance, plan), ...checkParts(instance, plan)];
}

function checkStock(instance: NestInstance, plan: NestPlan): NestFinding[] {
  const found: NestFinding[] = [];
  plan.slabs.forEach((slab, i) => {
    if (!instance.stock.some((s) => s.id === slab.stock))
      found.push({
        code: 'unknown_stock',
        slab: i,
        text: `Slab ${i + 1} is cut from ${slab.stock}, which is not in the stock.`,
      });
  });
  for (const stock of instance.stock) {
    const used = plan.slabs.filter((s) => s.stock === stock.id).length;
    if (stock.count != null && used > stock.count)
      found.push({ code: 'too_many_slabs', text: `${used} of ${stock.id} are used and there are ${stock.count}.` });
  }
  return found;
}

function checkParts(instance: NestInstance, plan: NestPlan): NestFinding[] {
  const cut = new Map<string, number>();
  for (const { id } of plan.slabs.flatMap((s) => s.parts)) cut.set(id, (cut.get(id) ?? 0) + 1);
  const found: NestFinding[] = [];
  for (const id of cut.keys())
    if (!instance.parts.some((p) => p.id === id))
      found.push({ code: 'unknown_part', text: `Part ${id} is not asked for.` });
  const optional = new Set((instance.choices ?? []).flatMap((c) => c.options.flat()));
  for (const part of instance.parts) {
    const wanted = part.count ?? 1;
    const have = cut.get(part.id) ?? 0;
    if (have > wanted)
      found.push({ code: 'part_twice', text: `Part ${part.id} is cut ${have} times instead of ${wanted}.` });
    if (have < wanted && !optional.has(part.id))
      found.push({ code: 'part_missing', text: `Part ${part.id} is cut ${have} times instead of ${wanted}.` });
  }
  return [...found, ...checkChoices(instance, plan, cut)];
}

function checkChoices(instance: NestInstance, plan: NestPlan, cut: ReadonlyMap<string, number>): NestFinding[] {
  const found: NestFinding[] = [];
  const wanted = new Map(instance.parts.map((p) => [p.id, p.count ?? 1]));
  for (const choice of instance.choices ?? []) {
    const whole = choice.options.flatMap((ids, o) =>
      ids.every((id) => (cut.get(id) ?? 0) >= wanted.get(id)!) ? [o] : [],
    );
    const touched = new Set(choice.options.flat().filter((id) => (cut.get(id) ?? 0) > 0));
    const exact = whole.filter((o) => [...touched].every((id) => choice.options[o]!.includes(id)));
    if (exact.length === 0) {
      const code = whole.length > 0 ? 'two_options_cut' : touched.size > 0 ? 'option_incomplete' : 'no_option_cut';
      const what = {
        two_options_cut: 'more than one option is',
        option_incomplete: 'only part of an option is',
        no_option_cut: 'no option is',
      };
      found.push({ code, text: `Choice ${choice.id}: ${what[code]} cut.` });
      continue;
    }
    const named = plan.choices.filter((c) => c.id === choice.id);
    if (named.length !== 1 || !exact.includes(named[0]!.option))
      found.push({
        code: 'choices_misreported',
        text: `Choice ${choice.id}: the plan does not name the option it cuts.`,
      });
  }
  return found;
}
