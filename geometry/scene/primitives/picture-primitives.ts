import type { DrawItem, Surface } from '../display-list';
import { outlinePath, pathThrough, project, type PathPrimitive, type Primitive, type View } from './primitive';
import { woodLook } from './wood-look';

type Boards = Extract<DrawItem, { kind: 'boards' }>;
type Facet = Extract<DrawItem, { kind: 'facet' }>;

/** Fill in full light, fill in the shade, line round it. Wood has its species' own. */
const LOOKS: Readonly<Record<Exclude<Surface, 'wood'>, readonly [lit: string, shaded: string, line: string]>> = {
  wall: ['#F4EFE3', '#E3DAC8', '#CFC4AC'],
  floor: ['#E9E2D3', '#DDD4C1', '#E9E2D3'],
  cabinet: ['#E1E6EE', '#BCC5D1', '#98A3B1'],
  kick: ['#8A95A3', '#6F7A88', '#6F7A88'],
  steel: ['#D4DBE1', '#A2ADB7', '#54606C'],
  basin: ['#B9C3CC', '#8F9BA6', '#54606C'],
  glass: ['#DDEBF4', '#C9DCE9', '#7A8997'],
  hob: ['#39434E', '#232B34', '#14202E'],
};

/** px */
const LINE = 1;
const WOOD_LINE = 1.4;

/** Wood seen at a slant, clipped to its outline. */
export function boardPrimitives(item: Boards, view: View): Primitive[] {
  const look = woodLook(item.species);
  const clip = outlinePath(view, item.outline, item.holes);
  const lines = item.figure.flatMap((stroke) =>
    pathThrough(
      stroke.map((p) => project(view, p)),
      false,
    ),
  );
  const inColour = view.wood === 'colour';
  const tones: PathPrimitive[] = inColour
    ? look.tones.flatMap((hex, tone): PathPrimitive[] => {
        const path = item.boards.flatMap((board) => (board.tone === tone ? outlinePath(view, board.outline) : []));
        // The line in the board's own tone closes the hair between it and its neighbour.
        return path.length > 0 ? [{ kind: 'path', path, fill: { hex }, line: { paint: { hex }, width: 0.5 } }] : [];
      })
    : item.boards.map((board) => ({
        kind: 'path',
        path: outlinePath(view, board.outline),
        line: { paint: 'ink', width: 0.4 * view.pixel },
      }));
  const figure: PathPrimitive[] =
    inColour && lines.length > 0
      ? [{ kind: 'path', path: lines, line: { paint: { hex: look.line }, width: look.figureWidth * 0.8 * view.pixel } }]
      : [];
  return [
    { kind: 'clip', path: clip, evenOdd: true, children: [...tones, ...figure] },
    { kind: 'path', path: clip, line: { paint: inColour ? { hex: look.line } : 'ink', width: WOOD_LINE * view.pixel } },
  ];
}

/** A flat side, filled as it lies to the light; on paper only its outline on white. */
export function facetPrimitives(item: Facet, view: View): Primitive[] {
  const path = outlinePath(view, item.outline, item.holes);
  const evenOdd = item.holes && item.holes.length > 0 ? { evenOdd: true } : {};
  if (view.wood === 'lines')
    return [{ kind: 'path', path, fill: 'paper', line: { paint: 'ink', width: LINE * view.pixel }, ...evenOdd }];
  const [lit, shaded, line] = item.surface === 'wood' ? woodSides(item.species ?? '') : LOOKS[item.surface];
  return [
    {
      kind: 'path',
      path,
      fill: { hex: between(shaded, lit, item.light) },
      line: { paint: { hex: line }, width: LINE * view.pixel },
      ...evenOdd,
    },
  ];
}

function woodSides(species: string): readonly [string, string, string] {
  const look = woodLook(species);
  return [look.tones[0]!, look.line, look.line];
}

function between(from: string, to: string, share: number): string {
  const k = Math.min(1, Math.max(0, share));
  const channel = (i: number) => {
    const [a, b] = [from, to].map((hex) => parseInt(hex.slice(1 + 2 * i, 3 + 2 * i), 16)) as [number, number];
    return Math.round(a + (b - a) * k)
      .toString(16)
      .padStart(2, '0');
  };
  return `#${channel(0)}${channel(1)}${channel(2)}`.toUpperCase();
}
