import type { Layout, Wall } from '../../core/layout';
import type { Point } from '../../core/point';
import { along } from '../../core/vector';
import type { RoomWalls, WallFrame } from '../../top/wall-frame';
import type { DrawItem, Stroke } from '../display-list';
import { readable, text } from './scene-styles';
import { outward, wallBodies, WALL_THICKNESS } from './wall-bodies';

export interface WallState {
  readonly selected: boolean;
  /** Disagrees with the other readings. */
  readonly retake: boolean;
  readonly taped: boolean;
}

/** How many times a bow is drawn larger than it is when that is asked for: 5/16 in would not be seen. */
export const LARGE_BOWS = 12;
/** px between a wall's body and its blade, and half the blade. */
const BLADE_OFF = 28;
const LETTER_IN = 26;

/** Body and line of every wall. */
export function drawWallLines(walls: RoomWalls, stateOf: (id: string) => WallState): DrawItem[] {
  return wallBodies(walls).flatMap(({ wall, outline }): DrawItem[] => {
    const state = stateOf(wall.id);
    const tag = { layer: 'walls', id: wall.id } as const;
    const body: DrawItem = state.taped
      ? { ...tag, kind: 'polygon', outline, fill: state.selected ? 'chalkT' : 'wall' }
      : { ...tag, kind: 'polygon', outline, stroke: { ink: 'ink2', width: 1.3, dash: [9, 6] } };
    return [body, { ...tag, kind: 'line', from: wall.start, to: wall.end, stroke: wallStroke(state) }];
  });
}

function wallStroke({ selected, retake, taped }: WallState): Stroke {
  if (retake) return { ink: 'red', width: 5, dash: [12, 5] };
  if (selected) return { ink: 'chalk', width: 5 };
  return taped ? { ink: 'ink', width: 2.6 } : { ink: 'ink2', width: 2.2, dash: [9, 6] };
}

/**
 * A wall's letter inside the room and its blade outside.
 *
 * @param free - whether a place along the wall, inches, has nothing standing in front of it
 */
export function drawWallReading(
  wall: WallFrame,
  readings: Wall,
  state: WallState,
  step: Layout['step'],
  free: (at: number) => boolean,
): DrawItem[] {
  const { turn, flipped } = readable(wall.along);
  const out = outward(wall);
  const tag = { layer: 'readings', id: `wall ${wall.id}` } as const;
  const reading = readings.length[0];
  const spot = [0.3, 0.5, 0.7, 0.2, 0.85].find((share) => free(share * wall.length)) ?? 0.3;
  const blade: DrawItem = {
    ...tag,
    kind: 'blade',
    at: along(along(wall.start, wall.along, wall.length / 2), out, WALL_THICKNESS),
    shift: [out[0] * BLADE_OFF, out[1] * BLADE_OFF],
    inches: reading?.value ?? null,
    step,
    turn,
    state: bladeState(state, readings),
    ...(flipped ? { hookRight: true } : {}),
  };
  const letter: DrawItem = {
    layer: 'letters',
    id: `wall ${wall.id}`,
    kind: 'text',
    at: along(wall.start, wall.along, spot * wall.length),
    shift: [wall.inward[0] * LETTER_IN, wall.inward[1] * LETTER_IN],
    text: wall.label,
    style: state.selected ? { ...text.wall, ink: 'chalk' } : text.wall,
    anchor: 'middle',
    middle: true,
  };
  return [letter, blade];
}

function bladeState(state: WallState, readings: Wall): 'set' | 'retake' | 'empty' | 'selected' | 'twice' {
  if (!state.taped) return 'empty';
  if (state.retake) return 'retake';
  if (state.selected) return 'selected';
  return readings.length.length > 1 ? 'twice' : 'set';
}

/** The free place along the wall that is nearest to the wanted one; the wanted one where nothing is free. */
function nearestFree(wanted: number, length: number, free: (at: number) => boolean): number {
  for (let off = 0; off < length; off += 6) {
    const found = [wanted - off, wanted + off].find(
      (at) => at > 0 && at < length && [-12, 0, 12].every((d) => free(at + d)),
    );
    if (found !== undefined) return found;
  }
  return wanted;
}

/**
 * The wall's true line, dotted, with its worst place in words.
 *
 * @param larger - how many times the bow is drawn larger than it is; 1 as measured
 */
export function drawBow(
  wall: WallFrame,
  step: Layout['step'],
  free: (at: number) => boolean,
  larger: number,
): DrawItem[] {
  const worst = wall.profile.reduce<{ at: number; off: number } | null>(
    (most, station) => (Math.abs(station.off) > Math.abs(most?.off ?? 0) ? station : most),
    null,
  );
  if (!worst) return [];
  const place = (at: number, off: number): Point =>
    along(along(wall.start, wall.along, at), wall.inward, -off * larger);
  const tag = { layer: 'readings', id: `bow ${wall.id}` } as const;
  const stations = [...wall.profile].sort((a, b) => a.at - b.at);
  // Words lie level: beside an upright wall they need their own half length more.
  const inward = (worst.off < 0 ? 34 : 24) + 44 * Math.abs(wall.inward[0]);
  return [
    {
      ...tag,
      kind: 'polyline',
      points: stations.map(({ at, off }) => place(at, off)),
      stroke: { ink: 'red', width: 2.4, dash: [2.4, 4] },
    },
    {
      ...tag,
      kind: 'runs',
      at: place(nearestFree(worst.at, wall.length, free), worst.off),
      shift: [wall.inward[0] * inward, wall.inward[1] * inward],
      runs: [
        { inches: Math.abs(worst.off), step, unit: true, style: text.alarmNumber },
        { text: worst.off < 0 ? ' bow at ' : ' hollow at ' },
        { inches: worst.at, step, style: text.alarm },
      ],
      style: text.alarm,
      anchor: 'middle',
      middle: true,
      ground: 'card',
    },
  ];
}
