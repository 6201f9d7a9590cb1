import type { Layout } from '@/geometry/core/layout';
import type { ShopSettings } from '@/geometry/core/settings';
import { layRoom } from '@/geometry/plan/lay-room';
import type { EditDraft } from '@/shared/layout/apply-edit';

/**
 * The edit that keeps the letters of pieces as they are now, before something else is changed: a letter somebody has seen
 * stays with its piece. Null when all are kept.
 */
export function lettersToKeep(layout: Layout, settings: ShopSettings): EditDraft | null {
  if (layout.runs.length + layout.islands.length + layout.strips.length === 0) return null;
  const { pieces } = layRoom(layout, settings).tops;
  const fresh = pieces.filter(({ key }) => !Object.hasOwn(layout.letters, key));
  if (fresh.length === 0) return null;
  return { kind: 'keepLetters', value: Object.fromEntries(fresh.map(({ key, letter }) => [key, letter])) };
}
