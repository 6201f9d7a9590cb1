import { z } from 'zod';

import { given, line, notNegative, size } from './fields';

const MOST_DEFECTS = 60;

/** A zone no piece may touch: inches from the slab's left end and front edge. */
export const defectSchema = z.strictObject({ x: notNegative, y: notNegative, w: size, h: size });

/** What a bought slab and an offcut have in common; lengths inches. */
export const woodFields = {
  species: given(60),
  thickness: size,
  length: size,
  depth: size,
  batch: line(80),
  faces: z.enum(['both', 'one']),
  defects: z.array(defectSchema).max(MOST_DEFECTS).readonly(),
};

interface Sized {
  readonly length?: number | undefined;
  readonly depth?: number | undefined;
  readonly defects?: readonly z.infer<typeof defectSchema>[] | undefined;
}

/** Adds an issue for every defect that does not lie on the slab. */
export function defectsLieOnSlab(wood: Sized, context: z.RefinementCtx): void {
  const { length, depth, defects } = wood;
  if (length === undefined || depth === undefined) return;
  defects?.forEach((defect, index) => {
    if (defect.x + defect.w <= length && defect.y + defect.h <= depth) return;
    context.addIssue({ code: 'custom', path: ['defects', index], message: 'has to lie on the slab' });
  });
}
