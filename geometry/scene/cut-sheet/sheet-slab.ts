import type { Point, Polygon } from '../../core/point';
import type { NestCrosscut, NestRip } from '../../nest/types';
import type { DisplayStep } from '../../tape/format-length';
import type { DrawItem } from '../display-list';
import { layoutLength } from '../length-layout';
import { SMALLEST, styles, type PageBuilder } from '../paper/page-builder';
import { isSquare, lineOf, keptSides, piecesAtRip } from '../slab/cut-marks';
import type { PlacedSlab } from '../slab/placed-slab';
import { Occupancy, type Room } from './occupancy';
import type { MarkLabel } from './mark-labels';
import { PieceSigns } from './piece-signs';

/** px: height of a row of labels, and of the triangles and ticks between the slab and the first row. */
export const LABEL_ROW = 50;
export const BESIDE_SLAB = 26;

/**
 * Where the slab stands on the page: px of its left back corner, and px for an inch of slab along and across. The two
 * differ where the page is short: marks along the slab need the room more.
 */
export interface SlabFrame {
  readonly left: number;
  readonly top: number;
  readonly scale: number;
  readonly scaleAcross: number;
}

/** px a square cut's line reaches past the slab, width of slab outline and of cuts, size of the triangles. */
const PAST = 20;
const OUTLINE = 4;
const CUT = 4;
const TRIANGLE = 17;
/** Numbered discs, px across; a smaller one where a lane is narrow. */
const DISC = 38;
const SMALL_DISC = 25;

/** Shares of a cut's line where its number may stand, the best first. */
const CROSSCUT_SPOTS = [0.5, 0.15, 0.85, 0.3, 0.7, 0.4, 0.6, 0.08, 0.92];
const RIP_SPOTS = Array.from({ length: 40 }, (_, i) => 0.06 + (i * 0.9) / 40);

/** The slab on the page: pieces by face, cuts with their numbers, marks on both edges. */
export class SheetSlab {
  private readonly taken = new Occupancy();

  constructor(
    private readonly page: PageBuilder,
    private readonly slab: PlacedSlab,
    private readonly frame: SlabFrame,
    private readonly step: DisplayStep,
  ) {}

  draw(top: readonly MarkLabel[], bottom: readonly MarkLabel[]): void {
    this.grounds();
    const signs = new PieceSigns(this.page, this.taken, (p) => this.px(p), this.step);
    for (const piece of this.slab.pieces) signs.cutouts(piece);
    for (const piece of this.slab.pieces) signs.face(piece);
    for (const offcut of this.slab.offcuts) if (offcut.keep) this.keptOffcut(offcut);
    for (const cut of this.slab.cuts) this.cutLine(cut);
    this.outlineOf(this.rectangle(), OUTLINE);
    // A crosscut in a narrow lane has one place for its number, a rip has many: it goes last.
    for (const kind of ['crosscut', 'rip']) {
      for (const cut of this.slab.cuts) if (cut.kind === kind) this.cutNumber(cut);
    }
    for (const piece of this.slab.pieces) signs.wallEdge(piece);
    this.labels(top, 'top');
    this.labels(bottom, 'bottom');
  }

  /** px on the page of a place on the slab. */
  private px([x, y]: Point): Point {
    const { left, top, scale, scaleAcross } = this.frame;
    return [left + x * scale, top + (this.slab.depth - y) * scaleAcross];
  }

  private onPage(p: Point): Point {
    const [x, y] = this.px(p);
    return this.page.at(x, y);
  }

  private rectangle(): Polygon {
    const { length, depth } = this.slab;
    return [[0, 0], [length, 0], [length, depth], [0, depth]]; // prettier-ignore
  }

  /** Everything is waste but the pieces. */
  private grounds(): void {
    const waste = this.rectangle().map((p) => this.onPage(p));
    this.page.add({ kind: 'hatch', layer: 'offcuts', outline: waste, pattern: 'waste', ink: 'ink' });
    for (const piece of this.slab.pieces) {
      const outline = piece.outline.map((p) => this.onPage(p));
      const holes = piece.cutouts.map((cutout) => cutout.outline.map((p) => this.onPage(p)));
      const pattern = piece.faceDown ? 'dots' : 'grain';
      this.page.add(
        { kind: 'polygon', layer: 'tops', id: piece.letter, outline, fill: 'card' },
        { kind: 'hatch', layer: 'tops', id: piece.letter, outline, holes, pattern, ink: 'ink' },
      );
    }
    for (const defect of this.slab.defects) this.defect(defect);
  }

  private defect({ x, y, w, h }: PlacedSlab['defects'][number]): void {
    const box: Polygon = [[x, y], [x + w, y], [x + w, y + h], [x, y + h]]; // prettier-ignore
    const corners = box.map((p) => this.onPage(p));
    const stroke = { ink: 'ink', width: 1.6 } as const;
    this.page.add({ kind: 'polygon', layer: 'defects', outline: corners, fill: 'card', stroke });
    this.page.add({ kind: 'line', layer: 'defects', from: corners[0]!, to: corners[2]!, stroke });
    this.page.add({ kind: 'line', layer: 'defects', from: corners[1]!, to: corners[3]!, stroke });
  }

  private keptOffcut(offcut: PlacedSlab['offcuts'][number]): void {
    const [x, y] = this.px([offcut.x + offcut.length / 2, offcut.y + offcut.depth / 2]);
    const size = layoutLength(offcut.length, this.step, styles.mark, true, SMALLEST).width;
    const room = offcut.length * this.frame.scale;
    const place = { layer: 'offcuts', anchor: 'middle', middle: true, ground: 'card', frame: 'ink' } as const;
    const length = { inches: offcut.length, step: this.step, unit: true };
    const runs = size + 70 < room ? [{ text: 'Keep ', style: styles.label }, length] : [length];
    this.page.runs(x, y, runs, { ...styles.mark, size: 20 }, 400, place);
    this.taken.add({ left: x - size / 2 - 60, right: x + size / 2 + 60, top: y - 26, bottom: y + 26 });
  }

  private outlineOf(ring: Polygon, width: number): void {
    const outline = ring.map((p) => this.onPage(p));
    this.page.add({ kind: 'polygon', layer: 'slab', outline, stroke: { ink: 'ink', width } });
  }

  private cutLine(cut: NestCrosscut | NestRip): void {
    const [from, to] = this.cutEnds(cut);
    const past = cut.kind === 'crosscut' && isSquare(cut) ? PAST : 0;
    const [a, b] = [this.px(from), this.px(to)];
    const onTop = cut.kind === 'crosscut' && Math.abs(cut.yBack - this.slab.depth) < 1e-3 ? past : 0;
    const onBottom = cut.kind === 'crosscut' && Math.abs(cut.yFront) < 1e-3 ? past : 0;
    const place = { layer: 'cuts', id: `cut ${cut.n}` } as const;
    this.page.line(a[0], a[1] + onBottom, b[0], b[1] - onTop, past ? 2.4 : CUT, place);
  }

  /** Front end and back end of the line to keep to; of a rip, left and right end. */
  private cutEnds(cut: NestCrosscut | NestRip): readonly [Point, Point] {
    if (cut.kind === 'rip') {
      const y = piecesAtRip(this.slab, cut).below.length > 0 ? cut.across : cut.acrossFar;
      return [[cut.from, y], [cut.to, y]]; // prettier-ignore
    }
    const line = lineOf(cut, keptSides(this.slab, cut)[0]);
    return [[line.bottom, cut.yFront], [line.top, cut.yBack]]; // prettier-ignore
  }

  private cutNumber(cut: NestCrosscut | NestRip): void {
    const [a, b] = this.cutEnds(cut).map((p) => this.px(p)) as [Point, Point];
    const lane = cut.kind === 'rip' ? 0 : Math.abs(b[1] - a[1]);
    const spots = cut.kind === 'rip' ? RIP_SPOTS : CROSSCUT_SPOTS;
    const around = (size: number) =>
      spots.map((t): Room => {
        const [x, y] = [a[0] + (b[0] - a[0]) * t, a[1] + (b[1] - a[1]) * t];
        return { left: x - size / 2, right: x + size / 2, top: y - size / 2, bottom: y + size / 2 };
      });
    const large = lane < 3 * DISC ? null : this.taken.freest(around(DISC));
    const room = large && this.taken.overlap(large) === 0 ? large : this.taken.freest(around(SMALL_DISC));
    const size = room.right - room.left;
    this.taken.add(room);
    const at = this.page.at((room.left + room.right) / 2, (room.top + room.bottom) / 2);
    this.page.add({ kind: 'mark', layer: 'cuts', id: `cut ${cut.n}`, at, mark: 'numbered', size, ink: 'ink', text: String(cut.n) }); // prettier-ignore
  }

  /** Leaders first, so that the grounds of labels cover those that have to run under one. */
  private labels(labels: readonly MarkLabel[], edge: 'top' | 'bottom'): void {
    const out = edge === 'top' ? -1 : 1;
    const y = edge === 'top' ? this.frame.top : this.frame.top + this.slab.depth * this.frame.scaleAcross;
    for (const label of labels) {
      if (label.row > 0) {
        const reach = BESIDE_SLAB + label.row * LABEL_ROW + 6;
        this.page.line(label.x, y, label.x, y + out * reach, 1, { layer: 'readings' });
      }
      this.triangle(label, y, out);
    }
    for (const label of labels) this.label(label, y + out * (BESIDE_SLAB + label.row * LABEL_ROW), edge);
  }

  /** Filled for a long point, open for a short one, standing on the side of its piece with its tip on the mark. */
  private triangle({ mark, x }: MarkLabel, y: number, out: number): void {
    if (mark.word !== 'long point' && mark.word !== 'short point') return;
    const side = mark.side === 'left' ? -1 : 1;
    const corners: readonly Point[] = [[x, y + out * 2], [x + side * TRIANGLE, y + out * (TRIANGLE + 2)], [x, y + out * (TRIANGLE + 2)]]; // prettier-ignore
    const item: DrawItem = {
      kind: 'polygon',
      layer: 'readings',
      outline: corners.map(([px, py]) => this.page.at(px, py)),
      fill: mark.word === 'long point' ? 'ink' : 'card',
      stroke: { ink: 'ink', width: 1.5 },
    };
    this.page.add(item);
  }

  private label(label: MarkLabel, y: number, edge: 'top' | 'bottom'): void {
    const { mark, name, anchor } = label;
    const x = anchor === 'end' ? label.right : label.left;
    const id = `mark ${mark.cut} ${mark.side} ${edge}`;
    const place = { layer: 'readings', id, anchor, ground: 'card' } as const;
    const number = [{ inches: mark.at, step: this.step }];
    this.page.text(x, edge === 'top' ? y - 34 : y + 45, name, styles.label, place);
    this.page.runs(x, edge === 'top' ? y - 6 : y + 21, number, styles.mark, 400, place);
  }
}
