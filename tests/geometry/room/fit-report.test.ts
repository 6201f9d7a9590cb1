import { fitReport } from '@/geometry/room/fit-report';
import type { CornerInput, TieInput } from '@/geometry/room/types';
import { fitted, roomInput, walls, WORKED_EXAMPLE } from '@/tests/builders/room-input';

const PAIRS = ['AB', 'BC', 'CD', 'DA'];
const corners: CornerInput[] = PAIRS.map((p) => ({
  between: [p[0]!, p[1]!],
  nominalDeg: 90,
  triangle: { a: 36, b: 48, c: 60 },
}));
const cross = Math.hypot(144, 120);
const ties: TieInput[] = [
  { id: 't1', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' }, length: cross },
  { id: 't2', from: { wall: 'A', at: 'end' }, to: { wall: 'C', at: 'end' }, length: cross },
];
const rectangle = roomInput({ closed: true, walls: walls(144, 120, 144, 120), corners, ties });

describe('fitReport', () => {
  it('says within what the room closes and what is spare', () => {
    expect(fitReport(fitted(WORKED_EXAMPLE), '1/16')).toEqual({
      kind: 'closes',
      title: 'Closes within 1/16 in',
      body: '6 readings, 1 spare. You can lay tops.',
      observation: null,
    });
    expect(fitReport(fitted(WORKED_EXAMPLE), '1 mm').title).toBe('Closes within 1 mm');
  });

  it('says that corners are only assumed', () => {
    const diagonal: TieInput = { id: 'd', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' }, length: 150 };
    expect(fitReport(fitted(roomInput({ walls: walls(90, 120), ties: [diagonal] })), '1/16').body).toBe(
      '3 readings, 1 spare. One corner is only assumed.',
    );
  });

  it('says that a slip cannot be noticed when nothing is spare', () => {
    expect(fitReport(fitted(roomInput({ walls: walls(96) })), '1/16')).toMatchObject({
      kind: 'unchecked',
      body: '1 reading, none to spare. A slip of the tape cannot be noticed yet.',
    });
  });

  it('names a reading that stands alone, by how much it is off and what it should read', () => {
    const report = fitReport(fitted({ ...rectangle, walls: walls(144, 120, 144.75, 120) }), '1/16');
    expect(report).toMatchObject({ kind: 'retake', observation: 'wall C' });
    expect(report.title).toBe('Re-take wall C. Off by about 3/4 in.');
    expect(report.body).toBe('It should read about 144 in. The other 9 readings agree.');
  });

  it('speaks of degrees for a protractor', () => {
    const turned = corners.map((c, i) => (i === 1 ? { between: c.between, nominalDeg: 90, angleDeg: 94 } : c));
    const report = fitReport(fitted({ ...rectangle, corners: turned }), '1/16');
    expect(report.title).toBe('Re-take corner B-C. Off by about 4.0 degrees.');
    expect(report.body).toMatch(/^It should read about 90.0 degrees/);
  });

  it('names nothing when the spares do not tell which', () => {
    const wrong = WORKED_EXAMPLE.ties.map((t) => ({ ...t, length: t.length + 2 }));
    const report = fitReport(fitted({ ...WORKED_EXAMPLE, ties: wrong }), '1/16');
    expect(report).toMatchObject({ kind: 'unclear', observation: null, body: 'Tape a cross to find out which.' });
    expect(report.title).toMatch(/^Something is off by about/);
    expect(`${report.title} ${report.body}`).not.toMatch(/wall|tie|corner/i);
  });

  it('asks to check an assumed corner that explains it as well', () => {
    const said = WORKED_EXAMPLE.corners.map((c, i) => (i === 0 ? { between: c.between, nominalDeg: 90 } : c));
    const wrong = [{ ...WORKED_EXAMPLE.ties[0]!, length: 126 }];
    expect(fitReport(fitted({ ...WORKED_EXAMPLE, corners: said, ties: wrong }), '1/16')).toMatchObject({
      kind: 'corner',
      title: 'Check corner A-B.',
      observation: 'corner A-B',
    });
  });

  it('says when the readings hardly agree and none stands out', () => {
    // Two readings of one wall 0.17 in apart: chi2 is over its 3.84, the residuals stay under 3.29.
    const report = fitReport(fitted(roomInput({ walls: walls([96, 96.17]) })), '1/16');
    expect(report).toMatchObject({ kind: 'loose', observation: null });
  });
});
