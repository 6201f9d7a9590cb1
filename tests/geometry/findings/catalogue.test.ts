import fc from 'fast-check';
import { findingsOf, RULES } from '@/geometry/findings/catalogue';
import { FINDING_CODES } from '@/geometry/findings/codes';
import { emptyLayout } from '@/shared/layout/empty-layout';
import { JOINT, OPEN, run, WALL } from '@/tests/helpers/tops-builder';
import { CARRY_CASES } from './carry-cases';
import type { RuleCase } from './case';
import { CUTOUT_CASES } from './cutout-cases';
import { FINISH_CASES } from './finish-cases';
import { GAP_CASES } from './gap-cases';
import { JOINT_CASES } from './joint-cases';
import { base, cornerKitchen, kitchen, sink, type KitchenParts } from './kitchen';
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

  it('has whole sentences with keys of their own to say about any kitchen, however odd', () => {
    fc.assert(
      fc.property(oddKitchen, (parts) => {
        const findings = findingsOf(kitchen(parts));
        expect(new Set(findings.map((f) => f.key)).size).toBe(findings.length);
        for (const { text, action, key } of findings) {
          expect(text).toMatch(/^[A-Z0-9].*\.$/);
          expect(`${text} ${action} ${key}`).not.toMatch(/undefined|NaN|Infinity/);
        }
      }),
      { seed: 512, numRuns: 120 },
    );
  });

  it('works off every rule once', () => {
    expect(new Set(RULES).size).toBe(RULES.length);
  });
});

function kitchenRuns(depth: number) {
  return cornerKitchen().layout.runs.map((run) => ({ ...run, depth }));
}

const number = (min: number, max: number) => fc.integer({ min: min * 16, max: max * 16 }).map((n) => n / 16);

/** Three walls at any angles, with tops, cabinets, cutouts, seams and a climate that nobody would draw. */
const oddKitchen: fc.Arbitrary<KitchenParts> = fc
  .record({
    walls: fc.tuple(number(40, 200), number(40, 200), number(40, 200)),
    angles: fc.tuple(number(50, 140), number(200, 300)),
    depth: number(8, 40),
    backGap: number(0, 1),
    backsplash: number(0, 1),
    thickness: number(0.75, 3),
    rail: number(0, 3),
    species: fc.constantFrom('hard maple', 'teak', 'mahogany', 'driftwood', ''),
    grain: fc.constantFrom('mixed' as const, 'flat' as const, 'edge' as const),
    finish: fc.constantFrom('oil' as const, 'hard wax' as const, 'film' as const, 'none' as const),
    joint: fc.constantFrom('miter' as const, 'butt' as const),
    assembled: fc.constantFrom('shop' as const, 'site' as const),
    heated: fc.boolean(),
    rh: fc.tuple(fc.integer({ min: 0, max: 100 }), fc.integer({ min: 0, max: 100 }), fc.integer({ min: 0, max: 100 })),
    at: fc.tuple(number(-10, 210), number(-10, 210), number(-10, 210)),
    kinds: fc.tuple(
      fc.constantFrom('sink' as const, 'cooktop' as const, 'tap' as const, 'notch' as const),
      fc.constantFrom('cabinet' as const, 'dishwasher' as const, 'range' as const, 'window' as const),
    ),
    step: fc.constantFrom('1/16' as const, '1/32' as const, '1 mm' as const, '0.5 mm' as const),
    crew: fc.integer({ min: 0, max: 6 }),
  })
  .map((odd): KitchenParts => {
    const { depth, backGap, at } = odd;
    const plain = cornerKitchen().layout;
    const ends = [
      [OPEN, JOINT],
      [JOINT, JOINT],
      [JOINT, WALL],
    ] as const;
    return {
      walls: odd.walls,
      angles: odd.angles,
      layout: {
        step: odd.step,
        runs: ends.map(([left, right], i) => run(`${i + 1}`, 'ABC'[i]!, { depth, backGap, left, right })),
        joints: [
          { between: ['1', '2'], kind: odd.joint, through: '1', assembled: odd.assembled },
          { between: ['2', '3'], kind: 'miter', assembled: odd.assembled },
        ],
        bases: [
          base({ from: at[0], to: at[0] + 30, kind: odd.kinds[1] }),
          base({ id: 'b2', wall: 'B', from: 0, to: at[1] }),
        ],
        cutouts: [sink({ centre: at[2], kind: odd.kinds[0] }), sink({ id: 'c2', on: '2', centre: at[1], setback: -3 })],
        seams: [
          { on: '1', at: at[1] },
          { on: '1', at: at[2] },
        ],
        material: { ...plain.material, species: odd.species, thickness: odd.thickness, grain: odd.grain },
        fixing: { rail: odd.rail, backsplash: odd.backsplash },
        finish: { kind: odd.finish, foodPrep: true },
        access: { ...plain.access, crew: odd.crew },
        site: { cabinetsOutOfLevel: backGap },
        climate: {
          make: { tempF: 68, rh: odd.rh[0] },
          summer: { tempF: 80, rh: odd.rh[1] },
          winter: { tempF: 40, rh: odd.rh[2] },
          heated: odd.heated,
        },
      },
    };
  });
