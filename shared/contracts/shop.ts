import { z } from 'zod';

import { contract } from './contract';
import { email, given, line, uuid } from './fields';
import { shopSettingsSchema } from './shop-settings';

export const letterheadSchema = z.strictObject({
  lines: z.array(line(100)).max(6).readonly().optional(),
  phone: line(40).optional(),
  email: z.union([email, z.literal('')]).optional(),
});

const fields = {
  name: given(120),
  currency: z.string().regex(/^[A-Z]{3}$/, 'three capital letters, such as USD'),
  units: z.enum(['in', 'mm']),
  step: z.enum(['1/16', '1/32', '1 mm', '0.5 mm']),
  settings: shopSettingsSchema,
  letterhead: letterheadSchema,
};

export const shopSchema = z.strictObject({ id: uuid, ...fields });

export type Shop = z.infer<typeof shopSchema>;

export const getShop = contract({
  method: 'get',
  path: '/shop',
  summary: 'Name, units, settings and letterhead of the shop.',
  may: 'shop.see',
  response: shopSchema,
  problems: [],
});

export const updateShop = contract({
  method: 'patch',
  path: '/shop',
  summary: 'Change what is given; settings and letterhead are replaced whole. Signed revisions keep theirs.',
  may: 'shop.edit',
  body: z.strictObject(fields).partial(),
  response: shopSchema,
  problems: [],
});
