import type { Point } from '../../core/point';
import { dot, leftNormal, subtract } from '../../core/vector';
import type { DrawItem } from '../display-list';
import { grainLines } from './hatch-primitives';
import {
  outlinePath,
  pathThrough,
  project,
  type ClipPrimitive,
  type Path,
  type PathPrimitive,
  type Primitive,
  type Segment,
  type View,
} from './primitive';
import { chance, woodLook, type WoodLook } from './wood-look';

type Staves = Extract<DrawItem, { kind: 'staves' }>;

/** Under this many px per inch the figure of the wood is left out. */
const FIGURE_FROM = 2;
/** Tones a species has; `WoodLook.tones`. */
export const TONES = 5;
/** A stretch of stave that gets at most one mark of figure, inches. */
export const CELL = 7;

/** Wood: strips in five tones along the grain, clipped to the piece, with its figure where it can be seen. */
export function stavePrimitives(staves: Staves, view: View): Primitive[] {
  if (view.wood === 'lines') return [grainOnly(staves, view)];
  const look = woodLook(staves.species);
  const frame = new GrainFrame(staves, view);
  const tones: Segment[][] = Array.from({ length: TONES }, () => []);
  const edges: Segment[] = [];
  for (const strip of frame.strips()) {
    tones[strip.tone]!.push(...frame.box(strip.from, strip.to));
    edges.push(...frame.line(strip.from));
  }
  const children: PathPrimitive[] = tones
    .map((path, i): PathPrimitive => ({ kind: 'path', path, fill: { hex: look.tones[i]! } }))
    .filter((tone) => tone.path.length > 0);
  children.push({ kind: 'path', path: edges, line: { paint: { hex: look.edge }, width: 0.8 * view.pixel } });
  if (view.pxPerInch / view.pixel >= FIGURE_FROM) children.push(figure(staves, look, frame, view));
  const clip: ClipPrimitive = {
    kind: 'clip',
    path: outlinePath(view, staves.outline, staves.holes),
    evenOdd: true,
    children,
  };
  return [clip];
}

function grainOnly(staves: Staves, view: View): PathPrimitive {
  const rings = [staves.outline, ...(staves.holes ?? [])].map((ring) => ring.map((p) => project(view, p)));
  return grainLines(rings, Math.atan2(-staves.along[1], staves.along[0]), 'ink', view);
}

interface Strip {
  readonly index: number;
  readonly tone: number;
  readonly from: number;
  readonly to: number;
}

/** The piece seen along its grain: u along it, v across it, inches from the staves' origin. */
class GrainFrame {
  readonly minU: number;
  readonly maxU: number;
  private readonly minV: number;
  private readonly maxV: number;
  private readonly across: Point;

  constructor(
    private readonly staves: Staves,
    private readonly view: View,
  ) {
    this.across = leftNormal(staves.along);
    const from = staves.outline.map((p) => subtract(p, staves.origin));
    const us = from.map((p) => dot(p, staves.along));
    const vs = from.map((p) => dot(p, this.across));
    [this.minU, this.maxU] = [Math.min(...us), Math.max(...us)];
    [this.minV, this.maxV] = [Math.min(...vs), Math.max(...vs)];
  }

  strips(): Strip[] {
    const { width, seed } = this.staves;
    const first = Math.floor(this.minV / width + 1e-6);
    const last = Math.ceil(this.maxV / width - 1e-6);
    const strips: Strip[] = [];
    let tone = Math.floor(chance(seed, 0, 0) * TONES);
    // Counted from the first strip of the origin, so that no tone changes when the piece grows.
    for (let i = 0; i < first; i++) tone = nextTone(tone, seed, i);
    for (let index = first; index < last; index++) {
      strips.push({ index, tone, from: index * width, to: (index + 1) * width });
      tone = nextTone(tone, seed, index);
    }
    return strips;
  }

  box(from: number, to: number): Path {
    return pathThrough([this.at(this.minU, from), this.at(this.maxU, from), this.at(this.maxU, to), this.at(this.minU, to)], true); // prettier-ignore
  }

  line(v: number): Path {
    return pathThrough([this.at(this.minU, v), this.at(this.maxU, v)], false);
  }

  at(u: number, v: number): Point {
    const { origin, along } = this.staves;
    return project(this.view, [
      origin[0] + along[0] * u + this.across[0] * v,
      origin[1] + along[1] * u + this.across[1] * v,
    ]);
  }
}

/** One to four tones on: never the same twice in a row. */
export function nextTone(tone: number, seed: string, index: number): number {
  return (tone + 1 + Math.floor(chance(seed, index, 1) * (TONES - 1))) % TONES;
}

function figure(staves: Staves, look: WoodLook, frame: GrainFrame, view: View): PathPrimitive {
  const path: Segment[] = [];
  for (const strip of frame.strips()) {
    for (let cell = Math.floor(frame.minU / CELL); cell * CELL < frame.maxU; cell++) {
      const seed = `${staves.seed}/${strip.index}`;
      if (chance(seed, cell, 2) > look.density) continue;
      const u = (cell + chance(seed, cell, 3)) * CELL;
      const v = strip.from + (0.2 + 0.6 * chance(seed, cell, 4)) * staves.width;
      for (const stroke of look.figure(chance(seed, cell, 5))) {
        path.push(...pathThrough(stroke.map(([du, dv]) => frame.at(u + du, v + dv)), false)); // prettier-ignore
      }
    }
  }
  const width = look.figureWidth * view.pixel;
  return { kind: 'path', path, line: { paint: { hex: look.line }, width, round: look.roundFigure } };
}
