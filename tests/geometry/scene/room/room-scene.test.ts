import type { DrawItem, Scene } from '@/geometry/scene/display-list';
import { cornerWord } from '@/geometry/scene/room/draw-corners';
import { roomScene } from '@/geometry/scene/room/room-scene';
import { wallBodies, WALL_THICKNESS } from '@/geometry/scene/room/wall-bodies';
import { area, signedArea } from '@/geometry/core/polygon';
import { makePlan } from '@/geometry/plan/make-plan';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import type { Layout } from '@/geometry/core/layout';
import { wallFrames } from '@/geometry/top/wall-frame';

import { room as trueRoom } from '../../../helpers/tops-builder';
import { alderJob } from '../alder-job';

const { plan, layout } = alderJob();

const of = <K extends DrawItem['kind']>(scene: Scene, kind: K, id?: string) =>
  scene.items.filter(
    (item): item is Extract<DrawItem, { kind: K }> => item.kind === kind && (id === undefined || item.id === id),
  );

function replan(change: Partial<Layout>) {
  const changed = { ...layout, ...change };
  return { layout: changed, plan: makePlan({ layout: changed, settings: DEFAULT_SETTINGS, nest: null }) };
}

describe('wallBodies', () => {
  it('joins square bodies at their outer corner: 4 1/2 in out of both walls', () => {
    const walls = wallFrames(trueRoom([100, 80], [90]));
    const [first, second] = wallBodies(walls);
    expect(first!.outline[2]![0]).toBeCloseTo(104.5, 9);
    expect(first!.outline[2]![1]).toBeCloseTo(4.5, 9);
    expect(second!.outline[3]).toEqual(first!.outline[2]);
  });

  it('is counter-clockwise and has the area of the wall times its thickness, plus the miter', () => {
    const walls = wallFrames(trueRoom([100, 80], [90]));
    for (const { wall, outline } of wallBodies(walls)) {
      expect(signedArea(outline)).toBeGreaterThan(0);
      expect(area(outline)).toBeCloseTo(wall.length * WALL_THICKNESS + WALL_THICKNESS ** 2 / 2, 6);
    }
  });
});

describe('cornerWord', () => {
  it('says open, tight, or square within a tenth of a degree', () => {
    expect(cornerWord(90.94, 90)).toBe('open 0.9');
    expect(cornerWord(88.7, 90)).toBe('tight 1.3');
    expect(cornerWord(90.06, 90)).toBe('square');
    expect(cornerWord(135.04, 135)).toBe('true');
    expect(cornerWord(269.2, 270)).toBe('tight 0.8');
  });
});

describe('roomScene', () => {
  const scene = roomScene(plan, layout);

  it('lays a blade along each wall with the first reading on it, and ticks the wall that was taped twice', () => {
    const blades = ['A', 'B', 'C'].map((id) => of(scene, 'blade', `wall ${id}`)[0]!);
    expect(blades.map((b) => b.inches)).toEqual([96.25, 118.625, 84]);
    expect(blades.map((b) => b.state)).toEqual(['set', 'twice', 'set']);
  });

  it('keeps every number upright: no blade is turned more than 100 degrees', () => {
    const turns = of(scene, 'blade').map((b) => Math.abs((b.turn * 180) / Math.PI));
    expect(Math.max(...turns)).toBeLessThanOrEqual(100);
    // Wall C runs right to left, so its blade is flipped and measured from the right.
    expect(of(scene, 'blade', 'wall C')[0]!.hookRight).toBe(true);
  });

  it('draws the bow of wall B larger than life into the room, and names 5/16 at 62', () => {
    const line = of(scene, 'polyline', 'bow B')[0]!;
    expect(line.points).toHaveLength(3);
    const label = of(scene, 'runs', 'bow B')[0]!;
    expect(label.runs).toMatchObject([{ inches: 0.3125 }, { text: ' bow at ' }, { inches: 62 }]);
  });

  it('tags both corners with what the fit says of them', () => {
    const badges = of(scene, 'badge');
    expect(badges.map((b) => b.angleDeg)).toEqual(plan.room!.corners.map((c) => c.angleDeg));
    expect(badges.every((b) => b.state === 'set')).toBe(true);
  });

  it('shows a corner that nobody checked with a question mark', () => {
    const [first] = layout.room.corners;
    const bare = { between: first!.between, nominal: 90 };
    const { plan: less, layout: other } = replan({
      room: { ...layout.room, corners: [bare, layout.room.corners[1]!], ties: [] },
    });
    const badge = of(roomScene(less, other), 'badge', 'corner A-B')[0]!;
    expect(badge).toMatchObject({ angleDeg: null, word: 'check', state: 'unchecked' });
  });

  it('dashes a wall that nobody taped, with an empty blade', () => {
    const walls = layout.room.walls.map((wall) => (wall.id === 'C' ? { ...wall, length: [] } : wall));
    const open = replan({ room: { ...layout.room, walls, ties: [], sketch: [[0, 0], [96, 0], [98, -118], [14, -118]] } }); // prettier-ignore
    const drawn = roomScene(open.plan, open.layout);
    expect(of(drawn, 'blade', 'wall C')[0]).toMatchObject({ inches: null, state: 'empty' });
    expect(of(drawn, 'line', 'C')[0]!.stroke).toMatchObject({ width: 2.2, dash: [9, 6] });
    expect(of(drawn, 'line', 'A')[0]!.stroke.width).toBe(2.6);
  });

  it('accuses a wall only when one reading alone explains the disagreement', () => {
    const suspect = { observation: 'wall C', shouldRead: 84.75, standardised: -9.1, orElse: [] as string[] };
    const state = (orElse: string[]) =>
      of(
        roomScene({ ...plan, room: { ...plan.room!, suspects: [{ ...suspect, orElse }] } }, layout),
        'blade',
        'wall C',
      )[0]!.state;
    expect(state([])).toBe('retake');
    expect(state(['tie t1'])).toBe('set');
  });

  it('gives the tie between the open ends a blade, and shows what is chosen', () => {
    expect(of(scene, 'blade', 'tie t1')).toHaveLength(1);
    const chosen = roomScene(plan, layout, { selected: 'wall A' });
    expect(of(chosen, 'line', 'A')[0]!.stroke).toMatchObject({ ink: 'chalk', width: 5 });
    expect(of(chosen, 'blade', 'wall A')[0]!.state).toBe('selected');
  });

  it('marks the corner cabinet that no hand gets into', () => {
    expect(of(scene, 'mark', 'b3')[0]).toMatchObject({ mark: 'noAccess', ink: 'red' });
  });

  it('is empty while there is nothing to draw', () => {
    expect(roomScene({ ...plan, room: null }, layout).items).toEqual([]);
  });
});
