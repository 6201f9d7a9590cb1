import { distance, panView, pinchView, zoomAbout, type ScreenPoint, type Viewport } from './viewport';

/**
 * What fingers, mouse and wheel do to a canvas, as a pure state machine. Every move is computed from where the gesture
 * began and how far it has come, never from move to move, so nothing is lost or added up wrongly.
 */
export type GestureState =
  | { readonly kind: 'idle'; readonly lastTap: Tap | null }
  | Press
  | { readonly kind: 'panning'; readonly pointer: number; readonly from: ScreenPoint; readonly view: Viewport }
  | Drag
  | {
      readonly kind: 'pinching';
      readonly pointers: readonly [number, number];
      readonly from: readonly [ScreenPoint, ScreenPoint];
      readonly now: readonly [ScreenPoint, ScreenPoint];
      readonly view: Viewport;
    }
  /** A long press was answered, or a drag called off: the finger is ignored until it is lifted. */
  | { readonly kind: 'spent'; readonly pointer: number };

interface Tap {
  readonly at: ScreenPoint;
  readonly time: number;
  readonly target: string | null;
}

interface Press {
  readonly kind: 'pressed';
  readonly pointer: number;
  readonly at: ScreenPoint;
  /** Where the finger is now, still within the slop. */
  readonly now: ScreenPoint;
  readonly slop: number;
  readonly view: Viewport;
  readonly target: GestureTarget | null;
  readonly lastTap: Tap | null;
}

interface Drag {
  readonly kind: 'dragging';
  readonly pointer: number;
  readonly from: ScreenPoint;
  readonly now: ScreenPoint;
  readonly view: Viewport;
  readonly target: string;
}

/** What lies under a finger that comes down. */
export interface GestureTarget {
  readonly id: string;
  readonly draggable: boolean;
}

export type GestureEvent =
  | {
      readonly kind: 'down';
      readonly pointer: number;
      readonly at: ScreenPoint;
      readonly touch: boolean;
      readonly target: GestureTarget | null;
    }
  | { readonly kind: 'move'; readonly pointer: number; readonly at: ScreenPoint }
  /** `time` in ms of any clock that runs on. */
  | { readonly kind: 'up'; readonly pointer: number; readonly at: ScreenPoint; readonly time: number }
  /** The finger has stayed for `HOLD_MS`. */
  | { readonly kind: 'held' }
  /** Escape, blur, or the browser took the pointer. */
  | { readonly kind: 'cancel' }
  | { readonly kind: 'wheel'; readonly at: ScreenPoint; readonly factor: number };

export type GestureEffect =
  /** Show this view now, without painting anew. */
  | { readonly kind: 'show'; readonly view: Viewport }
  /** Keep the view shown last. */
  | { readonly kind: 'settle' }
  | { readonly kind: 'tap'; readonly target: string | null; readonly at: ScreenPoint }
  | { readonly kind: 'fit' }
  | { readonly kind: 'hold'; readonly target: string | null; readonly at: ScreenPoint }
  | {
      readonly kind: 'drag';
      readonly phase: 'start' | 'move' | 'end';
      readonly target: string;
      readonly from: ScreenPoint;
      readonly to: ScreenPoint;
    }
  | { readonly kind: 'dragCancel'; readonly target: string };

export interface GestureStep {
  readonly state: GestureState;
  readonly effects: readonly GestureEffect[];
}

/** The view now on the screen and the scale that fits. */
export interface GestureContext {
  readonly view: Viewport;
  readonly fitScale: number;
}

/** ms until a resting finger counts as a long press. */
export const HOLD_MS = 500;

/** ms and px within which a second tap makes a double tap. */
const DOUBLE_MS = 300;
const DOUBLE_PX = 24;

/** px a finger or the mouse may wander and still tap. */
const SLOP_TOUCH = 8;
const SLOP_MOUSE = 3;

export const IDLE: GestureState = { kind: 'idle', lastTap: null };

const stay = (state: GestureState): GestureStep => ({ state, effects: [] });

/** The gesture after one event, and what has to be done about it. */
export function stepGesture(state: GestureState, event: GestureEvent, context: GestureContext): GestureStep {
  switch (event.kind) {
    case 'down':
      return onDown(state, event, context);
    case 'move':
      return onMove(state, event, context);
    case 'up':
      return onUp(state, event, context);
    case 'held':
      return onHeld(state);
    case 'cancel':
      return onCancel(state);
    case 'wheel':
      // A wheel turned in the middle of a gesture would move the ground under it.
      return state.kind === 'idle'
        ? {
            state,
            effects: [{ kind: 'show', view: zoomAbout(context.view, event.at, event.factor, context.fitScale) }],
          }
        : stay(state);
  }
}

type Down = GestureEvent & { readonly kind: 'down' };

function onDown(state: GestureState, event: Down, { view }: GestureContext): GestureStep {
  if (state.kind === 'idle') {
    const { pointer, at, target } = event;
    const slop = event.touch ? SLOP_TOUCH : SLOP_MOUSE;
    return stay({ kind: 'pressed', pointer, at, now: at, slop, view, target, lastTap: state.lastTap });
  }
  if (state.kind === 'pressed') return startPinch(state.pointer, state.now, event, view, []);
  if (state.kind === 'dragging') {
    return startPinch(state.pointer, state.now, event, view, [{ kind: 'dragCancel', target: state.target }]);
  }
  if (state.kind === 'panning') {
    const now: ScreenPoint = [state.from[0] + view.x - state.view.x, state.from[1] + view.y - state.view.y];
    return startPinch(state.pointer, now, event, view, []);
  }
  return stay(state);
}

function startPinch(
  first: number,
  at: ScreenPoint,
  event: Down,
  view: Viewport,
  effects: readonly GestureEffect[],
): GestureStep {
  const from = [at, event.at] as const;
  return { state: { kind: 'pinching', pointers: [first, event.pointer], from, now: from, view }, effects };
}

function onMove(
  state: GestureState,
  { pointer, at }: GestureEvent & { readonly kind: 'move' },
  { fitScale }: GestureContext,
): GestureStep {
  if (state.kind === 'pinching') {
    const index = state.pointers.indexOf(pointer);
    if (index < 0) return stay(state);
    const now = index === 0 ? ([at, state.now[1]] as const) : ([state.now[0], at] as const);
    return {
      state: { ...state, now },
      effects: [{ kind: 'show', view: pinchView(state.view, state.from, now, fitScale) }],
    };
  }
  if (state.kind === 'idle' || state.pointer !== pointer) return stay(state);
  if (state.kind === 'pressed')
    return distance(state.at, at) <= state.slop ? stay({ ...state, now: at }) : leavePress(state, at);
  if (state.kind === 'panning') return { state, effects: [{ kind: 'show', view: panned(state, at) }] };
  if (state.kind === 'dragging') {
    const { target, from } = state;
    return { state: { ...state, now: at }, effects: [{ kind: 'drag', phase: 'move', target, from, to: at }] };
  }
  return stay(state);
}

/** The finger has left the slop: a drag if it came down on something that can be dragged, else a pan. */
function leavePress(press: Press, at: ScreenPoint): GestureStep {
  const { pointer, view, at: from, target } = press;
  if (target?.draggable) {
    return {
      state: { kind: 'dragging', pointer, from, now: at, view, target: target.id },
      effects: [
        { kind: 'drag', phase: 'start', target: target.id, from, to: from },
        { kind: 'drag', phase: 'move', target: target.id, from, to: at },
      ],
    };
  }
  const pan = { kind: 'panning', pointer, from, view } as const;
  return { state: pan, effects: [{ kind: 'show', view: panned(pan, at) }] };
}

const panned = (pan: { readonly from: ScreenPoint; readonly view: Viewport }, at: ScreenPoint): Viewport =>
  panView(pan.view, at[0] - pan.from[0], at[1] - pan.from[1]);

function onUp(
  state: GestureState,
  event: GestureEvent & { readonly kind: 'up' },
  { view }: GestureContext,
): GestureStep {
  if (state.kind === 'pinching') {
    const index = state.pointers.indexOf(event.pointer);
    if (index < 0) return stay(state);
    // The finger that stays goes on panning from where it is.
    const rest = index === 0 ? 1 : 0;
    const pan: GestureState = { kind: 'panning', pointer: state.pointers[rest], from: state.now[rest], view };
    return { state: pan, effects: [{ kind: 'settle' }] };
  }
  if (state.kind === 'idle' || state.pointer !== event.pointer) return stay(state);
  if (state.kind === 'panning') return { state: IDLE, effects: [{ kind: 'settle' }] };
  if (state.kind === 'dragging') {
    return {
      state: IDLE,
      effects: [{ kind: 'drag', phase: 'end', target: state.target, from: state.from, to: event.at }],
    };
  }
  return state.kind === 'pressed' ? onTap(state, event.time) : stay(IDLE);
}

function onTap(press: Press, time: number): GestureStep {
  const target = press.target?.id ?? null;
  const { lastTap, at } = press;
  const second =
    lastTap !== null &&
    time - lastTap.time <= DOUBLE_MS &&
    distance(lastTap.at, at) <= DOUBLE_PX &&
    lastTap.target === target;
  if (second) return { state: IDLE, effects: [{ kind: 'fit' }] };
  return { state: { kind: 'idle', lastTap: { at, time, target } }, effects: [{ kind: 'tap', target, at }] };
}

function onHeld(state: GestureState): GestureStep {
  if (state.kind !== 'pressed') return stay(state);
  const target = state.target?.id ?? null;
  return { state: { kind: 'spent', pointer: state.pointer }, effects: [{ kind: 'hold', target, at: state.at }] };
}

/** A drag is undone, a pan or a pinch goes back to where it began. */
function onCancel(state: GestureState): GestureStep {
  if (state.kind === 'dragging') {
    return {
      state: { kind: 'spent', pointer: state.pointer },
      effects: [{ kind: 'dragCancel', target: state.target }],
    };
  }
  if (state.kind === 'panning' || state.kind === 'pinching') {
    const pointer = state.kind === 'panning' ? state.pointer : state.pointers[0];
    return { state: { kind: 'spent', pointer }, effects: [{ kind: 'show', view: state.view }, { kind: 'settle' }] };
  }
  return state.kind === 'pressed' ? stay({ kind: 'spent', pointer: state.pointer }) : stay(state);
}
