import { formatLength } from '@/geometry/tape/format-length';
import { parseLength } from '@/geometry/tape/parse-length';
import type { ParsedBody } from '@/shared/contracts/contract';
import { createStock, type StockSlab } from '@/shared/contracts/stock';

/** A slab as it is typed, in the shop's units; the same words head the columns of a CSV file. */
export const SLAB_FIELDS = [
  'code',
  'species',
  'thickness',
  'length',
  'depth',
  'price',
  'count',
  'faces',
  'batch',
  'supplier',
  'measured depth',
  'crook',
  'straightening',
  'trim',
] as const;

export type SlabField = (typeof SLAB_FIELDS)[number];
export type SlabTexts = Partial<Record<SlabField, string>>;
export type SlabBody = ParsedBody<typeof createStock>;

export type ReadSlab =
  | { readonly ok: true; readonly slab: SlabBody }
  | { readonly ok: false; readonly errors: Partial<Record<SlabField, string>> };

/** Field of the form for a place in the slab. */
const FIELD_OF: Readonly<Record<string, SlabField>> = {
  priceCents: 'price',
  measuredDepth: 'measured depth',
};

/** Reads a slab as typed; every field that is none has its own sentence, and what was typed stays with the caller. */
export function readSlab(texts: SlabTexts, metric: boolean): ReadSlab {
  const errors: Partial<Record<SlabField, string>> = {};
  const text = (field: SlabField) => (texts[field] ?? '').trim();
  const needed = (field: SlabField): string => {
    if (text(field) === '') errors[field] = 'This has to be filled in.';
    return text(field);
  };
  const length = (field: SlabField, optional: boolean): number | null => {
    if (text(field) === '') {
      if (!optional) errors[field] = 'This has to be filled in.';
      return null;
    }
    const parsed = parseLength(text(field), metric ? 'mm' : 'in');
    if (!parsed.ok) errors[field] = parsed.message;
    else if (!optional && parsed.value <= 0) errors[field] = 'This has to be more than nothing.';
    return parsed.ok ? parsed.value : null;
  };
  const slab = {
    code: needed('code'),
    species: needed('species').toLowerCase(),
    thickness: length('thickness', false) ?? 0,
    length: length('length', false) ?? 0,
    depth: length('depth', false) ?? 0,
    priceCents: readPrice(needed('price'), errors),
    count: readCount(text('count'), errors),
    faces: readFaces(text('faces'), errors),
    batch: text('batch'),
    supplier: text('supplier'),
    measuredDepth: length('measured depth', true),
    crook: length('crook', true),
    straightening: length('straightening', true),
    trim: length('trim', true),
  };
  if (Object.keys(errors).length > 0) return { ok: false, errors };
  const checked = createStock.body!.safeParse(slab);
  if (checked.success) return { ok: true, slab: checked.data as SlabBody };
  for (const { path, message } of checked.error.issues) {
    const place = String(path[0]);
    errors[FIELD_OF[place] ?? (place as SlabField)] ??= `This ${message}.`.replace(/\.\.$/, '.');
  }
  return { ok: false, errors };
}

/** "379", "$379.00", "1,247.50" in cents. */
function readPrice(text: string, errors: Partial<Record<SlabField, string>>): number {
  if (text === '') return 0;
  const plain = text.replaceAll(/[\s,$€£]/g, '');
  if (/^-/.test(plain)) errors.price = `${text} is negative. A price is never under zero.`;
  else if (!/^\d{1,6}(\.\d{1,2})?$/.test(plain)) errors.price = `${text} is no price. Type it like 379 or 379.50.`;
  return Math.round(Number(plain) * 100) || 0;
}

function readCount(text: string, errors: Partial<Record<SlabField, string>>): number | null {
  if (text === '') return null;
  if (/^\d{1,4}$/.test(text)) return Number(text);
  errors.count = `${text} is no number of slabs. Leave it empty for as many as wanted.`;
  return null;
}

function readFaces(text: string, errors: Partial<Record<SlabField, string>>): 'both' | 'one' {
  const word = text.toLowerCase();
  if (word === '' || word.startsWith('both') || word === '2') return 'both';
  if (word.startsWith('one') || word === '1') return 'one';
  errors.faces = `${text} is not known. Write both or one.`;
  return 'both';
}

/** A slab as it would be typed. */
export function slabTexts(slab: StockSlab, metric: boolean): SlabTexts {
  const size = (inches: number | null) => (inches === null ? '' : formatLength(inches, metric ? '0.5 mm' : '1/64'));
  return {
    code: slab.code,
    species: slab.species,
    thickness: size(slab.thickness),
    length: size(slab.length),
    depth: size(slab.depth),
    price: slab.priceCents === null ? '' : (slab.priceCents / 100).toFixed(2),
    count: slab.count === null ? '' : String(slab.count),
    faces: slab.faces,
    batch: slab.batch,
    supplier: slab.supplier,
    'measured depth': size(slab.measuredDepth),
    crook: size(slab.crook),
    straightening: size(slab.straightening),
    trim: size(slab.trim),
  };
}
