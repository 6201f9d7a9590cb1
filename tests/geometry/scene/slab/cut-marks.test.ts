import type { Point } from '@/geometry/core/point';
import { cutMarks, lineOf, keptSides, offSquareDeg } from '@/geometry/scene/slab/cut-marks';
import { placeSlab, type PlacedPiece, type PlacedSlab } from '@/geometry/scene/slab/placed-slab';
import { formatLength, roundLength } from '@/geometry/tape/format-length';
import type { Piece } from '@/geometry/top/types';

import { alderJob, sharedMiterJob, stripsJob, type Job } from '../alder-job';
import { sharedMiterSlab } from '../hand-nest';

const slabsOf = ({ plan, layout }: Job): PlacedSlab[] => plan.nest!.slabs.map((_, i) => placeSlab(plan, layout, i));

describe('cutMarks', () => {
  /**
   * The worked example of the look, section 6: S is 59 3/16 at the back and 33 5/8 in front, trim 1/2, kerf 1/8, slab 25
   * deep. Printed there: 59 11/16 and 59 7/8 on top, 34 1/8 and 34 5/16 below, 45.65 degrees off square.
   */
  it('gives both sides of the kerf on both edges: 59 11/16 and 59 7/8, 34 1/8 and 34 5/16', () => {
    const { layout, plan } = sharedMiterJob();
    const piece = (letter: string, back: number, front: number): Piece => ({
      ...plan.pieces.find((p) => p.letter === letter)!,
      back,
      front,
    });
    const slab = sharedMiterSlab('HM-120', layout, piece('S', 59.1875, 33.625), piece('T', 83.875, 58.3125));
    const miter = slab.cuts[1]!;
    if (miter.kind !== 'crosscut') throw new Error('the second cut is the miter');
    const words = [miter.back, miter.backFar, miter.front, miter.frontFar].map((at) => formatLength(at, '1/16'));
    expect(words).toEqual(['59 11/16', '59 7/8', '34 1/8', '34 5/16']);
    // The look gives 45.65 from unrounded sizes; these rounded ones make 45.64.
    expect(Math.abs(offSquareDeg(miter) - 45.65)).toBeLessThan(0.02);
  });

  it('names long points and short points of both pieces of a shared miter', () => {
    const [slab] = slabsOf(sharedMiterJob());
    const named = cutMarks(slab!)
      .filter((mark) => mark.cut === 2)
      .map((mark) => `${mark.edge} ${mark.letter} ${mark.word}`);
    expect(named).toEqual(['top S long point', 'top T short point', 'bottom S short point', 'bottom T long point']);
  });

  it('puts the marks of both sides one kerf apart, square to the cut', () => {
    const { layout } = sharedMiterJob();
    const [slab] = slabsOf(sharedMiterJob());
    for (const cut of slab!.cuts) {
      if (cut.kind !== 'crosscut') continue;
      const along = lineOf(cut, 'right').top - lineOf(cut, 'left').top;
      expect(along * Math.cos((offSquareDeg(cut) * Math.PI) / 180)).toBeCloseTo(layout.stock.kerf, 9);
    }
  });

  it('gives no second label to a rough cut that stands on a piece’s mark', () => {
    for (const slab of slabsOf(alderJob())) {
      const marks = cutMarks(slab);
      const keys = marks.map((mark) => `${mark.edge} ${mark.at.toFixed(3)} ${mark.side}`);
      expect(new Set(keys).size).toBe(keys.length);
    }
  });

  it('marks nothing on the slab’s edges for a cut inside a ripped section', () => {
    const found = slabsOf(stripsJob()).map((slab) => {
      const inner = slab.cuts.filter((c) => c.kind === 'crosscut' && c.yFront > 0.01 && c.yBack < slab.depth - 0.01);
      const marked = new Set(cutMarks(slab).map((mark) => mark.cut));
      return { inner: inner.length, marked: inner.filter((cut) => marked.has(cut.n)).length };
    });
    expect(found.reduce((sum, slab) => sum + slab.inner, 0)).toBeGreaterThan(0);
    expect(found.reduce((sum, slab) => sum + slab.marked, 0)).toBe(0);
  });

  it('lets every piece be rebuilt from the rounded marks and rips alone, within 1/32 in', () => {
    for (const job of [alderJob(), sharedMiterJob(), stripsJob()]) {
      for (const slab of slabsOf(job)) {
        for (const piece of slab.pieces) {
          const rebuilt = rebuild(slab, piece, (at) => roundLength(at, job.layout.step));
          for (const corner of piece.outline) {
            const off = Math.min(...rebuilt.map((p) => Math.hypot(p[0] - corner[0], p[1] - corner[1])));
            expect(off).toBeLessThanOrEqual(Math.hypot(1 / 32, 1 / 32) + 1e-9);
            expect(Math.min(...rebuilt.map((p) => Math.abs(p[0] - corner[0])))).toBeLessThanOrEqual(1 / 32 + 1e-9);
          }
        }
      }
    }
  });
});

/**
 * The piece that is left when a person keeps to the marks: of all cut lines, rounded, the nearest to the piece's middle on
 * each side bound it. Knows the piece's middle and nothing else of its outline.
 */
function rebuild(slab: PlacedSlab, piece: PlacedPiece, round: (at: number) => number): Point[] {
  const middle: Point = [
    piece.outline.reduce((sum, p) => sum + p[0], 0) / piece.outline.length,
    piece.outline.reduce((sum, p) => sum + p[1], 0) / piece.outline.length,
  ];
  let [low, high] = [0, slab.depth];
  for (const cut of slab.cuts) {
    if (cut.kind !== 'rip' || middle[0] < cut.from || middle[0] > cut.to) continue;
    if (cut.acrossFar <= middle[1]) low = Math.max(low, round(cut.acrossFar));
    if (cut.across >= middle[1]) high = Math.min(high, round(cut.across));
  }
  let left = (_y: number) => 0;
  let right = (_y: number) => slab.length;
  for (const cut of slab.cuts) {
    if (cut.kind !== 'crosscut' || middle[1] < cut.yFront || middle[1] > cut.yBack) continue;
    for (const side of ['left', 'right'] as const) {
      const keeps = keptSides(slab, cut).includes(side) || cut.left === null || cut.right === null;
      const line = lineOf(cut, side);
      const [a, b] = [round(line.bottom), round(line.top)];
      const at = (y: number) => a + ((b - a) * (y - cut.yFront)) / (cut.yBack - cut.yFront);
      const here = at(middle[1]);
      if (!keeps) continue;
      if (side === 'left' && here >= middle[0] && here <= right(middle[1]) + 1e-9) right = nearer(right, at, Math.min);
      if (side === 'right' && here <= middle[0] && here >= left(middle[1]) - 1e-9) left = nearer(left, at, Math.max);
    }
  }
  return [[left(low), low], [right(low), low], [right(high), high], [left(high), high]]; // prettier-ignore
}

const nearer =
  (a: (y: number) => number, b: (y: number) => number, pick: (...values: number[]) => number) => (y: number) =>
    pick(a(y), b(y));
