import { drawboltsAlong } from '@/geometry/wood/drawbolts';

describe('drawboltsAlong', () => {
  it('starts 6 in from both ends and stands at most 12 in apart', () => {
    expect(drawboltsAlong(36)).toEqual([6, 18, 30]);
    expect(drawboltsAlong(35)).toEqual([6, 17.5, 29]);
    expect(drawboltsAlong(37)).toEqual([6, 6 + 25 / 3, 6 + 50 / 3, 31]);
  });

  it('puts one in the middle of a short joint and none on a joint of no length', () => {
    expect(drawboltsAlong(10)).toEqual([5]);
    expect(drawboltsAlong(0)).toEqual([]);
  });
});
