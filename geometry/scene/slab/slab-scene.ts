import type { Layout } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import type { NestCut } from '../../nest/types';
import type { Plan } from '../../plan/types';
import type { DrawItem, Scene } from '../display-list';
import { text } from '../room/scene-styles';
import { lineOf, keptSides, piecesAtRip } from './cut-marks';
import { placeSlab, type PlacedPiece, type PlacedSlab } from './placed-slab';
import { widestGap } from './widest-gap';

export interface SlabSceneOptions {
  /** Letter of the piece that is chosen. */
  readonly selected?: string | null;
}

/** px: letters' discs and squares; inches a shared cut's line reaches past the slab. */
const LETTER = 38;
const PAST = 1;
/** A piece this long has room for words beside its letter, inches. */
const ROOM_FOR_WORDS = 32;
/** An offcut this long has room for its size, inches. */
const ROOM_FOR_SIZE = 8;

/**
 * One slab to scale, as it lies on the bench: x from its left end, y from its front edge, inches. Wood where pieces lie,
 * hatching where none does; one saw cut that makes both ends of a miter is a chalk line through both edges.
 *
 * @throws RangeError as `placeSlab`
 */
export function slabScene(plan: Plan, layout: Layout, slabIndex: number, options: SlabSceneOptions = {}): Scene {
  const slab = placeSlab(plan, layout, slabIndex);
  const rect: Polygon = [[0, 0], [slab.length, 0], [slab.length, slab.depth], [0, slab.depth]]; // prettier-ignore
  const items: DrawItem[] = [
    { layer: 'slab', kind: 'polygon', outline: rect, fill: 'card' },
    { layer: 'offcuts', kind: 'hatch', outline: rect, pattern: 'waste', ink: 'ink2' },
    ...slab.pieces.map((piece) => wood(slab, piece, layout)),
    ...slab.pieces.flatMap(cutouts),
    ...slab.defects.flatMap(defect),
    ...slab.pieces.map((piece) => outline(piece, options.selected === piece.letter)),
    { layer: 'slab', kind: 'polygon', outline: rect, stroke: { ink: 'ink', width: 2.4 } },
    ...slab.cuts.flatMap((cut) => cutLine(slab, cut)),
    ...slab.offcuts.filter((offcut) => offcut.keep).flatMap((offcut) => keptSize(offcut, layout)),
    ...slab.pieces.flatMap(letter),
  ];
  return {
    bounds: { minX: 0, minY: 0, maxX: slab.length, maxY: slab.depth },
    items,
    title: slab.name,
    alt: `${slab.name} with ${slab.pieces.map((p) => `${p.letter} face ${p.faceDown ? 'down' : 'up'}`).join(', ')}`,
  };
}

function wood(slab: PlacedSlab, piece: PlacedPiece, layout: Layout): DrawItem {
  return {
    layer: 'staves',
    id: piece.letter,
    kind: 'staves',
    outline: piece.outline,
    holes: piece.cutouts.map((cutout) => cutout.outline),
    along: [1, 0],
    origin: [0, 0],
    width: layout.material.stave,
    species: slab.species,
    // One seed a slab: its staves run through all its pieces.
    seed: `${slab.stock} ${slab.index}`,
  };
}

function cutouts(piece: PlacedPiece): DrawItem[] {
  return piece.cutouts.map((cutout) => ({
    layer: 'cutouts',
    id: cutout.id,
    kind: 'polygon',
    outline: cutout.outline,
    fill: 'card',
    stroke: { ink: 'ink', width: 1.6, dash: [5, 3] },
  }));
}

function defect({ x, y, w, h }: PlacedSlab['defects'][number]): DrawItem[] {
  const [a, b, c, d]: readonly Point[] = [[x, y], [x + w, y], [x + w, y + h], [x, y + h]]; // prettier-ignore
  const stroke = { ink: 'red', width: 1.8 } as const;
  return [
    { layer: 'defects', kind: 'polygon', outline: [a!, b!, c!, d!], fill: 'redT', stroke: { ...stroke, dash: [5, 3] } },
    { layer: 'defects', kind: 'line', from: a!, to: c!, stroke },
    { layer: 'defects', kind: 'line', from: b!, to: d!, stroke },
  ];
}

function outline(piece: PlacedPiece, selected: boolean): DrawItem {
  const stroke = selected ? ({ ink: 'chalk', width: 4, casing: true } as const) : ({ ink: 'ink', width: 1.6 } as const);
  return { layer: 'tops', id: piece.letter, kind: 'polygon', outline: piece.outline, stroke };
}

function cutLine(slab: PlacedSlab, cut: NestCut): DrawItem[] {
  const tag = { layer: 'cuts', id: `cut ${cut.n}` } as const;
  if (cut.kind === 'rip') {
    const y = piecesAtRip(slab, cut).below.length > 0 ? cut.across : cut.acrossFar;
    return [{ ...tag, kind: 'line', from: [cut.from, y], to: [cut.to, y], stroke: { ink: 'ink', width: 1.6 } }];
  }
  const line = lineOf(cut, keptSides(slab, cut)[0]);
  if (!cut.shared || Math.abs(cut.back - cut.front) < 1) {
    const ends = { from: [line.bottom, cut.yFront], to: [line.top, cut.yBack] } as const;
    return [{ ...tag, kind: 'line', ...ends, stroke: { ink: 'ink', width: 1.6 } }];
  }
  const slope = (line.top - line.bottom) / (cut.yBack - cut.yFront);
  const from: Point = [line.bottom - slope * PAST, cut.yFront - PAST];
  const to: Point = [line.top + slope * PAST, cut.yBack + PAST];
  return [
    { ...tag, kind: 'line', from, to, stroke: { ink: 'chalk', width: 5, casing: true } },
    {
      ...tag,
      kind: 'text',
      at: from,
      shift: [0, -16],
      text: 'one cut, both ends',
      style: { ...text.caption, ink: 'chalk' },
      anchor: 'middle',
      middle: true,
    },
  ];
}

function keptSize(offcut: PlacedSlab['offcuts'][number], layout: Layout): DrawItem[] {
  if (offcut.length < ROOM_FOR_SIZE) return [];
  return [
    {
      layer: 'offcuts',
      kind: 'length',
      at: [offcut.x + offcut.length / 2, offcut.y + offcut.depth / 2],
      inches: offcut.length,
      step: layout.step,
      unit: true,
      style: text.number,
      anchor: 'middle',
      middle: true,
      ground: 'card',
      frame: 'ink',
    },
  ];
}

function letter(piece: PlacedPiece): DrawItem[] {
  const ys = piece.outline.map((p) => p[1]);
  const [low, high] = [Math.min(...ys), Math.max(...ys)];
  const middle = (low + high) / 2;
  const levels = [middle - (high - low) * 0.2, middle, middle + (high - low) * 0.2];
  const gap = widestGap(piece.outline, piece.cutouts.map((c) => c.outline), levels); // prettier-ignore
  const at: Point = [(gap.from + gap.to) / 2, middle];
  const tag = { layer: 'letters', id: piece.letter } as const;
  const size = high - low < 6 ? 24 : LETTER;
  const mark = piece.faceDown ? 'square' : 'disc';
  const sign: DrawItem = { ...tag, kind: 'mark', at, mark, size, ink: 'ink', text: piece.letter };
  if (!piece.faceDown) return [sign];
  const roomy = gap.to - gap.from > ROOM_FOR_WORDS && high - low >= 6;
  const icon = { ...tag, kind: 'mark', at, mark: 'turnOver', size: 20 } as const;
  if (!roomy) return [sign, { ...icon, shift: [size / 2 + 16, 0], ink: 'ink' }];
  return [
    sign,
    {
      ...tag,
      kind: 'text',
      at,
      shift: [size / 2 + 20, 0],
      // Hard spaces leave room for the icon.
      text: `${'\u00a0'.repeat(8)}Face down`,
      style: { face: 'label', weight: 'bold', size: 17, ink: 'card' },
      anchor: 'start',
      middle: true,
      ground: 'ink',
      frame: 'ink',
    },
    { ...icon, shift: [size / 2 + 30, 0], ink: 'card' },
  ];
}
