import type { BenchRow } from '@/scripts/bench/bench-row';
import { quantile, timeTurnAbout } from '@/scripts/bench/side-by-side';
import { benchTable } from '@/scripts/bench/table';

const rows: BenchRow[] = [
  { name: 'live chain', value: 3.127, unit: 'ms', against: { name: 'union', value: 0.18812 }, ratio: 16.6224 },
  { name: 'fonts', value: 196.34, unit: 'kB', against: null, ratio: null },
];

describe('benchTable', () => {
  it('prints three digits, numbers flush right, and no ratio for a bare number', () => {
    expect(benchTable(rows).split('\n')).toEqual([
      '            value  unit  against  value  ratio',
      'live chain   3.13  ms    union    0.188  16.62',
      'fonts         196  kB',
    ]);
  });
});

describe('quantile', () => {
  it('gives the value that the share lies at or under', () => {
    const values = [50, 10, 40, 20, 30];
    expect(quantile(values, 0.5)).toBe(30);
    expect(quantile(values, 0)).toBe(10);
    expect(quantile(values, 1)).toBe(50);
    expect(values[0]).toBe(50);
  });
});

describe('timeTurnAbout', () => {
  it('runs the works turn about and counts only the rounds after the warm-up', () => {
    const ran: string[] = [];
    const times = timeTurnAbout([(round) => ran.push(`a${round}`), (round) => ran.push(`b${round}`)], {
      rounds: 2,
      warmUp: 1,
    });
    expect(ran).toEqual(['a0', 'b0', 'a1', 'b1', 'a2', 'b2']);
    expect(times.map((list) => list.length)).toEqual([2, 2]);
  });
});
