/** px from the window's top left. */
export interface Box {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

export interface Place {
  readonly left: number;
  readonly top: number;
}

/** px that stay free between a menu and the edge of the window. */
const MARGIN = 8;

/**
 * Where an open menu lies: under its anchor with the sides in line (the right ones in the right half of the window), above it
 * where there is more room, and in any case inside the window.
 *
 * @param anchor - the button, or the spot of a long press as a box without size
 * @param menu - its size, px
 */
export function placeMenu(
  anchor: Box,
  menu: { readonly width: number; readonly height: number },
  window: { readonly width: number; readonly height: number },
): Place {
  const roomBelow = window.height - MARGIN - anchor.bottom;
  const roomAbove = anchor.top - MARGIN;
  const below = menu.height <= roomBelow || roomBelow >= roomAbove;
  const top = below ? anchor.bottom : anchor.top - menu.height;
  const atLeft = (anchor.left + anchor.right) / 2 < window.width / 2;
  const left = atLeft ? anchor.left : anchor.right - menu.width;
  return {
    left: inside(left, menu.width, window.width),
    top: inside(top, menu.height, window.height),
  };
}

const inside = (start: number, length: number, room: number): number =>
  Math.max(MARGIN, Math.min(start, room - MARGIN - length));
