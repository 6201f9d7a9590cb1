import { useEffect, useLayoutEffect, useRef, type RefObject } from 'react';
import type { View } from 'react-native';

import {
  HOLD_MS,
  IDLE,
  stepGesture,
  type GestureEffect,
  type GestureEvent,
  type GestureState,
  type GestureTarget,
} from './canvas-gesture';
import { groupTransform, wheelFactor, type ScreenPoint, type Viewport } from './viewport';

export interface CanvasGestureOptions {
  /** Takes the pointers. */
  readonly root: RefObject<View | null>;
  /** The painted group, moved during a gesture. */
  readonly group: () => Element | null;
  /** What the group is painted for. */
  readonly view: Viewport;
  readonly fitScale: number;
  /** When a gesture has ended, or a zoom has gone so far that the drawing has to be painted anew. */
  readonly onView: (view: Viewport) => void;
  readonly onFit: () => void;
  /** What lies under a finger; `view` is the one on the screen. */
  readonly hit: (at: ScreenPoint, view: Viewport) => GestureTarget | null;
  /** Everything but views; px, and the view on the screen at that moment. */
  readonly onAct: (effect: GestureAct, view: Viewport) => void;
}

export type GestureAct = Extract<GestureEffect, { readonly kind: 'tap' | 'hold' | 'drag' | 'dragCancel' }>;

/** ms without a turn of the wheel until it counts as ended. */
const WHEEL_REST = 120;

/** A zoom stretches text and strokes by no more than this before the drawing is painted anew. */
const MOST_STRETCH = 1.15;

/**
 * Pan, pinch, wheel, tap, double tap, long press and drag on a canvas. During a gesture only the group's `transform`
 * attribute is written; React hears of the view at the end, and in between only when a zoom has stretched the painting too far.
 */
export function useCanvasGestures(options: CanvasGestureOptions): void {
  const latest = useRef(options);
  const live = useRef(options.view);
  const moving = useRef(false);
  const { root, view } = options;

  useLayoutEffect(() => {
    latest.current = options;
  });
  // A new painting is in place. In the middle of a gesture the fingers are further on already.
  useLayoutEffect(() => {
    if (!moving.current) live.current = view;
    showOn(latest.current.group(), view.scale, live.current);
  });

  useEffect(() => {
    const element = root.current as unknown as HTMLElement | null;
    if (!element) return;
    return attach(element, latest, live, moving);
  }, [root]);
}

function showOn(group: Element | null, paintedScale: number, now: Viewport): void {
  group?.setAttribute('transform', groupTransform(paintedScale, now));
}

interface Ref<T> {
  current: T;
}

function attach(
  element: HTMLElement,
  latest: Ref<CanvasGestureOptions>,
  live: Ref<Viewport>,
  moving: Ref<boolean>,
): () => void {
  let state: GestureState = IDLE;
  let holdTimer: ReturnType<typeof setTimeout> | undefined;
  let wheelTimer: ReturnType<typeof setTimeout> | undefined;

  const settle = () => {
    clearTimeout(wheelTimer);
    wheelTimer = undefined;
    moving.current = state.kind !== 'idle';
    if (live.current !== latest.current.view) latest.current.onView(live.current);
  };
  const perform = (effect: GestureEffect) => {
    const { group, view, onFit, onAct } = latest.current;
    if (effect.kind === 'show') {
      live.current = effect.view;
      showOn(group(), view.scale, effect.view);
      const stretch = effect.view.scale / view.scale;
      if (stretch > MOST_STRETCH || stretch < 1 / MOST_STRETCH) latest.current.onView(effect.view);
    } else if (effect.kind === 'settle') settle();
    else if (effect.kind === 'fit') onFit();
    else onAct(effect, live.current);
  };
  const feed = (event: GestureEvent) => {
    const step = stepGesture(state, event, { view: live.current, fitScale: latest.current.fitScale });
    state = step.state;
    moving.current = state.kind !== 'idle' || wheelTimer !== undefined;
    if (state.kind !== 'pressed') clearTimeout(holdTimer);
    step.effects.forEach(perform);
  };
  const place = (event: MouseEvent): ScreenPoint => {
    const box = element.getBoundingClientRect();
    return [event.clientX - box.left, event.clientY - box.top];
  };

  const handlers = {
    pointerdown: (event: PointerEvent) => {
      if (event.button !== 0) return;
      if (wheelTimer !== undefined) settle();
      element.setPointerCapture(event.pointerId);
      const at = place(event);
      const target = latest.current.hit(at, live.current);
      feed({ kind: 'down', pointer: event.pointerId, at, touch: event.pointerType !== 'mouse', target });
      if (state.kind === 'pressed') holdTimer = setTimeout(() => feed({ kind: 'held' }), HOLD_MS);
    },
    pointermove: (event: PointerEvent) => {
      if (state.kind !== 'idle') feed({ kind: 'move', pointer: event.pointerId, at: place(event) });
    },
    pointerup: (event: PointerEvent) =>
      feed({ kind: 'up', pointer: event.pointerId, at: place(event), time: event.timeStamp }),
    pointercancel: (event: PointerEvent) => {
      feed({ kind: 'cancel' });
      feed({ kind: 'up', pointer: event.pointerId, at: place(event), time: event.timeStamp });
    },
    contextmenu: (event: MouseEvent) => {
      event.preventDefault();
      // A long finger has been answered by its own timer.
      if (state.kind !== 'idle') return;
      const at = place(event);
      perform({ kind: 'hold', target: latest.current.hit(at, live.current)?.id ?? null, at });
    },
    wheel: (event: WheelEvent) => {
      event.preventDefault();
      clearTimeout(wheelTimer);
      wheelTimer = setTimeout(settle, WHEEL_REST);
      feed({ kind: 'wheel', at: place(event), factor: wheelFactor(event.deltaY, event.deltaMode) });
    },
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'Escape' && state.kind !== 'idle') feed({ kind: 'cancel' });
  };
  const onBlur = () => feed({ kind: 'cancel' });

  for (const [name, handler] of Object.entries(handlers)) {
    element.addEventListener(name, handler as EventListener, { passive: false });
  }
  window.addEventListener('keydown', onKeyDown);
  window.addEventListener('blur', onBlur);
  return () => {
    clearTimeout(holdTimer);
    clearTimeout(wheelTimer);
    for (const [name, handler] of Object.entries(handlers)) element.removeEventListener(name, handler as EventListener);
    window.removeEventListener('keydown', onKeyDown);
    window.removeEventListener('blur', onBlur);
  };
}
