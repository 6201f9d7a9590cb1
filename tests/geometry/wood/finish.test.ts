import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { careText, finishSetting, FINISHES } from '@/geometry/wood/finish';
import { finishQuarts, glueArea, glueOunces, sealedArea } from '@/geometry/wood/quantities';
import { sandingGrits } from '@/geometry/wood/sanding';

describe('finishSetting', () => {
  it("takes the shop's figures for the kind, and the coats a job asks for", () => {
    expect(finishSetting({ kind: 'oil' }, DEFAULT_SETTINGS)).toEqual(DEFAULT_SETTINGS.finishes.oil);
    expect(finishSetting({ kind: 'oil', coats: 5 }, DEFAULT_SETTINGS)).toMatchObject({ coats: 5, recoatHours: 24 });
  });

  it("falls back on the shop's usual times where a kind has none, and gives none for bare wood", () => {
    const settings = { ...DEFAULT_SETTINGS, finishes: {} };
    expect(finishSetting({ kind: 'film' }, settings)).toEqual({
      coats: 3,
      sqFtPerQuart: 100,
      recoatHours: 12,
      cureHours: 168,
    });
    expect(finishSetting({ kind: 'none' }, DEFAULT_SETTINGS)).toBeNull();
  });
});

describe('FINISHES', () => {
  it('says of each how it meets food, its upkeep, its repair and its moisture, and where that is from', () => {
    for (const finish of Object.values(FINISHES)) {
      for (const fact of [finish.foodContact, finish.upkeep, finish.repair, finish.moisture]) {
        expect(fact.text.length).toBeGreaterThan(10);
        expect(fact.source !== '' || fact.standing === 'common practice' || fact.standing === 'our choice').toBe(true);
      }
    }
  });

  it('keeps a film off food preparation and rags of drying oils out of piles', () => {
    expect(
      Object.values(FINISHES)
        .filter((f) => !f.foodPrep)
        .map((f) => f.kind),
    ).toEqual(['film']);
    expect(
      Object.values(FINISHES)
        .filter((f) => !f.oilyRags)
        .map((f) => f.kind),
    ).toEqual(['none']);
  });
});

describe('careText', () => {
  it('names the wood and ends with the upkeep of its finish', () => {
    const text = careText({ kind: 'hard wax' }, 'cherry');
    expect(text[0]).toContain('solid cherry');
    expect(text[text.length - 1]).toContain(FINISHES['hard wax'].upkeep.text);
  });
});

describe('sandingGrits', () => {
  // Common practice: start about 100, end at 180 to 220.
  it('goes from 100 to 220 under oil and stops at 180 under a film', () => {
    expect(sandingGrits({ kind: 'oil' })).toEqual([100, 120, 150, 180, 220]);
    expect(sandingGrits({ kind: 'film' })).toEqual([100, 120, 150, 180]);
  });
});

describe('sealedArea', () => {
  it('counts both faces net of cutouts and every edge once, for each of a count', () => {
    const piece = {
      netArea: 900,
      outline: [
        [0, 0],
        [40, 0],
        [40, 25],
        [0, 25],
      ] as const,
      thickness: 1.5,
      count: 2,
    };
    expect(sealedArea(piece)).toBeCloseTo(2 * (1800 + 130 * 1.5), 9);
  });
});

describe('finishQuarts', () => {
  it('puts three coats on 100 sq ft at 100 sq ft a quart with 3.3 quarts, a tenth of it spare', () => {
    expect(finishQuarts(14_400, 3, 100)).toBeCloseTo(3.3, 9);
  });
});

describe('glueOunces', () => {
  it('spreads a gallon on 200 sq ft: 35 in of 1 1/2 in joint takes 0.26 fl oz with a tenth spare', () => {
    const area = glueArea([{ length: 35 }], [], 1.5);
    expect(area).toBe(52.5);
    expect(glueOunces(area, 200)).toBeCloseTo((1.1 * 128 * 52.5) / 144 / 200, 12);
    expect(glueOunces(area, 200)).toBeCloseTo(0.257, 3);
  });

  it('counts only what is left of a seam', () => {
    expect(glueArea([], [{ visible: 4 }], 1.5)).toBe(6);
  });
});
