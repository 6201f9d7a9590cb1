import type { Mark } from '@/geometry/core/layout';
import type { OnWall, ToolEvent, ToolStep } from './tool';

/** Picking the two marks of a cross: any corner, or any place on a wall. */
export interface CrossState {
  readonly from: Mark | null;
  /** Both marks are there: the tape can be read. */
  readonly picked: { readonly from: Mark; readonly to: Mark } | null;
}

export const CROSS_START: CrossState = { from: null, picked: null };

/** A finger this near to a corner means the corner; inches are rounded to whole ones, since a mark is made by hand. */
const MARK_STEP = 1;

/** The cross tool after one event; its preview is the mark already chosen. */
export function stepCross(state: CrossState, event: ToolEvent): ToolStep<CrossState, Mark> {
  if (event.kind === 'cancel') return { state: CROSS_START, preview: null };
  if (event.kind !== 'tap') return { state, preview: state.from };
  if (!event.on)
    return { state, preview: state.from, refusal: 'Tap a corner or a wall: a cross goes from mark to mark.' };
  const mark = markAt(event.on, event.reach);
  if (!state.from) return { state: { from: mark, picked: null }, preview: mark };
  if (sameMark(state.from, mark))
    return { state, preview: state.from, refusal: 'Both marks are in one place. Tap another one.' };
  if (state.from.wall === mark.wall)
    return { state, preview: state.from, refusal: 'Both marks are on one wall. A cross goes to another wall.' };
  return { state: { from: null, picked: { from: state.from, to: mark } }, preview: null };
}

/** The mark a finger means: a wall's end when it is near, else a whole inch along the wall. */
export function markAt({ wall, at, length }: OnWall, reach: number): Mark {
  if (at <= reach) return { wall, at: 0 };
  if (at >= length - reach) return { wall, at: 'end' };
  return { wall, at: Math.round(at / MARK_STEP) * MARK_STEP };
}

const sameMark = (a: Mark, b: Mark): boolean => a.wall === b.wall && a.at === b.at;
