import type { Layout, Mark, Tie } from '../../core/layout';
import type { Point } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import { along, subtract } from '../../core/vector';
import type { Plan } from '../../plan/types';
import { solvedRoom } from '../../top/solved-room';
import { alongWall, wallFrames, type RoomWalls } from '../../top/wall-frame';
import type { DrawItem, Scene } from '../display-list';
import { drawBase } from './draw-bases';
import { drawCorner } from './draw-corners';
import { drawMisfit } from './draw-misfit';
import { drawBow, drawWallLines, drawWallReading, LARGE_BOWS, type WallState } from './draw-walls';
import { readable } from './scene-styles';
import { wallBodies } from './wall-bodies';

/** What is chosen on screen: `wall A`, `corner A-B`, `tie t1`, as readings are named. */
export interface RoomSceneOptions {
  readonly selected?: string | null;
  /** Every bow larger than life; otherwise only that of the selected wall is. */
  readonly largeBows?: boolean;
  /** A small screen: no words at what stands along the walls, bows named only on the selected wall. */
  readonly plain?: boolean;
  /** Something along a wall that is open for change, by id. */
  readonly base?: string | null;
  /** The first mark of a cross that is being chosen. */
  readonly mark?: Mark | null;
  /** A cross that is about to be taped. */
  readonly cross?: { readonly from: Mark; readonly to: Mark } | null;
  /** Readings that contradict each other, where no fit says so itself. */
  readonly wrong?: readonly string[];
}

const DASH_DOT = [9, 4, 2, 4];

/**
 * The room as it was measured: bodies and blades of its walls, bows, corner tags, ties, and what stands along the walls.
 * Room axes, inches. Empty while not even a sketch stands in for the room.
 */
export function roomScene(plan: Plan, layout: Layout, options: RoomSceneOptions = {}): Scene {
  if (!plan.room)
    return { bounds: { minX: 0, minY: 0, maxX: 1, maxY: 1 }, items: [], title: 'Room', alt: 'No walls yet.' };
  const room = new RoomDrawing(plan, plan.room, layout, options);
  return {
    bounds: room.bounds(),
    items: room.items(),
    title: 'Room',
    alt: `Plan of a room with ${plan.room.walls.length} walls.`,
  };
}

class RoomDrawing {
  private readonly walls: RoomWalls;
  private readonly retakes: ReadonlySet<string>;

  constructor(
    private readonly plan: Plan,
    private readonly fit: NonNullable<Plan['room']>,
    private readonly layout: Layout,
    private readonly options: RoomSceneOptions,
  ) {
    this.walls = wallFrames(solvedRoom(fit, layout.room));
    // Where several readings explain the disagreement as well, nobody is accused on the drawing.
    const named = fit.suspects.filter((s) => s.orElse.length === 0).map((s) => s.observation);
    const wrong = options.wrong ?? [];
    this.retakes = new Set([...named, ...(fit.checkCorner ? [fit.checkCorner] : []), ...wrong]);
  }

  bounds(): Scene['bounds'] {
    return boundingBox([...this.fit.points, ...wallBodies(this.walls).flatMap(({ outline }) => outline)]);
  }

  items(): DrawItem[] {
    return [
      ...this.floor(),
      ...drawWallLines(this.walls, (id) => this.stateOf(id)),
      ...this.bases(),
      ...this.ties(),
      ...this.openEnds(),
      ...this.readings(),
      ...this.corners(),
      ...this.misfits(),
      ...this.notes(),
      ...this.chosenMark(),
      ...this.pendingCross(),
    ];
  }

  private bowScale(wall: string): number {
    return this.options.largeBows || this.options.selected === `wall ${wall}` ? LARGE_BOWS : 1;
  }

  private stateOf(id: string): WallState {
    return {
      selected: this.options.selected === `wall ${id}`,
      retake: this.retakes.has(`wall ${id}`),
      taped: !this.plan.untaped.includes(id),
    };
  }

  private floor(): DrawItem[] {
    const { points, closed } = this.fit;
    const floor: DrawItem[] =
      points.length > 2 ? [{ layer: 'frame', id: 'floor', kind: 'polygon', outline: points, fill: 'card' }] : [];
    const closing = closed || points.length < 3 || this.layout.room.ties.some((tie) => this.joinsEnds(tie));
    if (closing) return floor;
    const open: DrawItem = {
      layer: 'frame',
      kind: 'line',
      from: points[0]!,
      to: points.at(-1)!,
      stroke: { ink: 'edge', width: 2, dash: [8, 7] },
    };
    return [...floor, open];
  }

  private bases(): DrawItem[] {
    return this.layout.bases.flatMap((base) => {
      const wall = this.walls.byId.get(base.wall);
      return wall
        ? drawBase(base, wall, base.id === this.options.base).filter(
            (item) => !this.options.plain || item.kind !== 'runs',
          )
        : [];
    });
  }

  /** How far the suspected wall was taped past where it ends, or short of it. */
  private misfits(): DrawItem[] {
    return this.fit.suspects.flatMap((suspect) => {
      const wall = suspect.orElse.length === 0 && this.walls.byId.get(suspect.observation.replace(/^wall /, ''));
      const taped = wall && this.fit.walls.find((w) => w.id === wall.id)?.taped;
      if (!wall || taped === null || taped === undefined || taped === false) return [];
      return drawMisfit(wall, taped - suspect.shouldRead, this.layout.step);
    });
  }

  private pendingCross(): DrawItem[] {
    const { cross } = this.options;
    const from = cross && this.markAt(cross.from);
    const to = cross && this.markAt(cross.to);
    if (!from || !to) return [];
    const ends = [from, to].map((at): DrawItem => {
      return { layer: 'readings', kind: 'mark', at, mark: 'dot', size: 16, ink: 'chalk' };
    });
    const { turn, flipped } = readable(subtract(to, from));
    const at: Point = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2];
    return [
      { layer: 'readings', kind: 'line', from, to, stroke: { ink: 'chalk', width: 3, dash: DASH_DOT } },
      ...ends,
      {
        layer: 'readings',
        kind: 'blade',
        at,
        inches: null,
        step: this.layout.step,
        turn,
        state: 'empty',
        ...(flipped ? { hookRight: true } : {}),
      },
    ];
  }

  private chosenMark(): DrawItem[] {
    const at = this.options.mark ? this.markAt(this.options.mark) : null;
    return at ? [{ layer: 'readings', kind: 'mark', at, mark: 'dot', size: 18, ink: 'chalk' }] : [];
  }

  /** A tie that joins the room's two open ends has its blade always; a cross only when it is chosen. */
  private ties(): DrawItem[] {
    return this.layout.room.ties.flatMap((tie): DrawItem[] => {
      const [from, to] = [this.markAt(tie.from), this.markAt(tie.to)];
      if (!from || !to) return [];
      const name = `tie ${tie.id}`;
      const retake = this.retakes.has(name);
      const selected = this.options.selected === name;
      const closing = this.joinsEnds(tie);
      const stroke = { ink: retake ? 'red' : 'chalk', width: closing || selected ? 1.8 : 1.2, dash: DASH_DOT } as const;
      const line: DrawItem = { layer: 'readings', id: name, kind: 'line', from, to, stroke };
      if (!closing && !selected && !retake) return [line];
      const { turn, flipped } = readable(subtract(to, from));
      const state = retake ? 'retake' : selected ? 'selected' : 'set';
      const blade: DrawItem = {
        layer: 'readings',
        id: name,
        kind: 'blade',
        at: [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2],
        inches: tie.length.value,
        step: this.layout.step,
        turn,
        state,
        ...(flipped ? { hookRight: true } : {}),
      };
      return [line, blade];
    });
  }

  private markAt({ wall: id, at }: Mark): Point | null {
    const wall = this.walls.byId.get(id);
    return wall ? along(wall.start, wall.along, alongWall(wall, at)) : null;
  }

  private joinsEnds({ from, to }: Tie): boolean {
    if (this.fit.closed) return false;
    const first = this.fit.walls[0]?.id;
    const last = this.fit.walls.at(-1)?.id;
    const isStart = (mark: Mark) => mark.wall === first && mark.at === 0;
    const isEnd = (mark: Mark) => mark.wall === last && mark.at === 'end';
    return (isStart(from) && isEnd(to)) || (isStart(to) && isEnd(from));
  }

  private openEnds(): DrawItem[] {
    if (this.fit.closed) return [];
    return [this.fit.points[0]!, this.fit.points.at(-1)!].map((at) => ({
      layer: 'walls',
      kind: 'mark',
      at,
      mark: 'point',
      size: 12,
      ink: 'ink',
    }));
  }

  private readings(): DrawItem[] {
    return this.layout.room.walls.flatMap((readings) => {
      const wall = this.walls.byId.get(readings.id);
      if (!wall) return [];
      const standing = this.layout.bases.filter((base) => base.wall === wall.id && base.kind !== 'window');
      const free = (at: number) => !standing.some((b) => at > b.from - 3 && at < alongWall(wall, b.to) + 3);
      return [
        ...drawBow(wall, this.layout.step, free, this.bowScale(wall.id)).filter(
          (item) => item.kind !== 'runs' || !this.options.plain || this.stateOf(wall.id).selected,
        ),
        ...drawWallReading(wall, readings, this.stateOf(wall.id), this.layout.step, free),
      ];
    });
  }

  private corners(): DrawItem[] {
    return this.fit.corners.flatMap((fit) => {
      const [left, right] = fit.between.map((id) => this.walls.byId.get(id));
      if (!left || !right) return [];
      const drawn = this.layout.room.corners.find((c) => c.between.join() === fit.between.join());
      return [drawCorner(left, right, fit, drawn, this.retakes.has(`corner ${fit.between.join('-')}`))];
    });
  }

  private notes(): DrawItem[] {
    return this.layout.notes.flatMap((note, i): DrawItem[] => {
      const wall = note.wall === undefined ? undefined : this.walls.byId.get(note.wall);
      const at = note.at ?? (wall ? along(along(wall.start, wall.along, wall.length / 2), wall.inward, 12) : null);
      if (!at) return [];
      const mark = { kind: 'mark', mark: 'square', size: 24, ink: 'ink', text: String(i + 1) } as const;
      return [{ layer: 'notes', id: note.id, at, ...mark }];
    });
  }
}
