import type { Layout } from '@/geometry/core/layout';
import type { ShopSettings } from '@/geometry/core/settings';
import type { Thumbnail } from '@/shared/contracts/jobs';

/** The outline that the jobs list shows: walls as sketched. */
export function thumbnailOf(layout: Layout, _settings: ShopSettings): Thumbnail | null {
  if (layout.room.sketch.length === 0) return null;
  return { walls: layout.room.sketch, closed: layout.room.closed, pieces: [] };
}
