import { useEffect, useId, useRef, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { G, Svg } from 'react-native-svg';

import type { Point } from '@/geometry/core/point';

import { webStyle } from '../ui/web-style';
import { CanvasTwin, type TwinTarget } from './CanvasTwin';
import { hitTest } from './hit-test';
import { useCanvasGestures, type GestureAct } from './use-canvas-gestures';
import type { CanvasView } from './use-viewport';
import { toWorld, type ScreenPoint, type Viewport } from './viewport';

/** Something on the drawing that can be touched, and that the list twin offers by name. */
export interface CanvasTarget extends TwinTarget {
  readonly draggable?: boolean;
}

/** A drag from where it began: `by` is the whole way come, inches. */
export interface CanvasDrag {
  readonly target: string;
  readonly from: Point;
  readonly to: Point;
  readonly by: Point;
}

export interface CanvasProps {
  /** What the drawing shows, for screen readers. */
  readonly label: string;
  readonly canvas: CanvasView;
  /** In the order Tab walks them (the wall walk). */
  readonly targets: readonly CanvasTarget[];
  /** A tap or Enter; null for empty ground. `at` in inches. */
  readonly onTap: (target: string | null, at: Point) => void;
  /** Long press, right click or the menu key: the same menu as More. `place` is px from the canvas's top left. */
  readonly onHold?: (target: string | null, at: Point, place: ScreenPoint) => void;
  readonly onDragStart?: (drag: CanvasDrag) => void;
  readonly onDrag?: (drag: CanvasDrag) => void;
  /** At most one edit comes of it. */
  readonly onDragEnd?: (drag: CanvasDrag) => void;
  /** Escape, a second finger, or the page lost the pointer: drop the preview. */
  readonly onDragCancel?: (target: string) => void;
  /** Arrow keys on a target: 1/16 in, with Shift 1 in; y up. */
  readonly onNudge?: (target: string, by: Point) => void;
  /** Any other key on a target (a digit opens its blade); true when it was used. */
  readonly onKey?: (key: string, target: string) => boolean;
  /** The keyboard came to a target. */
  readonly onFocusTarget?: (target: string) => void;
  /** Paints the drawing for so many px an inch, its origin at (0, 0): `PaintSvg`. A pan does not call it. */
  readonly children: (pxPerInch: number) => ReactNode;
}

/** A drawing that can be panned, zoomed, tapped and dragged, with a list twin for the keyboard and for screen readers. */
export function Canvas(props: CanvasProps) {
  const { label, canvas, targets, children } = props;
  const root = useRef<View>(null);
  const groupId = useId();
  const { view, size, fitScale, setSize } = canvas;

  useEffect(() => watchSize(root.current as unknown as HTMLElement | null, setSize), [setSize]);
  useCanvasGestures({
    root,
    group: () => document.getElementById(groupId),
    view,
    fitScale,
    onView: canvas.setView,
    onFit: canvas.fit,
    hit: (at, now) => {
      const target = hitTest(targets, now, at);
      return target && { id: target.id, draggable: target.draggable === true };
    },
    onAct: (act, now) => actOn(props, act, now),
  });

  const ready = size.width > 0 && size.height > 0;
  return (
    <View ref={root} role="group" aria-label={label} style={[styles.canvas, styles.still]}>
      {ready && (
        <Svg width={size.width} height={size.height} aria-hidden>
          <G id={groupId}>{children(view.scale)}</G>
        </Svg>
      )}
      {ready && (
        <CanvasTwin
          {...props}
          view={view}
          onMenu={(target, at, place) => props.onHold?.(target, at, place)}
          onReveal={canvas.reveal}
        />
      )}
    </View>
  );
}

function actOn(props: CanvasProps, act: GestureAct, view: Viewport): void {
  if (act.kind === 'tap') return props.onTap(act.target, toWorld(view, act.at));
  if (act.kind === 'hold') return props.onHold?.(act.target, toWorld(view, act.at), act.at);
  if (act.kind === 'dragCancel') return props.onDragCancel?.(act.target);
  const from = toWorld(view, act.from);
  const to = toWorld(view, act.to);
  const drag: CanvasDrag = { target: act.target, from, to, by: [to[0] - from[0], to[1] - from[1]] };
  if (act.phase === 'start') props.onDragStart?.(drag);
  else if (act.phase === 'move') props.onDrag?.(drag);
  else props.onDragEnd?.(drag);
}

function watchSize(
  element: HTMLElement | null,
  report: (size: { width: number; height: number }) => void,
): (() => void) | undefined {
  if (!element) return undefined;
  const measure = () => report({ width: element.clientWidth, height: element.clientHeight });
  measure();
  if (typeof ResizeObserver === 'undefined') return undefined;
  const observer = new ResizeObserver(measure);
  observer.observe(element);
  return () => observer.disconnect();
}

const styles = StyleSheet.create({
  canvas: { flex: 1, minHeight: 0 },
  // Clipped, not hidden: what is hidden still scrolls when the focus comes to it.
  still: webStyle({ overflow: 'clip', touchAction: 'none', userSelect: 'none', cursor: 'default' }),
});
