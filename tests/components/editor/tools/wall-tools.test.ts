import type { Base, Layout } from '@/geometry/core/layout';
import { stepBase } from '@/components/editor/tools/base-tool';
import { CROSS_START, markAt, stepCross } from '@/components/editor/tools/cross-tool';
import { placeBase } from '@/components/editor/tools/place-tool';
import { emptyLayout } from '@/shared/layout/empty-layout';

const base = (id: string, from: number, to: number, kind: Base['kind'] = 'cabinet'): Base => ({
  id,
  wall: 'B',
  from,
  to,
  kind,
  depth: kind === 'window' ? 0 : 24,
  access: 'open',
});

const withBases = (...bases: Base[]): Layout => ({ ...emptyLayout(), bases });
const WALL = { length: 120 };
const move = (kind: 'drag' | 'drop' | 'nudge', target: string) =>
  kind === 'nudge'
    ? ({ kind, target, by: [0, 0], on: null } as const)
    : ({ kind, target, from: [0, 0], to: [0, 0], on: null, reach: 5 } as const);

describe('dragging what stands along a wall', () => {
  const layout = withBases(base('b1', 0, 30), base('b2', 50, 80), base('b3', 70, 106, 'window'));

  it('draws an edge to its neighbour within 1 1/2 in', () => {
    expect(stepBase(move('drag', 'base b2'), layout, WALL, -19).preview).toMatchObject({ from: 30, to: 60 });
    expect(stepBase(move('drag', 'base b2'), layout, WALL, -17).preview).toMatchObject({ from: 33, to: 63 });
  });

  it('keeps it inside the wall', () => {
    expect(stepBase(move('drag', 'base b2'), layout, WALL, 300).preview).toMatchObject({ from: 90, to: 120 });
  });

  it('refuses an overlap with the number, and moves nothing', () => {
    const step = stepBase(move('drop', 'base b2'), layout, WALL, -30);
    expect(step.edit).toBeUndefined();
    expect(step.refusal).toBe('It overlaps the cabinet at 0 in by 10 in.');
  });

  it('lets a window hang over a cabinet, centred over a sink when it nearly is', () => {
    const sink = withBases(base('b1', 40, 76, 'sink base'), base('b2', 20, 56, 'window'));
    expect(stepBase(move('drop', 'base b2'), sink, WALL, 19.2).edit!.edit).toMatchObject({
      change: { from: 40, to: 76 },
    });
  });

  it('nudges by exactly 1/16 in, past every place it would be drawn to', () => {
    expect(stepBase(move('nudge', 'base b2'), layout, WALL, 1 / 16).edit!.edit).toMatchObject({
      change: { from: 50.0625, to: 80.0625 },
    });
  });

  it('moves one edge alone', () => {
    expect(stepBase(move('drop', 'base b1 right'), layout, WALL, 10).edit!.edit).toMatchObject({
      change: { from: 0, to: 40 },
    });
    expect(stepBase(move('drag', 'base b2 left'), layout, WALL, 100).preview).toMatchObject({ from: 79, to: 80 });
  });
});

describe('putting something on a wall by a tap', () => {
  const on = (at: number) => ({ wall: 'B', at, length: 120 });
  const placed = (layout: Layout, at: number, what: Parameters<typeof placeBase>[1]) => {
    const result = placeBase(layout, what, on(at));
    if ('refusal' in result) return result.refusal;
    return (result.edit.edit as { item: Base }).item;
  };

  it('stands where it was tapped, its middle there', () => {
    expect(placed(withBases(), 60, 'sink base')).toMatchObject({ from: 42, to: 78, kind: 'sink base' });
  });

  it('moves against the wall or its neighbour when it nearly stands there', () => {
    expect(placed(withBases(), 17, 'range')).toMatchObject({ from: 0, to: 30 });
    expect(placed(withBases(base('b1', 0, 30)), 40, 'range')).toMatchObject({ from: 30, to: 60 });
  });

  it('is a corner base no hand gets into for No access', () => {
    expect(placed(withBases(), 5, 'no access')).toMatchObject({ kind: 'corner base', access: 'none', from: 0 });
  });

  it('says how wide a place is missing on a full wall', () => {
    expect(placed(withBases(base('b1', 0, 100)), 60, 'range')).toBe(
      'No stretch of 30 in is free on this wall. Make something narrower first.',
    );
  });
});

describe('picking the marks of a cross', () => {
  const tap = (wall: string, at: number) =>
    ({ kind: 'tap', at: [0, 0], target: null, on: { wall, at, length: 100 }, reach: 4 }) as const;

  it('takes a wall end within a fingertip, and whole inches along the wall', () => {
    expect(markAt({ wall: 'A', at: 3, length: 100 }, 4)).toEqual({ wall: 'A', at: 0 });
    expect(markAt({ wall: 'A', at: 97, length: 100 }, 4)).toEqual({ wall: 'A', at: 'end' });
    expect(markAt({ wall: 'A', at: 40.3, length: 100 }, 4)).toEqual({ wall: 'A', at: 40 });
  });

  it('gives both marks after the second tap', () => {
    const first = stepCross(CROSS_START, tap('A', 1));
    expect(first.preview).toEqual({ wall: 'A', at: 0 });
    const second = stepCross(first.state, tap('C', 99));
    expect(second.state.picked).toEqual({ from: { wall: 'A', at: 0 }, to: { wall: 'C', at: 'end' } });
  });

  it('refuses two marks on one wall and a tap beside the walls, and keeps the first mark', () => {
    const { state } = stepCross(CROSS_START, tap('A', 1));
    const same = stepCross(state, tap('A', 50));
    expect(same.refusal).toBe('Both marks are on one wall. A cross goes to another wall.');
    expect(same.state).toEqual(state);
    const beside = stepCross(state, { kind: 'tap', at: [0, 0], target: null, on: null, reach: 4 });
    expect(beside.refusal).toBe('Tap a corner or a wall: a cross goes from mark to mark.');
    expect(beside.state).toEqual(state);
  });

  it('forgets the first mark on Escape', () => {
    const { state } = stepCross(CROSS_START, tap('A', 1));
    expect(stepCross(state, { kind: 'cancel' }).state).toEqual(CROSS_START);
  });
});
