import type { Layout } from '@/geometry/core/layout';
import { layoutSchema } from '@/shared/layout/layout-schema';

/**
 * A stored document as the schema knows it. The database keeps no order of keys, and fingerprints of nest instances
 * are taken of the document's text: parsing puts every key back into the schema's order.
 */
export function openLayout(stored: unknown): Layout {
  return layoutSchema.parse(stored);
}
