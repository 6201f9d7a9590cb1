import type { Layout, Strip } from '../core/layout';
import { boundingBox } from '../core/polygon';
import type { BarePiece } from '../top/deck-pieces';
import type { SolvedRoom } from '../top/solved-room';
import { stripPieces } from '../top/strip-pieces';
import type { LayProblem } from '../top/types';
import type { LaidSeam } from './laid-seams';
import { longestCarried, longestPiece, longStock, type LongStock } from './long-stock';

/** Clear floor between the room and the strips drawn below it, and between strips, inches. */
const BELOW_ROOM = 24;
const BETWEEN_STRIPS = 6;

export interface LaidStrips {
  readonly pieces: readonly BarePiece[];
  readonly seams: readonly LaidSeam[];
  readonly problems: readonly LayProblem[];
}

/**
 * Strips one below the other under the room. One that is longer than a slab of its thickness, or than what can be carried
 * in, is cut evenly between its pinned seams.
 */
export function layStrips(layout: Layout, room: SolvedRoom): LaidStrips {
  const box = boundingBox(room.points);
  const x = Number.isFinite(box.minX) ? box.minX : 0;
  let y = (Number.isFinite(box.minY) ? box.minY : 0) - BELOW_ROOM;
  const stock = longStock(layout);
  const pieces: BarePiece[] = [];
  const seams: LaidSeam[] = [];
  const problems: LayProblem[] = [];
  for (const strip of layout.strips) {
    if (!(strip.length > 0 && strip.width > 0)) {
      const message = `${strip.label || `Strip ${strip.id}`} has no ${strip.length > 0 ? 'width' : 'length'}.`;
      problems.push({ code: 'strip-no-size', message, at: { run: strip.id } });
      continue;
    }
    y -= strip.width;
    const pinned = layout.seams.filter((pin) => pin.on === strip.id).map((pin) => pin.at);
    const marks = stripMarks(strip, pinned, longestOf(strip, layout, stock));
    const cut = stripPieces(strip, marks, [x, y]);
    pieces.push(...cut);
    marks.forEach((at, i) =>
      seams.push({
        on: strip.id,
        at,
        from: [x + at, y + strip.width],
        to: [x + at, y],
        visible: strip.width,
        inCutout: null,
        pinned: pinned.includes(at),
        keys: [cut[i]!.key, cut[i + 1]!.key],
      }),
    );
    y -= BETWEEN_STRIPS;
  }
  return { pieces, seams, problems };
}

/** A strip of another thickness than the tops comes from other stock, whose lengths are not known. */
function longestOf(strip: Strip, layout: Layout, stock: LongStock): number {
  const sameStock = Math.abs(strip.thickness - layout.material.thickness) < 1e-6;
  const carried = longestCarried(layout.access, strip.thickness);
  return sameStock ? Math.min(carried, longestPiece(stock, strip.width)) : carried;
}

function stripMarks(strip: Strip, pinned: readonly number[], longest: number): readonly number[] {
  const fixed = pinned.filter((at) => at > 0 && at < strip.length).sort((a, b) => a - b);
  const ends = [0, ...new Set(fixed), strip.length];
  const marks: number[] = [];
  for (let i = 1; i < ends.length; i++) {
    const [from, to] = [ends[i - 1]!, ends[i]!];
    const count = Math.max(1, Math.ceil((to - from - 1e-6) / longest));
    for (let k = 1; k < count; k++) marks.push(from + ((to - from) * k) / count);
    if (i < ends.length - 1) marks.push(to);
  }
  return marks;
}
