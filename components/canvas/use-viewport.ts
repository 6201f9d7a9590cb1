import { useCallback, useMemo, useState } from 'react';

import type { Point } from '@/geometry/core/point';

import { centreOn, fitView, toScreen, zoomAbout, type Bounds, type Insets, type Size, type Viewport } from './viewport';

export interface CanvasView {
  readonly view: Viewport;
  readonly size: Size;
  /** px per inch of the fitted view; zoom is held between 0.5 and 8 times it. */
  readonly fitScale: number;
  /** What the person moved stays until `fit`. */
  readonly setView: (view: Viewport) => void;
  readonly setSize: (size: Size) => void;
  /** Shows everything again, and follows size and insets from then on. */
  readonly fit: () => void;
  /** About the middle of the canvas. */
  readonly zoomBy: (factor: number) => void;
  /** Brings a place into the middle of what the insets leave, if it is out of sight. */
  readonly reveal: (at: Point) => void;
}

export const NO_INSETS: Insets = { top: 0, right: 0, bottom: 0, left: 0 };

/**
 * The view of one canvas: fitted until the person moves it.
 *
 * @param bounds - of the drawing, inches
 * @param insets - px kept free for badges, bars and a sheet
 */
export function useViewport(bounds: Bounds, insets: Insets = NO_INSETS): CanvasView {
  const [size, setSizeState] = useState<Size>({ width: 0, height: 0 });
  const [moved, setMoved] = useState<Viewport | null>(null);
  const fitted = fitView(bounds, size, insets);
  const view = moved ?? fitted;

  const setSize = useCallback((next: Size) => {
    setSizeState((now) => (now.width === next.width && now.height === next.height ? now : next));
  }, []);
  const fit = useCallback(() => setMoved(null), []);
  return useMemo(
    () => ({
      view,
      size,
      fitScale: fitted.scale,
      setView: setMoved,
      setSize,
      fit,
      zoomBy: (factor) => setMoved(zoomAbout(view, [size.width / 2, size.height / 2], factor, fitted.scale)),
      reveal: (at) => {
        if (!inSight(view, at, size, insets)) setMoved(centreOn(view, at, size, insets));
      },
    }),
    // The views are plain numbers made anew at every render; their values decide.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [
      view.scale,
      view.x,
      view.y,
      fitted.scale,
      size,
      setSize,
      fit,
      insets.top,
      insets.right,
      insets.bottom,
      insets.left,
    ],
  );
}

function inSight(view: Viewport, at: Point, size: Size, insets: Insets): boolean {
  const [x, y] = toScreen(view, at);
  const across = x >= insets.left && x <= size.width - insets.right;
  return across && y >= insets.top && y <= size.height - insets.bottom;
}
