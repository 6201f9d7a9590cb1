import fc from 'fast-check';

import { mapLabels, rowsOf } from '@/geometry/scene/cut-sheet/mark-labels';
import type { CutMark } from '@/geometry/scene/slab/cut-marks';

const mark = (at: number, side: 'left' | 'right', cut = 1): CutMark => ({
  cut,
  edge: 'top',
  at,
  side,
  letter: side === 'left' ? 'S' : 'T',
  word: side === 'left' ? 'long point' : 'short point',
});

const place = (marks: readonly CutMark[]) => mapLabels(marks, '1/16', (m) => 45 + m.at * 8, [45, 1011]);

describe('mapLabels', () => {
  it('stands the labels of one cut on both its sides, in one row', () => {
    const [s, t] = place([mark(59.6875, 'left'), mark(59.875, 'right')]);
    expect(s).toMatchObject({ name: 'S long point', row: 0, anchor: 'end' });
    expect(t).toMatchObject({ name: 'T short point', row: 0, anchor: 'start' });
    expect(s!.right).toBeLessThan(s!.x);
    expect(t!.left).toBeGreaterThan(t!.x);
  });

  it('keeps a label on the page at the slab’s very end', () => {
    const [label] = place([mark(0.1, 'left')]);
    expect(label!.left).toBeGreaterThanOrEqual(45);
  });

  it('never lets two labels of a row touch, however many cuts there are', () => {
    const marks = fc.array(fc.tuple(fc.double({ min: 0, max: 120, noNaN: true }), fc.constantFrom('left', 'right')), {
      minLength: 1,
      maxLength: 24,
    });
    fc.assert(
      fc.property(marks, (places) => {
        const labels = place(places.map(([at, side], i) => mark(at, side as 'left' | 'right', i)));
        return labels.every((a, i) =>
          labels.every((b, j) => i === j || a.row !== b.row || a.right <= b.left || b.right <= a.left),
        );
      }),
      { seed: 20310512, numRuns: 200 },
    );
  });

  it('takes a second row only where the first is full', () => {
    expect(rowsOf(place([mark(10, 'left'), mark(40, 'left'), mark(90, 'left')]))).toBe(1);
    expect(rowsOf(place([mark(20, 'left'), mark(22, 'left')]))).toBe(2);
  });
});
