/** peek shows the title, half about half the screen, full nearly all of it. */
export type SheetPosition = 'peek' | 'half' | 'full';

export const SHEET_POSITIONS: readonly SheetPosition[] = ['peek', 'half', 'full'];

export type SheetHeights = Readonly<Record<SheetPosition, number>>;

/** A flick counts for so many ms of its speed, px for px. */
const FLICK_MS = 160;

/** Pulled so far under peek, a sheet that can be closed closes. */
const CLOSE_PULL = 48;

/**
 * The three heights in px.
 *
 * @param available - height of the page the sheet lies in
 * @param half - wanted height of half, where the content needs a certain one (the pad: 472)
 */
export function sheetHeights(available: number, half?: number): SheetHeights {
  // Where room is short the content comes before the strip of page above it.
  const full = Math.max(available - 56, Math.min(available, half ?? 240));
  const peek = Math.min(84, full);
  return { peek, half: Math.min(full, Math.max(peek, half ?? Math.round(available * 0.56))), full };
}

/** Height while dragged: never over full, and under peek only with resistance. */
export function draggedHeight(start: number, fingerDy: number, heights: SheetHeights): number {
  const wanted = start - fingerDy;
  if (wanted > heights.full) return heights.full;
  return wanted < heights.peek ? Math.max(0, heights.peek - (heights.peek - wanted) / 2) : wanted;
}

/**
 * Where a dragged sheet comes to rest.
 *
 * @param height - where it was let go, px
 * @param speed - px per ms, up is positive
 * @returns a position, or 'closed' if it can be closed and was pulled well under peek
 */
export function restingPosition(
  height: number,
  speed: number,
  heights: SheetHeights,
  closable: boolean,
): SheetPosition | 'closed' {
  const aim = height + speed * FLICK_MS;
  if (closable && aim < heights.peek - CLOSE_PULL / 2) return 'closed';
  return SHEET_POSITIONS.reduce((best, one) =>
    Math.abs(heights[one] - aim) < Math.abs(heights[best] - aim) ? one : best,
  );
}

/** What pressing the grab bar does: peek to half, half to full, full to half. */
export const afterPress = (position: SheetPosition): SheetPosition => (position === 'half' ? 'full' : 'half');
