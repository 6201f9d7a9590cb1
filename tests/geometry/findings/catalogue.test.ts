import fc from 'fast-check';
import { findingsOf, RULES } from '@/geometry/findings/catalogue';
import { FINDING_CODES } from '@/geometry/findings/codes';
import { emptyLayout } from '@/shared/layout/empty-layout';
import { CARRY_CASES } from './carry-cases';
import type { RuleCase } from './case';
import { CUTOUT_CASES } from './cutout-cases';
import { FINISH_CASES } from './finish-cases';
import { GAP_CASES } from './gap-cases';
import { JOINT_CASES } from './joint-cases';
import { cornerKitchen, kitchen } from './kitchen';
import { ROOM_CASES } from './room-cases';
import { SEAM_CASES } from './seam-cases';
import { SEASON_CASES } from './season-cases';
import { SLAB_CASES } from './slab-cases';
import { SUPPORT_CASES } from './support-cases';

const ALL: Readonly<Record<string, RuleCase>> = {
  ...ROOM_CASES,
  ...GAP_CASES,
  ...SEAM_CASES,
  ...CUTOUT_CASES,
  ...SUPPORT_CASES,
  ...JOINT_CASES,
  ...SEASON_CASES,
  ...SLAB_CASES,
  ...CARRY_CASES,
  ...FINISH_CASES,
};

const EVERY_FINDING = () => Object.values(ALL).flatMap((rule) => findingsOf(rule.raises()));

describe('findingsOf', () => {
  it('has a case that raises each of its codes and one that does not', () => {
    expect(Object.keys(ALL).sort()).toEqual([...FINDING_CODES].sort());
  });

  it('says nothing of an empty layout but that oily rags burn', () => {
    const context = kitchen({ walls: [90], layout: { ...emptyLayout(), runs: [] } });
    expect(findingsOf(context).map((f) => f.code)).toEqual(['oily-rags']);
  });

  it('says of a plain top in steady air that its ends are sharp and rags burn, of one of 90 in that it is heavy for two', () => {
    const plain = (walls: readonly number[]) => findingsOf(kitchen({ walls })).map((f) => f.code);
    expect(plain([60])).toEqual(['sharp-corner', 'sharp-corner', 'oily-rags']);
    expect(plain([90])).toEqual(['heavy-section', 'sharp-corner', 'sharp-corner', 'oily-rags']);
  });

  it('puts what must be fixed first and notes last', () => {
    const rank = { stop: 0, warn: 1, note: 2 };
    for (const rule of Object.values(ALL)) {
      const ranks = findingsOf(rule.raises()).map((f) => rank[f.severity]);
      expect(ranks).toEqual([...ranks].sort());
    }
  });

  it('gives every finding of a kitchen a key of its own', () => {
    for (const rule of Object.values(ALL)) {
      const keys = findingsOf(rule.raises()).map((f) => f.key);
      expect(new Set(keys).size).toBe(keys.length);
    }
  });

  it('keeps a key while only the number changes', () => {
    for (const rule of Object.values(ALL)) {
      const first = findingsOf(rule.raises());
      expect(findingsOf(rule.raises())).toEqual(first);
    }
    const gap = (name: 'raises' | 'other') =>
      findingsOf(GAP_CASES['gap-under-swelling']![name]!()).find((f) => f.code === 'gap-under-swelling')!;
    expect(gap('other').key).toBe(gap('raises').key);
    expect(gap('other').text).not.toBe(gap('raises').text);
  });

  it('speaks in whole sentences: a capital, a full stop, no gap in the words, no id or number gone wrong', () => {
    for (const { text, action } of EVERY_FINDING()) {
      for (const sentence of [text, action]) {
        expect(sentence).toMatch(/^[A-Z0-9].*\.$/);
        expect(sentence).not.toMatch(/undefined|null|NaN|Infinity|\s{2}|!/);
      }
    }
  });

  it('names a place and a source for each', () => {
    for (const { at, source } of EVERY_FINDING()) {
      expect(Object.values(at).filter((place) => place !== undefined)).not.toEqual([]);
      expect(source).not.toBe('');
    }
  });

  it('raises the seasons no less for a deeper top or a wetter summer', () => {
    const loudness = (depth: number, rh: number) => {
      const context = cornerKitchen({
        layout: {
          climate: {
            make: { tempF: 68, rh: 45 },
            summer: { tempF: 75, rh },
            winter: { tempF: 68, rh: 40 },
            heated: true,
          },
          runs: kitchenRuns(depth),
        },
      });
      return findingsOf(context).filter((f) => f.code === 'gap-under-swelling').length;
    };
    fc.assert(
      fc.property(fc.integer({ min: 18, max: 30 }), fc.integer({ min: 45, max: 75 }), (depth, rh) => {
        const base = loudness(depth, rh);
        return loudness(depth + 2, rh) >= base && loudness(depth, rh + 5) >= base;
      }),
      { seed: 511, numRuns: 25 },
    );
  });

  it('works off every rule once', () => {
    expect(new Set(RULES).size).toBe(RULES.length);
  });
});

function kitchenRuns(depth: number) {
  return cornerKitchen().layout.runs.map((run) => ({ ...run, depth }));
}
