import type { Layout } from '@/geometry/core/layout';
import { layoutsOfDrag, liveChain } from './live-chain-moves';

/**
 * Runs in a browser's page: the live chain once for each frame of a drag.
 *
 * @returns milliseconds of every frame, the first one with code that has never run before
 */
function dragFrames(layout: Layout, frames: number): number[] {
  const layouts = layoutsOfDrag(layout);
  return Array.from({ length: frames }, (_, frame) => {
    const start = performance.now();
    liveChain(layouts[frame % layouts.length]!);
    return performance.now() - start;
  });
}

Object.assign(globalThis, { dragFrames });
