import type { Base } from '../../core/layout';
import type { Point, Polygon } from '../../core/point';
import { alongWall, type WallFrame } from '../../top/wall-frame';
import type { DrawItem, Ink, Stroke } from '../display-list';
import { text } from './scene-styles';
import { WALL_THICKNESS } from './wall-bodies';

const DASHED = [3, 3];
const BLOCKED = [8, 5];

/** Words for what stands along a wall; a cabinet needs none. */
const WORDS: Readonly<Record<Base['kind'], string>> = {
  cabinet: '',
  'corner base': '',
  'sink base': 'Sink',
  dishwasher: 'Dishwasher',
  range: 'Range',
  opening: 'Opening',
  window: '',
  pipe: '',
};

/** Cabinets, appliances, windows and pipes along a wall, dashed: they are there, nobody cuts them. */
export function drawBase(base: Base, wall: WallFrame, selected = false): DrawItem[] {
  const frame = new BaseFrame(base, wall);
  if (selected) return [...frame.handles(), ...drawBase(base, wall)];
  if (base.kind === 'window') return frame.window();
  if (base.kind === 'pipe') return frame.pipe();
  return [...frame.box(), ...frame.inside(), ...frame.label()];
}

class BaseFrame {
  private readonly from: number;
  private readonly to: number;
  private readonly blocked: boolean;
  private readonly tag: { readonly layer: 'bases'; readonly id: string };

  constructor(
    private readonly base: Base,
    private readonly wall: WallFrame,
  ) {
    this.from = base.from;
    this.to = alongWall(wall, base.to);
    this.blocked = base.access === 'none';
    this.tag = { layer: 'bases', id: base.id };
  }

  /** `x` along the wall from its left end, `y` into the room, inches. */
  private at(x: number, y: number): Point {
    const { start, along, inward } = this.wall;
    return [start[0] + along[0] * x + inward[0] * y, start[1] + along[1] * x + inward[1] * y];
  }

  private rect(from: number, to: number, near: number, far: number): Polygon {
    return [this.at(from, near), this.at(from, far), this.at(to, far), this.at(to, near)];
  }

  private ink(): Ink {
    return this.blocked ? 'red' : 'ink2';
  }

  box(): DrawItem[] {
    const stroke: Stroke = { ink: this.ink(), width: this.blocked ? 1.8 : 1.3, dash: this.blocked ? BLOCKED : DASHED };
    const outline = this.rect(this.from, this.to, 0, this.base.depth);
    return [{ ...this.tag, kind: 'polygon', outline, stroke }];
  }

  /** What is open for change: a chalk ground and a grip at either edge. */
  handles(): DrawItem[] {
    const depth = Math.max(this.base.depth, 2);
    const grip = (x: number): DrawItem => {
      return { ...this.tag, kind: 'mark', at: this.at(x, depth / 2), mark: 'dot', size: 16, ink: 'chalk' };
    };
    const outline = this.rect(this.from, this.to, 0, depth);
    const ground: DrawItem = { ...this.tag, kind: 'polygon', outline, fill: 'chalkT', stroke: { ink: 'chalk', width: 3 } }; // prettier-ignore
    return [ground, grip(this.from), grip(this.to)];
  }

  inside(): DrawItem[] {
    const middle = this.at((this.from + this.to) / 2, this.base.depth / 2);
    if (this.blocked) return [{ ...this.tag, kind: 'mark', at: middle, mark: 'noAccess', size: 24, ink: 'red' }];
    if (this.base.kind === 'sink base') return [this.basin()];
    if (this.base.kind === 'range') return this.burners();
    return [];
  }

  private basin(): DrawItem {
    const { depth } = this.base;
    const inset = Math.min(2.5, depth / 6);
    const outline = this.rect(this.from + inset, this.to - inset, depth * 0.22, depth * 0.82);
    return { ...this.tag, kind: 'polygon', outline, stroke: { ink: 'ink2', width: 1.3 } };
  }

  private burners(): DrawItem[] {
    const width = this.to - this.from;
    const radius = Math.min(width, this.base.depth) * 0.13;
    return [0.28, 0.72].flatMap((x) =>
      [0.28, 0.72].map((y): DrawItem => {
        const centre = this.at(this.from + x * width, y * this.base.depth);
        const circle = { centre, radius, start: 0, end: 2 * Math.PI } as const;
        return { ...this.tag, kind: 'arc', ...circle, stroke: { ink: 'ink2', width: 1.3 } };
      }),
    );
  }

  label(): DrawItem[] {
    const words = this.base.label ?? WORDS[this.base.kind];
    if (!words) return [];
    const width = Math.round((this.to - this.from) * 16) / 16;
    const at = this.at((this.from + this.to) / 2, this.base.depth);
    const shift = [this.wall.inward[0] * 44, this.wall.inward[1] * 18] as const;
    return [
      {
        ...this.tag,
        kind: 'runs',
        at,
        runs: [{ text: `${words} ` }, { inches: width, step: '1/16' }],
        style: text.fixture,
        anchor: 'middle',
        middle: true,
        shift,
      },
    ];
  }

  /** Two lines in the wall's body. */
  window(): DrawItem[] {
    const stroke: Stroke = { ink: 'ink', width: 1.6 };
    const frame = this.rect(this.from, this.to, -WALL_THICKNESS, 0);
    const glass = [this.at(this.from, -WALL_THICKNESS / 2), this.at(this.to, -WALL_THICKNESS / 2)];
    return [
      { ...this.tag, kind: 'polygon', outline: frame, fill: 'card', stroke },
      { ...this.tag, kind: 'polyline', points: glass, stroke },
    ];
  }

  pipe(): DrawItem[] {
    const radius = Math.max((this.to - this.from) / 2, 0.5);
    const centre = this.at((this.from + this.to) / 2, radius);
    return [
      { ...this.tag, kind: 'arc', centre, radius, start: 0, end: 2 * Math.PI, stroke: { ink: 'ink2', width: 1.6 } },
      { ...this.tag, kind: 'mark', at: centre, mark: 'dot', size: 5, ink: 'ink2' },
    ];
  }
}
