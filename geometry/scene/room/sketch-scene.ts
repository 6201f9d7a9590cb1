import { wallLabel, type Layout } from '../../core/layout';
import type { Point } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import { add, distance, leftNormal, rightNormal, scale, subtract, unit } from '../../core/vector';
import type { DrawItem, Scene } from '../display-list';
import { readable, text } from './scene-styles';

/** Walls as they are drawn by hand, before or under the tape. Inches, room axes. */
export interface SketchWalls {
  readonly walls: readonly string[];
  readonly points: readonly Point[];
  readonly closed: boolean;
}

export interface SketchSceneOptions {
  /** `point 2` or `wall A`. */
  readonly selected?: string | null;
  /** The first corner of a room that has no walls yet. */
  readonly first?: Point | null;
}

/** An empty page to draw on, inches: a roomy kitchen. */
const PAGE = { minX: -90, minY: -80, maxX: 90, maxY: 80 };

/**
 * The walls under the pencil: lines with letters, the rough length of every wall, what each corner is meant to be, and a
 * handle at every corner.
 */
export function sketchScene(sketch: SketchWalls, layout: Layout, options: SketchSceneOptions = {}): Scene {
  const { points, closed } = sketch;
  const first: DrawItem[] = options.first ? [handle(options.first, 0, options)] : [];
  const floor: DrawItem[] =
    points.length > 2 ? [{ layer: 'frame', id: 'floor', kind: 'polygon', outline: points, fill: 'card' }] : [];
  const walls = sketch.walls.flatMap((id, i) => {
    const from = points[i];
    const to = points[closed ? (i + 1) % points.length : i + 1];
    return from && to ? wallItems(id, i, from, to, layout, options) : [];
  });
  const box = points.length > 0 ? boundingBox(points) : PAGE;
  return {
    bounds: box.maxX - box.minX < 24 && box.maxY - box.minY < 24 ? PAGE : box,
    items: [...floor, ...walls, ...angles(sketch), ...points.map((at, i) => handle(at, i, options)), ...first],
    title: 'Walls as drawn',
    alt: `${sketch.walls.length} walls drawn by hand.`,
  };
}

function wallItems(
  id: string,
  index: number,
  from: Point,
  to: Point,
  layout: Layout,
  options: SketchSceneOptions,
): DrawItem[] {
  const name = `wall ${id}`;
  const selected = options.selected === name;
  const direction = unit(from, to);
  const tag = { layer: 'walls', id: name } as const;
  const line: DrawItem = { ...tag, kind: 'line', from, to, stroke: { ink: selected ? 'chalk' : 'ink', width: 5 } };
  if (!direction) return [line];
  const inward = rightNormal(direction);
  const middle = scale(add(from, to), 0.5);
  const { turn } = readable(direction);
  const taped = layout.room.walls.find((wall) => wall.id === id)?.length[0];
  const out = leftNormal(direction);
  return [
    line,
    {
      ...tag,
      kind: 'text',
      at: middle,
      shift: [inward[0] * 26, inward[1] * 26],
      text: wallLabel(index),
      style: selected ? { ...text.wall, ink: 'chalk' } : text.wall,
      anchor: 'middle',
      middle: true,
    },
    {
      ...tag,
      kind: 'length',
      at: middle,
      shift: [out[0] * 22, out[1] * 22],
      inches: taped?.value ?? Math.round(distance(from, to)),
      step: layout.step,
      unit: true,
      style: taped ? text.number : text.fixture,
      anchor: 'middle',
      middle: true,
      turn,
    },
  ];
}

/** What each corner is drawn at, where it is not the usual 90. */
function angles({ points, closed }: SketchWalls): DrawItem[] {
  return points.flatMap((at, i): DrawItem[] => {
    const before = points[i - 1] ?? (closed ? points.at(-1) : undefined);
    const after = points[i + 1] ?? (closed ? points[0] : undefined);
    if (!before || !after) return [];
    const into = subtract(at, before);
    const out = subtract(after, at);
    const turn = Math.atan2(out[1], out[0]) - Math.atan2(into[1], into[0]);
    const interior = Math.round((((180 + (turn * 180) / Math.PI) % 360) + 360) % 360);
    if (Math.abs(interior - 90) < 1) return [];
    const way = unit([0, 0], add(unit(at, before) ?? [0, 0], unit(at, after) ?? [0, 0]));
    const inside: Point = way ? (interior > 180 ? scale(way, -1) : way) : [0, -1];
    return [
      {
        layer: 'readings',
        kind: 'text',
        at,
        shift: [inside[0] * 34, inside[1] * 34],
        text: `${interior}°`,
        style: text.fixture,
        anchor: 'middle',
        middle: true,
      },
    ];
  });
}

function handle(at: Point, index: number, { selected }: SketchSceneOptions): DrawItem {
  const on = selected === `point ${index}`;
  return { layer: 'walls', id: `point ${index}`, kind: 'mark', at, mark: on ? 'dot' : 'point', size: on ? 20 : 16, ink: on ? 'chalk' : 'ink' }; // prettier-ignore
}
