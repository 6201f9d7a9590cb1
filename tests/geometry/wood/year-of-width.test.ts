import { CLIMATE_PRESETS, USUAL_SHOP } from '@/geometry/wood/climate-presets';
import { equilibriumMoisture } from '@/geometry/wood/moisture';
import { yearOfWidth } from '@/geometry/wood/year-of-width';

const YEAR = {
  make: { tempF: 68, rh: 45 },
  summer: { tempF: 75, rh: 65 },
  winter: { tempF: 68, rh: 25 },
  heated: true,
};

describe('yearOfWidth', () => {
  const months = yearOfWidth(YEAR, 25, 0.00259);

  it('is narrowest in January at the winter moisture and widest in July at the summer one', () => {
    const widths = months.map((m) => m.width);
    expect(months[0]).toMatchObject({ month: 'Jan', moisture: equilibriumMoisture(YEAR.winter) });
    expect(months[6]).toMatchObject({ month: 'Jul', moisture: equilibriumMoisture(YEAR.summer) });
    expect(widths[0]).toBe(Math.min(...widths));
    expect(widths[6]).toBe(Math.max(...widths));
  });

  it('ranges 0.420 in over the year for 25 in of mixed maple, as the movement does', () => {
    expect(months[6]!.width - months[0]!.width).toBeCloseTo(0.4198, 4);
    expect(months[6]!.change).toBeCloseTo(0.2184, 4);
  });

  it('rises and falls alike on both sides of July', () => {
    for (const i of [1, 2, 3, 4, 5])
      expect(months[6 - i]!.width).toBeCloseTo(months[6 + i - (i > 5 ? 12 : 0)]!.width, 9);
  });

  it('turns round south of the equator', () => {
    const south = yearOfWidth(YEAR, 25, 0.00259, 1);
    expect(south[0]!.width).toBeCloseTo(months[6]!.width, 9);
    expect(south[6]!.width).toBeCloseTo(months[0]!.width, 9);
  });
});

describe('CLIMATE_PRESETS', () => {
  it('has one unheated winter, cold and damp, and keys that are all different', () => {
    const unheated = CLIMATE_PRESETS.filter((preset) => !preset.heated);
    expect(unheated).toHaveLength(1);
    expect(equilibriumMoisture(unheated[0]!.winter)).toBeGreaterThan(14);
    expect(new Set(CLIMATE_PRESETS.map((preset) => preset.key)).size).toBe(CLIMATE_PRESETS.length);
  });

  it('says that its figures are chosen, not measured, and starts the shop at 8.5 %', () => {
    for (const preset of CLIMATE_PRESETS) expect(preset.standing).toBe('our choice');
    expect(equilibriumMoisture(USUAL_SHOP)).toBeCloseTo(8.5, 1);
  });
});
