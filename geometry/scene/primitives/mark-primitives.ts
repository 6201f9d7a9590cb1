import type { Point } from '../../core/point';
import type { DrawItem, Ink, TextStyle } from '../display-list';
import { ICONS, type IconName } from './icons';
import {
  boxPath,
  circlePath,
  pathThrough,
  project,
  turned,
  type Line,
  type Path,
  type Primitive,
  type View,
} from './primitive';
import { textPrimitives } from './text-primitives';

type Mark = Extract<DrawItem, { kind: 'mark' }>;

/** Share of a disc's width that its letter is high in type. */
const LETTER = 0.72;
const NUMBER = 0.66;
/** px */
const LEAST_LETTER = 14;

/** A sign of fixed size: letter discs, cut numbers, triangles, arrows, tick boxes. */
export function markPrimitives(mark: Mark, view: View): Primitive[] {
  const pen = new MarkPen(mark, view);
  switch (mark.mark) {
    case 'disc':
      return [...pen.shape(pen.circle(0.5), 'card'), ...pen.letter(LETTER, mark.ink)];
    case 'numbered':
      return [...pen.shape(pen.circle(0.5), 'card'), ...pen.letter(NUMBER, mark.ink)];
    case 'square':
      return [
        { kind: 'path', path: pen.box(1), fill: mark.ink, line: pen.line(0.03, 'card') },
        ...pen.letter(LETTER, 'card'),
      ];
    case 'dot':
      return [{ kind: 'path', path: pen.circle(0.5), fill: mark.ink }];
    case 'point':
      return pen.shape(pen.circle(0.5), 'card');
    case 'tickBox':
      return pen.shape(pen.box(1), 'card');
    case 'longPoint':
      return [{ kind: 'path', path: pen.triangle(), fill: mark.ink }];
    case 'shortPoint':
      return [{ kind: 'path', path: pen.triangle(), fill: 'card', line: pen.line(0.09) }];
    case 'warn':
      return [{ kind: 'path', path: pen.triangle(), fill: mark.ink }, ...pen.icon('exclamation', 'card')];
    case 'grainArrow':
      return pen.arrow();
    case 'handle':
      return [
        ...pen.stem(),
        { kind: 'path', path: pen.circle(0.5), fill: mark.ink, line: pen.line(0.08, 'card') },
        ...pen.icon('slide', 'onchalk', 0.6, true),
      ];
    case 'turnOver':
      return pen.icon('turnOver', mark.ink);
    case 'noAccess':
      return pen.icon('noAccess', mark.ink);
    case 'logo':
      return pen.icon('logo', mark.ink);
  }
}

/** Draws one mark about its place; measures are shares of its size. */
class MarkPen {
  private readonly at: Point;
  private readonly size: number;
  private readonly turn: number;

  constructor(
    private readonly mark: Mark,
    private readonly view: View,
  ) {
    this.at = project(view, mark.at, mark.shift);
    this.size = mark.size * view.pixel;
    this.turn = mark.turn ?? 0;
  }

  circle(radius: number): Path {
    return circlePath(this.at, radius * this.size);
  }

  box(side: number): Path {
    return boxPath(this.at, side * this.size, side * this.size, this.turn);
  }

  /** Tip up before it is turned. */
  triangle(): Path {
    return this.through([[0, -0.45], [0.5, 0.45], [-0.5, 0.45]], true); // prettier-ignore
  }

  line(share: number, paint: Ink = this.mark.ink): Line {
    return { paint, width: Math.max(share * this.size, 1.6 * this.view.pixel) };
  }

  shape(path: Path, fill: Ink): Primitive[] {
    return [{ kind: 'path', path, fill, line: this.line(0.045) }];
  }

  letter(share: number, ink: Ink): Primitive[] {
    const { mark, view } = this;
    if (!mark.text) return [];
    // Two figures or letters have to fit the same disc.
    const size = Math.max(mark.size * (mark.text.length > 1 ? share * 0.8 : share), LEAST_LETTER);
    const style: TextStyle = { face: 'label', weight: 'extrabold', size, ink };
    const place = {
      at: mark.at,
      anchor: 'middle' as const,
      middle: true,
      ...(mark.shift ? { shift: mark.shift } : {}),
    };
    return textPrimitives(place, [{ text: mark.text }], style, view);
  }

  /** From the handle along its turn, back to what it moves. */
  stem(): Primitive[] {
    if (this.mark.turn === undefined) return [];
    const path = this.through([[0, 0], [1.13, 0]], false); // prettier-ignore
    return [{ kind: 'path', path, line: { paint: this.mark.ink, width: 3.6 * this.view.pixel } }];
  }

  arrow(): Primitive[] {
    const head = Math.min(8 / this.mark.size, 0.25);
    const path = [
      ...this.through([[-0.5, 0], [0.5, 0]], false), // prettier-ignore
      ...this.through([[-0.5 + head * 1.4, -head], [-0.5, 0], [-0.5 + head * 1.4, head]], false), // prettier-ignore
      ...this.through([[0.5 - head * 1.4, -head], [0.5, 0], [0.5 - head * 1.4, head]], false), // prettier-ignore
    ];
    // Wood may be as dark as ink, so the arrow has a casing; what always stays dark is drawn on light wood alone.
    const casing = this.mark.ink !== 'tapeInk';
    return [
      ...(casing
        ? [{ kind: 'path' as const, path, line: { paint: 'card' as const, width: 4.6 * this.view.pixel } }]
        : []),
      { kind: 'path', path, line: { paint: this.mark.ink, width: 1.8 * this.view.pixel } },
    ];
  }

  /** An icon of the 24 grid, as large as `share` of the mark. */
  icon(name: IconName, ink: Ink, share = 1, across = false): Primitive[] {
    const scale = share / 24;
    // Across: its x axis lies square to the mark's turn.
    const lay = (x: number, y: number): Point => (across ? [y * scale, -x * scale] : [x * scale, y * scale]);
    return ICONS[name].map((stroke) => ({
      kind: 'path',
      path: stroke.paths.flatMap((points) =>
        this.through(
          points.map(([x, y]) => lay(x - 12, y - 12)),
          stroke.closed ?? false,
        ),
      ),
      ...(stroke.fill ? { fill: ink } : {}),
      ...(stroke.width
        ? {
            line: {
              paint: stroke.accent && ink === 'ink' ? stroke.accent : ink,
              width: stroke.width * scale * this.size,
              ...(stroke.dash ? { dash: stroke.dash.map((d) => d * scale * this.size) } : {}),
            },
          }
        : {}),
    }));
  }

  private through(points: readonly Point[], closed: boolean): Path {
    return pathThrough(
      points.map(([x, y]) => turned(this.at, [x * this.size, y * this.size], this.turn)),
      closed,
    );
  }
}
