import { z } from 'zod';

import { contract } from './contract';
import { cents, given, line, notNegative, size, uuid } from './fields';
import { defectsLieOnSlab, woodFields } from './wood-fields';

const count = z.number().int().min(0).max(10_000).nullable();

const fields = {
  /** Short name that plans and sheets call it by; no two slabs of a shop share one. */
  code: given(40),
  ...woodFields,
  priceCents: cents,
  /** Null: as many as wanted. */
  count,
  /** Cut off at each factory end; null: as the layout says. */
  trim: notNegative.nullable(),
  /** Where the maker's depth is off. */
  measuredDepth: size.nullable(),
  /** Bow of the edge over the whole length. */
  crook: notNegative.nullable(),
  /** Taken off the depth to straighten an edge. */
  straightening: notNegative.nullable(),
  supplier: line(200),
};

type Sizes = { readonly [K in 'length' | 'depth' | 'trim' | 'straightening']?: number | null | undefined };

function leavesWood({ length, depth, trim, straightening }: Sizes, context: z.RefinementCtx): void {
  if (length && trim && 2 * trim >= length) {
    context.addIssue({ code: 'custom', path: ['trim'], message: 'leaves nothing of the length' });
  }
  if (depth && straightening && straightening >= depth) {
    context.addIssue({ code: 'custom', path: ['straightening'], message: 'leaves nothing of the depth' });
  }
}

export const stockSlabSchema = z.strictObject({
  id: uuid,
  ...fields,
  /** Null for those who do not see prices. */
  priceCents: cents.nullable(),
});

export type StockSlab = z.infer<typeof stockSlabSchema>;

const newSlab = z
  .strictObject({
    ...fields,
    batch: fields.batch.default(''),
    faces: fields.faces.default('both'),
    defects: fields.defects.default([]),
    count: count.default(null),
    trim: fields.trim.default(null),
    measuredDepth: fields.measuredDepth.default(null),
    crook: fields.crook.default(null),
    straightening: fields.straightening.default(null),
    supplier: fields.supplier.default(''),
  })
  .superRefine(defectsLieOnSlab)
  .superRefine(leavesWood);

/** Most slabs of one import. */
const MOST_IMPORTED = 500;

const slabParams = z.strictObject({ slabId: uuid });

export const listStock = contract({
  method: 'get',
  path: '/stock',
  summary: 'Slabs that can be bought, by species, thickness and length.',
  may: 'stock.see',
  response: z.strictObject({ currency: z.string(), slabs: z.array(stockSlabSchema) }),
  problems: [],
});

export const createStock = contract({
  method: 'post',
  path: '/stock',
  summary: 'Add a slab that can be bought.',
  may: 'stock.edit',
  creates: true,
  body: newSlab,
  response: stockSlabSchema,
  problems: ['code_taken'],
});

export const updateStock = contract({
  method: 'patch',
  path: '/stock/:slabId',
  summary: 'Change a slab; what is left out stays. Layouts that name it keep what they have.',
  may: 'stock.edit',
  params: slabParams,
  body: z.strictObject(fields).partial(),
  response: stockSlabSchema,
  problems: ['not_found', 'code_taken'],
});

export const deleteStock = contract({
  method: 'delete',
  path: '/stock/:slabId',
  summary: 'Take a slab out of the list. Layouts that name it keep what they have.',
  may: 'stock.edit',
  params: slabParams,
  response: null,
  problems: ['not_found'],
});

export const importStock = contract({
  method: 'post',
  path: '/stock/import',
  summary: 'Add many slabs at once; those whose code is taken are named and left out, the others are kept.',
  may: 'stock.edit',
  creates: true,
  body: z.strictObject({ slabs: z.array(newSlab).min(1).max(MOST_IMPORTED).readonly() }),
  response: z.strictObject({
    added: z.array(stockSlabSchema),
    refused: z.array(z.strictObject({ index: z.number().int(), code: z.string(), message: z.string() })),
  }),
  problems: [],
});

export const removeStock = contract({
  method: 'post',
  path: '/stock/removals',
  summary: 'Take many slabs out of the list at once: the undo of an import. Slabs that are gone already do no harm.',
  may: 'stock.edit',
  body: z.strictObject({ ids: z.array(uuid).min(1).max(MOST_IMPORTED).readonly() }),
  response: z.strictObject({ removed: z.number().int() }),
  problems: [],
});

/** Checks a slab as it would be after a change. */
export const wholeSlabSchema = z.strictObject(fields).superRefine(defectsLieOnSlab).superRefine(leavesWood);
