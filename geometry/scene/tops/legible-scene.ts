import type { Point, Polygon } from '../../core/point';
import { contains } from '../../core/polygon';
import { along, distance, dot, leftNormal, unit } from '../../core/vector';
import type { DrawItem, Scene, Shift } from '../display-list';
import { WALL_THICKNESS } from '../room/wall-bodies';
import { bladeSize, boxOf, cornersOf, overlap, toPx, wordsSize, type LabelBox } from './label-box';
import { roomAt } from './letter-place';

type Of<K extends DrawItem['kind']> = Extract<DrawItem, { kind: K }>;

/** An item put somewhere, and the room it takes there. */
interface Placed<T extends DrawItem = DrawItem> {
  readonly item: T;
  readonly box: LabelBox;
}

/** Shares of a piece's width, and of the room round its place, that a letter may take; the least a letter can be, px. */
const LETTER_SHARE = 0.62;
const ROOM_SHARE = 0.9;
const LEAST_LETTER = 20;
/** px between a disc and an arrow beside it. */
const BESIDE = 8;
const ARROW_HEIGHT = 14;
const LEAST_ARROW = 30;
/** px that a dimension stands off its edge, inside first; a number has to be shorter than its line. */
const OFFSETS = [17, -19, 40, -42, 62];
/** How far a joint's blade may go out, times its usual distance. */
const LEADERS = [1, 1.7, 2.5, 3.4];
const SEAM_WIDTH = 8;
/** px further out that a seam's blade may go. */
const FURTHER = [0, 44, 88, 132];

/**
 * The same drawing with its words, sizes, letters and arrows placed for one zoom: none lies on another. What finds no
 * free place is left out; the lists beside the drawing say it all.
 *
 * @param pxPerInch - screen px for an inch of the drawing
 */
export function legibleScene(scene: Scene, pxPerInch: number): Scene {
  return { ...scene, items: new Placer(scene.items, pxPerInch).place() };
}

class Placer {
  private readonly taken: LabelBox[] = [];
  /** What became of items that were moved or left out. */
  private readonly changed = new Map<DrawItem, DrawItem | null>();
  private readonly outlines = new Map<string, Polygon>();

  constructor(
    private readonly items: readonly DrawItem[],
    private readonly k: number,
  ) {
    for (const item of items) {
      if (item.kind === 'polygon' && item.layer === 'tops' && item.id) this.outlines.set(item.id, item.outline);
    }
  }

  place(): DrawItem[] {
    this.takeSeams();
    this.letters();
    this.seamWords();
    this.each(
      (item) => item.kind === 'text' && item.layer === 'walls',
      (item) => this.wallLetter(item as Of<'text'>),
    );
    this.each(
      (item) => item.kind === 'mark' && item.mark === 'grainArrow',
      (item) => this.arrow(item as Of<'mark'>),
    );
    this.joints();
    const dimensions = this.items.filter((item): item is Of<'dimension'> => item.kind === 'dimension');
    for (const item of [...dimensions].sort((a, b) => b.inches - a.inches)) this.dimension(item);
    this.each(
      (item) => item.kind === 'runs' && item.layer === 'bases',
      (item) => this.baseWords(item as Of<'runs'>),
    );
    return this.items.flatMap((item) => {
      const now = this.changed.get(item);
      return now === undefined ? [item] : now === null ? [] : [now];
    });
  }

  private each(which: (item: DrawItem) => boolean, act: (item: DrawItem) => void): void {
    for (const item of this.items) if (which(item)) act(item);
  }

  private free(box: LabelBox): boolean {
    return !this.taken.some((other) => overlap(box, other));
  }

  /** Takes the first place that is free; leaves the item out when none is. */
  private choose(item: DrawItem, places: readonly Placed[]): void {
    const found = places.find(({ box }) => this.free(box));
    this.changed.set(item, found?.item ?? null);
    if (found) this.taken.push(found.box);
  }

  /** Handles and lines of seams stay where they are: fingers look for them there. */
  private takeSeams(): void {
    for (const item of this.items) {
      if (item.layer !== 'seams') continue;
      if (item.kind === 'line') this.taken.push(this.lineBox(item.from, item.to));
      if (item.kind === 'mark') this.taken.push(this.square(item.at, item.size, item.shift));
    }
  }

  /** A seam's blade and its words go out from their handle together until they are free; the words are given up first. */
  private seamWords(): void {
    const blades = this.items.filter((item): item is Of<'blade'> => item.kind === 'blade' && item.layer === 'seams');
    for (const blade of blades) {
      const words = this.items.find(
        (item): item is Of<'text'> => item.kind === 'text' && item.layer === 'seams' && item.id === blade.id,
      );
      const [x, y] = blade.shift ?? [0, 1];
      const reach = Math.hypot(x, y) || 1;
      const moved = FURTHER.map((px) => {
        const by = (shift: Shift = [0, 0]): Shift => [shift[0] + (x / reach) * px, shift[1] + (y / reach) * px];
        return { blade: { ...blade, shift: by(blade.shift) }, words: words && { ...words, shift: by(words.shift) } };
      });
      const whole = moved.find((one) => this.free(this.bladeBox(one.blade)) && (!one.words || this.free(this.textBox(one.words)))); // prettier-ignore
      const found = whole ?? moved.find((one) => this.free(this.bladeBox(one.blade)));
      this.changed.set(blade, found?.blade ?? null);
      if (found) this.taken.push(this.bladeBox(found.blade));
      if (!words) continue;
      this.changed.set(words, whole?.words ?? null);
      if (whole?.words) this.taken.push(this.textBox(whole.words));
    }
  }

  private square(at: Point, size: number, shift?: Shift): LabelBox {
    return { centre: toPx(at, this.k, shift), width: size, height: size, turn: 0 };
  }

  private lineBox(from: Point, to: Point): LabelBox {
    const [a, b] = [toPx(from, this.k), toPx(to, this.k)];
    const turn = Math.atan2(b[1] - a[1], b[0] - a[0]);
    return { centre: [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2], width: distance(a, b), height: SEAM_WIDTH, turn };
  }

  private bladeBox(blade: Of<'blade'>): LabelBox {
    return { centre: toPx(blade.at, this.k, blade.shift), turn: blade.turn, ...bladeSize(blade.inches, blade.step) };
  }

  private textBox(item: Of<'text'>): LabelBox {
    return {
      centre: toPx(item.at, this.k, item.shift),
      turn: item.turn ?? 0,
      ...wordsSize([{ text: item.text }], item.style),
    };
  }

  /** A letter's disc is never wider than its piece allows where it stands. */
  private letters(): void {
    const holes = this.items.flatMap((item) =>
      item.kind === 'polygon' && item.layer === 'cutouts' ? [item.outline] : [],
    );
    for (const item of this.items) {
      if (item.kind !== 'mark' || item.mark !== 'disc' || item.layer !== 'letters') continue;
      const outline = item.id ? this.outlines.get(item.id) : undefined;
      const across = outline ? leastWidth(outline) * LETTER_SHARE : Infinity;
      const around = outline ? roomAt(item.at, outline, holes) * 2 * ROOM_SHARE : Infinity;
      const size = Math.max(Math.min(item.size, Math.min(across, around) * this.k), LEAST_LETTER);
      if (size !== item.size) this.changed.set(item, { ...item, size });
      this.taken.push(this.square(item.at, size, item.shift));
    }
  }

  private wallLetter(item: Of<'text'>): void {
    const body = this.items.find(
      (other) => other.kind === 'polygon' && other.layer === 'walls' && other.id === item.id,
    );
    const [a, b] = body?.kind === 'polygon' ? body.outline : [];
    const way = (a && b && unit(a, b)) ?? [1, 0];
    // Out of the room, where the wall is drawn too thin to hold it.
    const thick = WALL_THICKNESS * this.k;
    const { height } = this.textBox(item);
    const out = thick < height ? (thick + height) / 2 : 0;
    const outward = leftNormal(way);
    const places = [0, 30, -30, 60, -60].map((px): Placed => {
      const shift: Shift = [way[0] * px + outward[0] * out, way[1] * px + outward[1] * out];
      const moved: Of<'text'> = px === 0 && out === 0 ? item : { ...item, shift };
      return { item: moved, box: this.textBox(moved) };
    });
    this.choose(item, places);
  }

  /** On the piece: beside the letter towards the back, towards the front, then along the grain; smaller where it must be. */
  private arrow(item: Of<'mark'>): void {
    const outline = item.id ? this.outlines.get(item.id) : undefined;
    const disc = this.items.find((o): o is Of<'mark'> => o.kind === 'mark' && o.mark === 'disc' && o.id === item.id);
    if (!outline || !disc) return;
    const shown = this.changed.get(disc);
    const half = (shown?.kind === 'mark' ? shown.size : disc.size) / 2;
    const turn = item.turn ?? 0;
    const grain: Point = [Math.cos(turn), Math.sin(turn)];
    const across = leftNormal(grain);
    const onPx = outline.map((p) => toPx(p, this.k));
    const places = [item.size, LEAST_ARROW].flatMap((size) => {
      const off = half + BESIDE + 4;
      const end = half + BESIDE + size / 2;
      const shifts: Shift[] = [
        [across[0] * off, across[1] * off],
        [-across[0] * off, -across[1] * off],
        [grain[0] * end, grain[1] * end],
        [-grain[0] * end, -grain[1] * end],
      ];
      return shifts.map((shift): Placed => {
        const centre = toPx(item.at, this.k, shift);
        return { item: { ...item, size, shift }, box: { centre, width: size, height: ARROW_HEIGHT, turn } };
      });
    });
    const holes = this.items.flatMap((o) =>
      o.kind === 'polygon' && o.layer === 'cutouts' ? [boxOf(o.outline, this.k)] : [],
    );
    const fits = ({ box }: Placed) =>
      cornersOf(box).every((p) => contains(onPx, p)) && !holes.some((hole) => overlap(box, hole));
    this.choose(item, places.filter(fits)); // prettier-ignore
  }

  /** A joint's leader, dot, blade and words go out together until they are free. */
  private joints(): void {
    for (const blade of this.items) {
      if (blade.kind !== 'blade' || blade.layer !== 'sizes') continue;
      const group = this.items.filter((item) => item.layer === 'sizes' && item.id === blade.id && item !== blade);
      const leader = group.find((item): item is Of<'line'> => item.kind === 'line');
      const words = group.find((item): item is Of<'text'> => item.kind === 'text');
      if (!leader) continue;
      const dir = unit(leader.from, leader.to) ?? [0, -1];
      const length = distance(leader.from, leader.to);
      const found = LEADERS.map((times) => {
        const at = along(leader.from, dir, length * times);
        const moved = [{ ...blade, at }, { ...leader, to: at }, ...(words ? [{ ...words, at }] : [])] as const;
        const boxes = [this.bladeBox({ ...blade, at }), ...(words ? [this.textBox({ ...words, at })] : [])];
        return { moved, boxes };
      }).find(({ boxes }) => boxes.every((box) => this.free(box)));
      for (const item of [blade, leader, ...(words ? [words] : [])]) {
        this.changed.set(item, found?.moved.find((moved) => moved.kind === item.kind) ?? null);
      }
      if (!found) for (const item of group) this.changed.set(item, null);
      this.taken.push(...(found?.boxes ?? []));
    }
  }

  private dimension(item: Of<'dimension'>): void {
    const span = distance(item.from, item.to) * this.k;
    const size = wordsSize([{ inches: item.inches, step: item.step }], item.style);
    if (size.width > span) return void this.changed.set(item, null);
    const dir = unit(item.from, item.to);
    if (!dir) return;
    const normal = leftNormal(dir);
    const middle: Point = [(item.from[0] + item.to[0]) / 2, (item.from[1] + item.to[1]) / 2];
    const turn = Math.atan2(dir[1], dir[0]);
    const side = Math.sign(item.offset) || 1;
    const places = OFFSETS.map((off): Placed => {
      const offset = off * side;
      const centre = toPx(middle, this.k, [normal[0] * offset, normal[1] * offset]);
      return { item: { ...item, offset }, box: { centre, turn, ...size } };
    });
    this.choose(item, places);
  }

  /** Inside what it names where there is room, else before it. */
  private baseWords(item: Of<'runs'>): void {
    const box = this.items.find((o) => o.kind === 'polygon' && o.layer === 'bases' && o.id === item.id);
    const size = wordsSize(item.runs, item.style);
    const before: Placed = { item, box: { centre: toPx(item.at, this.k, item.shift), turn: 0, ...size } };
    if (box?.kind !== 'polygon') return this.choose(item, [before]);
    const inside = boxOf(box.outline, this.k);
    const at: Point = [inside.centre[0] / this.k, inside.centre[1] / this.k];
    const { shift: _, ...plain } = item;
    const within: Placed = { item: { ...plain, at, ground: 'paper' }, box: { ...inside, ...size } };
    this.choose(item, size.width < inside.width ? [within, before] : [before]);
  }
}

/** The smallest width of an outline, square to one of its edges, inches. */
function leastWidth(outline: Polygon): number {
  let least = Infinity;
  outline.forEach((a, i) => {
    const dir = unit(a, outline[(i + 1) % outline.length]!);
    if (!dir) return;
    const across = outline.map((p) => dot(leftNormal(dir), p));
    least = Math.min(least, Math.max(...across) - Math.min(...across));
  });
  return Number.isFinite(least) ? least : 0;
}
