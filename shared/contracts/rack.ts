import { z } from 'zod';

import { contract } from './contract';
import { cents, line, moment, uuid } from './fields';
import { defectsLieOnSlab, woodFields } from './wood-fields';

/** Between the front edge and the end, inside the piece; 90 is square. */
const angleDeg = z.number().min(5).max(175);

const fields = {
  ...woodFields,
  leftAngleDeg: angleDeg,
  rightAngleDeg: angleDeg,
  priceCents: cents,
  /** Where it lies. */
  place: line(120),
  fromJobId: uuid.nullable(),
};

export const rackPieceSchema = z.strictObject({
  id: uuid,
  /** Written on the wood: R1, R2 … */
  code: z.string(),
  ...fields,
  reservedForJobId: uuid.nullable(),
  createdAt: moment,
});

export type RackPiece = z.infer<typeof rackPieceSchema>;

export const listRack = contract({
  method: 'get',
  path: '/rack',
  summary: 'Offcuts on the rack that no job has taken.',
  may: 'rack.see',
  response: z.strictObject({ pieces: z.array(rackPieceSchema) }),
  problems: [],
});

export const createRackPiece = contract({
  method: 'post',
  path: '/rack',
  summary: 'Put an offcut on the rack; it gets the next code.',
  may: 'rack.edit',
  creates: true,
  body: z
    .strictObject({
      ...fields,
      batch: fields.batch.default(''),
      faces: fields.faces.default('both'),
      defects: fields.defects.default([]),
      leftAngleDeg: angleDeg.default(90),
      rightAngleDeg: angleDeg.default(90),
      priceCents: cents.default(0),
      place: fields.place.default(''),
      fromJobId: uuid.nullable().default(null),
    })
    .superRefine(defectsLieOnSlab),
  response: rackPieceSchema,
  problems: [],
});
