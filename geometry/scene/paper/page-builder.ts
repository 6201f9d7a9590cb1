import type { Point } from '../../core/point';
import type { DrawItem, Ink, Layer, Scene, Stroke, TextPlace, TextRun, TextStyle } from '../display-list';
import { layoutRuns } from '../run-layout';
import { textWidth } from '../text-width';

/** px on paper. */
export const PX_PER_INCH = 96;
/** px; no text on paper is smaller. */
export const SMALLEST = 14;

export interface Place {
  readonly layer?: Layer;
  readonly id?: string;
}

type TextOptions = Place &
  Partial<Pick<TextPlace, 'anchor' | 'middle' | 'turn' | 'ground' | 'frame'>> & { readonly hollow?: boolean };

export const styles = {
  title: { face: 'label', weight: 'extrabold', size: 34, ink: 'ink' },
  heading: { face: 'label', weight: 'bold', size: 20, ink: 'ink' },
  label: { face: 'label', weight: 'semibold', size: 17, ink: 'ink' },
  body: { face: 'body', weight: 'regular', size: 16, ink: 'ink' },
  strong: { face: 'body', weight: 'bold', size: 16, ink: 'ink' },
  number: { face: 'body', weight: 'bold', size: 18, ink: 'ink' },
  mark: { face: 'body', weight: 'bold', size: 22, ink: 'ink' },
} as const satisfies Readonly<Record<string, TextStyle>>;

/** Lays out one page in px from its top left corner; what comes out is in inches, y up. */
export class PageBuilder {
  readonly items: DrawItem[] = [];
  /** px */
  readonly width: number;
  readonly height: number;

  constructor(private readonly paper: { readonly width: number; readonly height: number }) {
    this.width = paper.width * PX_PER_INCH;
    this.height = paper.height * PX_PER_INCH;
  }

  at(x: number, y: number): Point {
    return [x / PX_PER_INCH, this.paper.height - y / PX_PER_INCH];
  }

  /** One line of text, `y` at its baseline. */
  text(x: number, y: number, text: string, style: TextStyle, options: TextOptions = {}): void {
    const { layer = 'text', anchor = 'start', ...rest } = options;
    this.items.push({ kind: 'text', layer, at: this.at(x, y), text, style, anchor, ...rest });
  }

  /**
   * Text and lengths, wrapped.
   *
   * @returns px from the first baseline to the bottom of the last line
   */
  runs(
    x: number,
    y: number,
    runs: readonly TextRun[],
    style: TextStyle,
    wrap: number,
    options: TextOptions = {},
  ): number {
    const { layer = 'text', anchor = 'start', ...rest } = options;
    this.items.push({ kind: 'runs', layer, at: this.at(x, y), runs, style, wrap, anchor, ...rest });
    const block = layoutRuns(runs, style, wrap, SMALLEST);
    return block.drop + block.descent;
  }

  line(x1: number, y1: number, x2: number, y2: number, width: number, place: Place & Pick<Stroke, 'dash'> = {}): void {
    const { layer = 'frame', dash, ...rest } = place;
    const stroke: Stroke = { ink: 'ink', width, ...(dash ? { dash } : {}) };
    this.items.push({ kind: 'line', layer, from: this.at(x1, y1), to: this.at(x2, y2), stroke, ...rest });
  }

  box(x: number, y: number, width: number, height: number, line: number, fill?: Ink, place: Place = {}): void {
    const { layer = 'frame', ...rest } = place;
    this.items.push({
      kind: 'polygon',
      layer,
      outline: [this.at(x, y + height), this.at(x + width, y + height), this.at(x + width, y), this.at(x, y)],
      ...(fill ? { fill } : {}),
      stroke: { ink: 'ink', width: line },
      ...rest,
    });
  }

  /** A black box without a line. */
  fill(x: number, y: number, width: number, height: number, place: Place = {}): void {
    const { layer = 'frame', ...rest } = place;
    const [left, right, top, low] = [x, x + width, y, y + height];
    const outline = [this.at(left, low), this.at(right, low), this.at(right, top), this.at(left, top)];
    this.items.push({ kind: 'polygon', layer, outline, fill: 'ink', ...rest });
  }

  add(...items: readonly DrawItem[]): void {
    this.items.push(...items);
  }

  scene(title: string, alt: string): Scene {
    const { width, height } = this.paper;
    return {
      bounds: { minX: 0, minY: 0, maxX: width, maxY: height },
      items: this.items,
      title,
      alt,
      paper: this.paper,
    };
  }
}

/** Height of wrapped runs from the top of the first capitals to the bottom of the last line, and what is above the baseline. */
export function runsHeight(
  runs: readonly TextRun[],
  style: TextStyle,
  wrap: number,
): { ascent: number; height: number } {
  const block = layoutRuns(runs, style, wrap, SMALLEST);
  return { ascent: block.ascent, height: block.ascent + block.drop + block.descent };
}

/**
 * Makes a line fit: smaller down to `least`, then cut off with an ellipsis.
 *
 * @param room - px
 */
export function fitText(
  text: string,
  style: TextStyle,
  room: number,
  least: number = SMALLEST,
): { readonly text: string; readonly style: TextStyle } {
  const width = textWidth(text, style);
  const size = Math.max(least, Math.min(style.size, (style.size * room) / width));
  const fitted = { ...style, size };
  if (textWidth(text, fitted) <= room + 0.5) return { text, style: fitted };
  let kept = text;
  while (kept.length > 1 && textWidth(`${kept}…`, fitted) > room) kept = kept.slice(0, -1);
  return { text: `${kept.trimEnd()}…`, style: fitted };
}
