import type { CornerInput, RoomInput } from '@/geometry/room/types';
import { fitted, roomInput, walls, WORKED_EXAMPLE } from '@/tests/builders/room-input';

const SQUARE = { a: 36, b: 48, c: 60 };
const PAIRS = ['A-B', 'B-C', 'C-D', 'D-A'];
const between = (pair: string): [string, string] => pair.split('-') as [string, string];
const triangles: CornerInput[] = PAIRS.map((p) => ({ between: between(p), nominalDeg: 90, triangle: SQUARE }));
const diagonal = Math.hypot(144, 120);

/** A rectangle with every corner and both diagonals taped: plenty to spare. */
const rectangle: RoomInput = roomInput({
  closed: true,
  walls: walls(144, 120, 144, 120),
  corners: triangles,
  ties: [
    { id: 't1', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' }, length: diagonal },
    { id: 't2', from: { wall: 'A', at: 'end' }, to: { wall: 'C', at: 'end' }, length: diagonal },
  ],
});

describe('fitRoom looking for a wrong reading', () => {
  it('accuses nobody where all agree', () => {
    expect(fitted(rectangle)).toMatchObject({ suspects: [], checkCorner: null });
  });

  it('names a diagonal that is 3/4 in long, and what it should read', () => {
    const wrong = rectangle.ties.map((t) => (t.id === 't2' ? { ...t, length: diagonal + 0.75 } : t));
    const { suspects, checkCorner } = fitted({ ...rectangle, ties: wrong });
    expect(suspects).toHaveLength(1);
    expect(suspects[0]).toMatchObject({ observation: 'tie t2', orElse: [] });
    expect(suspects[0]!.shouldRead).toBeCloseTo(diagonal, 6);
    expect(suspects[0]!.standardised).toBeLessThan(-3.29);
    expect(checkCorner).toBeNull();
  });

  it('names a wall that is 1 in short', () => {
    const { suspects } = fitted({ ...rectangle, walls: walls(144, 119, 144, 120) });
    expect(suspects[0]).toMatchObject({ observation: 'wall B', orElse: [] });
    expect(suspects[0]!.shouldRead).toBeCloseTo(120, 2);
    expect(suspects[0]!.standardised).toBeGreaterThan(3.29);
  });

  it('names a corner triangle, and a protractor in degrees', () => {
    const bad = triangles.map((c, i) => (i === 1 ? { ...c, triangle: { ...SQUARE, c: 61 } } : c));
    expect(fitted({ ...rectangle, corners: bad }).suspects[0]).toMatchObject({ observation: 'corner B-C', orElse: [] });
    const turned = triangles.map((c, i) => (i === 2 ? { between: c.between, nominalDeg: 90, angleDeg: 93 } : c));
    const [suspect] = fitted({ ...rectangle, corners: turned }).suspects;
    expect(suspect!.observation).toBe('corner C-D');
    expect(suspect!.shouldRead).toBeCloseTo(90, 6);
  });

  it('cannot tell readings apart with one to spare: the first in the order walls, corners, ties, then the others', () => {
    const ties = WORKED_EXAMPLE.ties.map((t) => ({ ...t, length: t.length + 2 }));
    const { suspects, dof } = fitted({ ...WORKED_EXAMPLE, ties });
    expect(dof).toBe(1);
    expect(suspects[0]).toMatchObject({
      observation: 'wall A',
      orElse: ['wall B', 'wall C', 'corner A-B', 'corner B-C', 'tie t1'],
    });
  });

  it('accuses nothing measured while an assumed corner explains it as well', () => {
    const corners = WORKED_EXAMPLE.corners.map((c, i) => (i === 0 ? { between: c.between, nominalDeg: 90 } : c));
    // The corner stands at 96 degrees: six times its one degree.
    const ties = [{ ...WORKED_EXAMPLE.ties[0]!, length: 126 }];
    const fit = fitted({ ...WORKED_EXAMPLE, corners, ties });
    expect(fit.suspects).toEqual([]);
    expect(fit.checkCorner).toBe('corner A-B');
  });

  it('keeps a trusted reading in the fit and out of suspicion', () => {
    const ties = rectangle.ties.map((t) => (t.id === 't2' ? { ...t, length: diagonal + 0.75 } : t));
    const free = fitted({ ...rectangle, ties });
    const trusted = fitted({ ...rectangle, ties, trust: ['tie t2'] });
    expect(trusted.points).toEqual(free.points);
    expect(trusted.chi2).toBe(free.chi2);
    expect(trusted.suspects.map((s) => s.observation)).not.toContain('tie t2');
    expect(trusted.suspects.flatMap((s) => s.orElse)).not.toContain('tie t2');
  });

  it('leaves trusted readings out of the others that stand for it', () => {
    const ties = WORKED_EXAMPLE.ties.map((t) => ({ ...t, length: t.length + 2 }));
    const { suspects } = fitted({ ...WORKED_EXAMPLE, ties, trust: ['wall A', 'corner A-B'] });
    expect(suspects[0]).toMatchObject({ observation: 'wall B', orElse: ['wall C', 'corner B-C', 'tie t1'] });
  });

  it('is satisfied once the wrong reading is ignored', () => {
    const ties = rectangle.ties.map((t) => (t.id === 't2' ? { ...t, length: diagonal + 0.75 } : t));
    const fit = fitted({ ...rectangle, ties, ignore: ['tie t2'] });
    expect(fit.suspects).toEqual([]);
    expect(fit.ties[1]).toMatchObject({ ignored: true, taped: diagonal + 0.75 });
    expect(fit.ties[1]!.residual).toBeCloseTo(-0.75, 6);
  });

  it('names a wall once when its two readings disagree and nothing else checks them', () => {
    const { suspects } = fitted(roomInput({ walls: walls([96, 97], 120) }));
    expect(suspects[0]).toMatchObject({ observation: 'wall A', orElse: [] });
    expect(suspects[0]!.shouldRead).toBeCloseTo(97, 6);
  });

  it('never drops or changes a reading by itself', () => {
    const ties = rectangle.ties.map((t) => (t.id === 't2' ? { ...t, length: diagonal + 0.75 } : t));
    const fit = fitted({ ...rectangle, ties });
    expect(fit.ties[1]!.taped).toBe(diagonal + 0.75);
    expect(fit.ties[1]!.ignored).toBe(false);
    // The reading still pulls: the diagonal is adjusted beyond its true length.
    expect(fit.ties[1]!.adjusted).toBeGreaterThan(diagonal + 0.01);
  });
});
