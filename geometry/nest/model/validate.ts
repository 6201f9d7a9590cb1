import type { NestError, NestInstance, NestProblemCode } from '../types';
import { partShape, type PartShape } from './part-shape';

export const problem = (code: NestProblemCode, path: (string | number)[], message: string): NestError => ({
  error: { code, message, path },
});

/** Inches as a person reads them: two decimals at most. */
export const inches = (x: number): string => `${Math.round(x * 100) / 100} in`;
const positive = (x: number): boolean => Number.isFinite(x) && x > 0;
const natural = (x: number): boolean => Number.isInteger(x) && x >= 0;

/** Reads every part's shape, or says in a sentence what is wrong with the instance. */
export function validate(instance: NestInstance): { readonly shapes: readonly PartShape[] } | NestError {
  const wrong = checkSettings(instance) ?? checkStock(instance);
  if (wrong) return wrong;
  const shapes: PartShape[] = [];
  const ids = new Set<string>();
  for (const [i, part] of instance.parts.entries()) {
    const path = ['parts', i];
    if (ids.has(part.id)) return problem('bad_part', [...path, 'id'], `Two parts are called ${part.id}.`);
    ids.add(part.id);
    if (part.count !== undefined && !natural(part.count))
      return problem('bad_part', [...path, 'count'], `Part ${part.id}: the count must be a whole number, 0 or more.`);
    const shape = readShape(instance, i);
    if ('error' in shape) return shape;
    shapes.push(shape);
  }
  return checkChoices(instance, ids) ?? checkGroups(instance, ids) ?? { shapes };
}

function checkSettings({ kerf, trim, reuseMin }: NestInstance): NestError | null {
  if (!(Number.isFinite(kerf) && kerf >= 0)) return problem('bad_setting', ['kerf'], 'The kerf must be 0 or more.');
  if (!(Number.isFinite(trim) && trim >= 0)) return problem('bad_setting', ['trim'], 'The trim must be 0 or more.');
  if (!(Number.isFinite(reuseMin) && reuseMin >= 0))
    return problem('bad_setting', ['reuseMin'], 'The shortest offcut to keep must be 0 or more.');
  return null;
}

function checkStock({ stock, trim }: NestInstance): NestError | null {
  if (stock.length === 0)
    return problem('no_stock', ['stock'], 'There are no slabs to cut from: add one to the stock.');
  const ids = new Set<string>();
  for (const [i, slab] of stock.entries()) {
    const say = (key: string, text: string): NestError =>
      problem('bad_stock', ['stock', i, key], `Slab ${slab.id}: ${text}`);
    if (ids.has(slab.id)) return problem('bad_stock', ['stock', i, 'id'], `Two slabs are called ${slab.id}.`);
    ids.add(slab.id);
    if (!positive(slab.length)) return say('length', 'the length must be more than 0.');
    if (!positive(slab.depth)) return say('depth', 'the depth must be more than 0.');
    if (slab.price < 0) return say('price', 'the price is negative.');
    if (!natural(slab.price)) return say('price', 'the price must be whole cents.');
    if (slab.count != null && !natural(slab.count)) return say('count', 'the count must be a whole number, 0 or more.');
    const ends = slab.trim ?? trim;
    if (!(Number.isFinite(ends) && ends >= 0)) return say('trim', 'the trim must be 0 or more.');
    for (const zone of slab.defects ?? [])
      if (![zone.x, zone.y].every(Number.isFinite) || !(zone.w >= 0) || !(zone.h >= 0))
        return say('defects', 'a defect needs a place and a size.');
  }
  return null;
}

function readShape({ parts, kerf }: NestInstance, i: number): PartShape | NestError {
  const part = parts[i]!;
  const path = ['parts', i, 'outline'];
  if (!part.outline.flat().every(Number.isFinite))
    return problem('bad_part', path, `Part ${part.id}: a corner of the outline is not a number.`);
  try {
    const shape = partShape(part.outline);
    if (Math.min(shape.length, shape.depth) <= kerf)
      return problem(
        'bad_part',
        path,
        `Part ${part.id} is ${inches(Math.min(shape.length, shape.depth))} wide, no wider than the saw cut of ${inches(kerf)}.`,
      );
    return shape;
  } catch (cause) {
    if (!(cause instanceof RangeError)) throw cause;
    return problem('bad_part', path, `Part ${part.id}: the ${cause.message}.`);
  }
}

function checkChoices({ choices = [] }: NestInstance, ids: ReadonlySet<string>): NestError | null {
  const owner = new Map<string, string>();
  for (const [c, choice] of choices.entries()) {
    if (choice.options.length === 0)
      return problem('bad_choice', ['choices', c], `Choice ${choice.id} has no options.`);
    for (const [o, option] of choice.options.entries())
      for (const id of option) {
        const path = ['choices', c, 'options', o];
        if (!ids.has(id))
          return problem('bad_choice', path, `Choice ${choice.id} names part ${id}, which is not listed.`);
        const other = owner.get(id);
        if (other !== undefined && other !== choice.id)
          return problem('bad_choice', path, `Part ${id} is named in two choices (${other} and ${choice.id}).`);
        owner.set(id, choice.id);
      }
  }
  return null;
}

function checkGroups({ groups = [] }: NestInstance, ids: ReadonlySet<string>): NestError | null {
  const taken = new Map<string, string>();
  for (const [g, group] of groups.entries()) {
    const path = ['groups', g, 'parts'];
    if (group.parts.length === 0) return problem('bad_group', path, `Group ${group.id} has no parts.`);
    for (const id of group.parts) {
      if (!ids.has(id)) return problem('bad_group', path, `Group ${group.id} names part ${id}, which is not listed.`);
      const other = taken.get(id);
      if (other !== undefined)
        return problem('bad_group', path, `Part ${id} is named twice in groups (${other} and ${group.id}).`);
      taken.set(id, group.id);
    }
  }
  return null;
}
