import type { SiteAccess } from '../core/layout';
import type { Point } from '../core/point';
import { leastWidth } from './convex-hull';
import { passesCorner } from './corridor';
import type { Piece, Tops } from './types';

/** Pieces that leave the shop as one rigid shape. Room axes. */
export interface Section {
  readonly letters: readonly string[];
  readonly points: readonly Point[];
  readonly thickness: number;
}

/** Whether a section gets into the room, and by which way. Inches. */
export interface GettingIn {
  readonly letters: readonly string[];
  /** Least width over all rotations and the length square to it. */
  readonly width: number;
  readonly length: number;
  /** Carried on edge: the width passes under the door's head. Flat: it passes between the jambs. */
  readonly onEdge: boolean;
  readonly flat: boolean;
  /** Tipped over its end, against the clear length of stairs or landing: sqrt(L^2 + t^2). */
  readonly tippedLength: number;
  readonly tips: boolean;
  readonly passes: boolean;
}

/**
 * Sections as they leave the shop: pieces joined by corner joints marked 'shop', and by those seams that leave a top short
 * enough to be carried in whole.
 */
export function sectionsOf(tops: Tops, access: SiteAccess): readonly Section[] {
  const pieces = tops.pieces.filter((piece) => piece.kind === 'run' || piece.kind === 'island');
  const groups = new Groups(pieces.map((piece) => piece.letter));
  for (const joint of tops.joints) if (joint.assembled === 'shop') groups.join(...joint.letters);
  const shopSeams = new Set(tops.seams.map((seam) => seam.on).filter((on) => carriedWhole(on, pieces, access)));
  for (const seam of tops.seams) if (seam.edge || shopSeams.has(seam.on)) groups.join(...seam.letters);
  const sections = new Map<string, Piece[]>();
  for (const piece of pieces) {
    const key = groups.find(piece.letter);
    sections.set(key, [...(sections.get(key) ?? []), piece]);
  }
  return [...sections.values()].map((list) => ({
    letters: list.map((piece) => piece.letter),
    points: list.flatMap((piece) => piece.outline),
    thickness: Math.max(...list.map((piece) => piece.thickness)),
  }));
}

function carriedWhole(on: string, pieces: readonly Piece[], { clearLength }: SiteAccess): boolean {
  const own = pieces.filter((piece) => piece.on === on);
  const { length } = leastWidth(own.flatMap((piece) => piece.outline));
  return clearLength === null || Math.hypot(length, own[0]?.thickness ?? 0) <= clearLength;
}

/** Disjoint sets with path halving. */
class Groups {
  private readonly parent: Map<string, string>;

  constructor(names: readonly string[]) {
    this.parent = new Map(names.map((name) => [name, name]));
  }

  find(name: string): string {
    let at = name;
    while (this.parent.get(at) !== at) {
      this.parent.set(at, this.parent.get(this.parent.get(at)!)!);
      at = this.parent.get(at)!;
    }
    return at;
  }

  join(a: string, b: string): void {
    if (this.parent.has(a) && this.parent.has(b)) this.parent.set(this.find(b), this.find(a));
  }
}

/**
 * The ways in for one section: through the door on edge (least width against the door's height) or flat (against its
 * width), then round the corridor's corner the same way up; and tipped over its end where stairs limit the length.
 */
export function gettingIn({ letters, points, thickness }: Section, access: SiteAccess): GettingIn {
  const { width, length } = leastWidth(points);
  const corner = (carried: number) =>
    access.corridor === null || passesCorner(access.corridor[0], access.corridor[1], length, carried);
  const onEdge = width <= access.doorHeight && thickness <= access.doorWidth && corner(thickness);
  const flat = width <= access.doorWidth && thickness <= access.doorHeight && corner(width);
  const tippedLength = Math.hypot(length, thickness);
  const tips = access.clearLength === null || tippedLength <= access.clearLength;
  return { letters, width, length, onEdge, flat, tippedLength, tips, passes: (onEdge || flat) && tips };
}
