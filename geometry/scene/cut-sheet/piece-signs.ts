import type { Point } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import type { DisplayStep } from '../../tape/format-length';
import { styles, type PageBuilder } from '../paper/page-builder';
import { widestGap, type Span } from '../slab/widest-gap';
import type { PlacedHole, PlacedPiece } from '../slab/placed-slab';
import { textWidth } from '../text-width';
import type { Occupancy, Room } from './occupancy';

/** px across: the letter's disc or square, largest and smallest. */
const LARGEST = 100;
const LEAST = 24;
const TAG = { face: 'label', weight: 'bold', size: 20, ink: 'ink' } as const;

/** What is written into a piece: its letter by face, the grain, its wall edge, its cutouts. */
export class PieceSigns {
  constructor(
    private readonly page: PageBuilder,
    private readonly taken: Occupancy,
    private readonly px: (p: Point) => Point,
    private readonly step: DisplayStep,
  ) {}

  cutouts(piece: PlacedPiece): void {
    for (const cutout of piece.cutouts) this.cutout(piece, cutout);
  }

  private cutout(piece: PlacedPiece, cutout: PlacedHole): void {
    const ring = cutout.outline.map((p) => this.px(p));
    const outline = ring.map(([x, y]) => this.page.at(x, y));
    const stroke = { ink: 'ink', width: 2, dash: [8, 5] } as const;
    this.page.add({ kind: 'polygon', layer: 'cutouts', id: cutout.id, outline, fill: 'card', stroke });
    const box = boundingBox(ring);
    const [width, height] = [box.maxX - box.minX, box.maxY - box.minY];
    this.taken.add({ left: box.minX, right: box.maxX, top: box.minY, bottom: box.maxY });
    const [x, y] = [(box.minX + box.maxX) / 2, (box.minY + box.maxY) / 2];
    const place = { layer: 'cutouts', id: cutout.id, anchor: 'middle', middle: true } as const;
    const name = cutout.part ? `${cutout.label} half` : cutout.label;
    const when = cutout.part ? 'after glue-up' : 'cut out last';
    const fits = Math.max(textWidth(name, styles.label), textWidth(when, styles.label)) + 8 < width;
    if (fits && height > 46) {
      this.page.text(x, y - 12, name, styles.label, place);
      this.page.text(x, y + 12, when, styles.label, place);
    } else if (textWidth(name, styles.label) + 6 < width && height > 20) {
      this.page.text(x, y, name, styles.label, place);
    }
  }

  /** Letter in a disc (face up) or a square (face down), the word, and an arrow along the grain. */
  face(piece: PlacedPiece): void {
    const ring = piece.outline.map((p) => this.px(p));
    const holes = piece.cutouts.map((c) => c.outline.map((p) => this.px(p)));
    const box = boundingBox(ring);
    const [middle, height] = [(box.minY + box.maxY) / 2, box.maxY - box.minY];
    const word = piece.faceDown ? 'Face DOWN' : 'Face up';
    const tag = textWidth(word, TAG) + 20;
    const level = widestGap(ring, holes, [middle]);
    const size = Math.max(LEAST, Math.min(LARGEST, height * 0.5, (level.to - level.from) * 0.6));
    const wide = widestGap(ring, holes, [middle - size / 2, middle, middle + size / 2]);
    const tall = widestGap(ring, holes, [middle - size / 2 - 22, middle, middle + size / 2 + 22]);
    const width = (gap: Span) => gap.to - gap.from;
    if (width(wide) >= size + tag + 70) {
      const x = (wide.from + wide.to - tag - 26) / 2;
      this.letter(piece, x, middle, size);
      this.beside(piece, word, x + size / 2 + 14, middle, { tag, size, height });
    } else if (height >= size + 60 && width(tall) >= Math.max(tag, size) + 8) {
      const x = (tall.from + tall.to) / 2;
      this.letter(piece, x, middle - 22, size);
      this.tag(piece, word, x, middle + size / 2 + 6);
    } else {
      const gap = width(wide) > size ? wide : level;
      this.letter(piece, (gap.from + gap.to) / 2, middle, size);
    }
  }

  private letter(piece: PlacedPiece, x: number, y: number, size: number): void {
    const at = this.page.at(x, y);
    const mark = piece.faceDown ? 'square' : 'disc';
    this.page.add({ kind: 'mark', layer: 'letters', id: piece.letter, at, mark, size, ink: 'ink', text: piece.letter });
    this.taken.add({ left: x - size / 2, right: x + size / 2, top: y - size / 2, bottom: y + size / 2 });
  }

  private beside(
    piece: PlacedPiece,
    word: string,
    left: number,
    y: number,
    { tag, size, height }: { readonly tag: number; readonly size: number; readonly height: number },
  ): void {
    const withArrow = height > 86 && size >= 60;
    if (height > 44) this.tag(piece, word, left + tag / 2, withArrow ? y - 24 : y);
    if (!withArrow) return;
    const place = { layer: 'letters', id: piece.letter } as const;
    const label = { ...styles.label };
    const width = textWidth('grain', label);
    const at = this.page.at(left + 34, y + 26);
    const box = [left - 2, y + 14, 84 + width, 24] as const;
    this.page.add({
      kind: 'polygon',
      ...place,
      outline: [[box[0], box[1] + box[3]], [box[0] + box[2], box[1] + box[3]], [box[0] + box[2], box[1]], [box[0], box[1]]].map(([px, py]) => this.page.at(px!, py!)), // prettier-ignore
      fill: 'card',
    });
    this.page.add({ kind: 'mark', ...place, at, mark: 'grainArrow', size: 66, ink: 'ink' });
    this.page.text(left + 76, y + 32, 'grain', label, place);
    this.taken.add({ left: box[0], right: box[0] + box[2], top: box[1], bottom: box[1] + box[3] });
  }

  private tag(piece: PlacedPiece, word: string, x: number, y: number): void {
    const place = { layer: 'letters', id: piece.letter, anchor: 'middle', middle: true } as const;
    const style = piece.faceDown ? ({ ...TAG, ink: 'card' } as const) : TAG;
    this.page.text(x, y, word, style, { ...place, ground: piece.faceDown ? 'ink' : 'card', frame: 'ink' });
    const half = textWidth(word, TAG) / 2 + 10;
    this.taken.add({ left: x - half, right: x + half, top: y - 16, bottom: y + 16 });
  }

  /** The edge that goes to the wall, written just inside it where nothing else stands. */
  wallEdge(piece: PlacedPiece): void {
    if (!piece.wallEdge) return;
    const ring = piece.outline.map((p) => this.px(p));
    const box = boundingBox(ring);
    const inward = piece.wallEdge === 'back' ? 1 : -1;
    const line = piece.wallEdge === 'back' ? box.minY : box.maxY;
    const edge = widestGap(ring, [], [line, line + inward * 26]);
    const width = textWidth('wall edge', styles.label);
    if (edge.to - edge.from < width + 24) return;
    const y = line + inward * 15;
    const middles = [edge.from + 16 + width / 2, edge.to - 16 - width / 2, (edge.from + edge.to) / 2];
    const rooms = middles.map((x): Room => ({ left: x - width / 2 - 6, right: x + width / 2 + 6, top: y - 9, bottom: y + 9 })); // prettier-ignore
    const room = this.taken.freest(rooms);
    this.taken.add(room);
    const place = { layer: 'letters', id: piece.letter, anchor: 'middle', middle: true, ground: 'card' } as const;
    this.page.text((room.left + room.right) / 2, y, 'wall edge', styles.label, place);
  }
}
