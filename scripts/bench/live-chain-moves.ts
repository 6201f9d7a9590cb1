import type { Layout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layRoom } from '@/geometry/plan/lay-room';
import { finishPlan } from '@/geometry/plan/make-plan';
import type { Plan } from '@/geometry/plan/types';

const STEPS = 16;

/** The layouts of a drag: the first cutout slides by 1/16 in from frame to frame. The chain keeps nothing from before. */
export function layoutsOfDrag(layout: Layout): readonly Layout[] {
  return Array.from({ length: STEPS }, (_, step) => ({
    ...layout,
    cutouts: layout.cutouts.map((cutout, i) => (i === 0 ? { ...cutout, centre: cutout.centre + step / 16 } : cutout)),
  }));
}

/** The live chain as the screen runs it while a finger drags: from readings to pieces, hardware and findings, without slabs. */
export function liveChain(layout: Layout): Plan {
  return finishPlan(layRoom(layout, DEFAULT_SETTINGS), layout, DEFAULT_SETTINGS, { nest: null });
}
