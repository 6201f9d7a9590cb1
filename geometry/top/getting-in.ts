import type { SiteAccess, Step } from '../core/layout';
import { leastWidth } from './convex-hull';
import { passesCorner } from './corridor';
import { inches } from './sentence';
import type { Piece } from './types';

/** Whether pieces carried as one rigid shape get into the room, and by which way. Inches. */
export interface GettingIn {
  readonly letters: readonly string[];
  /** Least width over all rotations, and the length square to it. */
  readonly width: number;
  readonly length: number;
  /** Carried on edge: the width passes under the door's head. Flat: it passes between the jambs. */
  readonly onEdge: boolean;
  readonly flat: boolean;
  /** Tipped over its end, against the clear length of stairs or landing: sqrt(L^2 + t^2). */
  readonly tippedLength: number;
  readonly tips: boolean;
  /** Why it may not go in, with its measure and the clear one, as half a sentence; null when it goes in. */
  readonly obstacle: string | null;
}

/**
 * The ways in for a section: through the door on edge (least width against the door's height) or flat (against its width),
 * then round the corridor's corner the same way up; and tipped over its end where stairs limit the length.
 *
 * @param pieces - what is carried in one go, at least one
 */
export function gettingIn(pieces: readonly Piece[], access: SiteAccess, step: Step): GettingIn {
  const { doorWidth, doorHeight, corridor, clearLength } = access;
  const { width, length } = leastWidth(pieces.flatMap((piece) => piece.outline));
  const thickness = Math.max(...pieces.map((piece) => piece.thickness));
  const rounds = (carried: number) => corridor === null || passesCorner(corridor[0], corridor[1], length, carried);
  const throughOnEdge = width <= doorHeight && thickness <= doorWidth;
  const throughFlat = width <= doorWidth && thickness <= doorHeight;
  const tippedLength = Math.hypot(length, thickness);
  const tips = clearLength === null || tippedLength <= clearLength;
  const onEdge = throughOnEdge && rounds(thickness);
  const flat = throughFlat && rounds(width);
  const size = (value: number) => inches(value, step);
  let obstacle: string | null = null;
  if (!throughOnEdge && !throughFlat) {
    obstacle = `${size(width)} wide at least, and the door is ${size(doorWidth)} by ${size(doorHeight)}`;
  } else if (!onEdge && !flat && corridor) {
    obstacle = `${size(length)} long, too much to turn from a corridor of ${size(corridor[0])} into one of ${size(corridor[1])}`;
  } else if (!tips && clearLength !== null) {
    obstacle = `${size(tippedLength)} over its end, and the clear length is ${size(clearLength)}`;
  }
  return { letters: pieces.map((piece) => piece.letter), width, length, onEdge, flat, tippedLength, tips, obstacle };
}
