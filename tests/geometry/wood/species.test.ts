import { speciesOf, SPECIES } from '@/geometry/wood/species';

/** Wood Handbook Table 13-5 (copy of GTR-190 chapter 13) beside total shrinkage of Table 4-3, percent. */
const FROM_SHRINKAGE = [
  ['beech', 5.5, 11.9],
  ['hard maple', 4.8, 9.9],
  ['birch', 7.3, 9.5],
  ['black walnut', 5.5, 7.8],
  ['cherry', 3.7, 7.1],
  ['ash', 4.9, 7.8],
] as const;

/** Wood Handbook Table 5-3b in psi against Table 5-3a in SI: MOR MPa, E MPa, side hardness N. */
const SI_TABLE = [
  ['beech', 103, 11_900, 5_800],
  ['hard maple', 109, 12_600, 6_400],
  ['birch', 114, 13_900, 5_600],
  ['black walnut', 101, 11_600, 4_500],
  ['cherry', 85, 10_300, 4_200],
  ['white oak', 105, 12_300, 6_000],
  ['red oak', 99, 12_500, 5_700],
  ['hickory', 139, 14_900, 8_400],
  ['soft maple', 92, 11_300, 4_200],
] as const;

const PSI_PER_MPA = 145.038;
const NEWTONS_PER_LBF = 4.44822;

describe('SPECIES', () => {
  it.each(FROM_SHRINKAGE)(
    'has coefficients of %s that follow from its shrinkage by C = S / (3000 - 20 S)',
    (key, sr, st) => {
      const species = speciesOf(key)!;
      expect(species.radial.value).toBeCloseTo(sr / (3000 - 20 * sr), 5);
      expect(species.tangential.value).toBeCloseTo(st / (3000 - 20 * st), 5);
    },
  );

  // Both editions round: half of the last printed digit on either side, 100 psi, 0.01 x 10^6 psi and 10 lbf at most.
  it.each(SI_TABLE)(
    'has strength figures of %s that convert to the SI table within its rounding',
    (key, mor, e, hardness) => {
      const species = speciesOf(key)!;
      expect(Math.abs(species.rupturePsi!.value / PSI_PER_MPA - mor)).toBeLessThan(1);
      expect(Math.abs(species.modulusPsi.value / PSI_PER_MPA - e)).toBeLessThan(85);
      expect(Math.abs(species.hardnessLbf!.value * NEWTONS_PER_LBF - hardness)).toBeLessThan(75);
    },
  );

  it('has the printed coefficients of the commercial oaks, both hickories and soft maple (Table 13-5)', () => {
    const pair = (key: string) => [speciesOf(key)!.radial.value, speciesOf(key)!.tangential.value];
    expect(pair('white oak')).toEqual([0.0018, 0.00365]);
    expect(pair('red oak')).toEqual([0.00158, 0.00369]);
    expect(pair('hickory')).toEqual([0.00259, 0.00411]);
    expect(pair('pecan')).toEqual([0.00169, 0.00315]);
    expect(pair('soft maple')).toEqual([0.00137, 0.00289]);
  });

  it('moves every wood more along the growth rings than across them', () => {
    for (const species of SPECIES) expect(species.tangential.value).toBeGreaterThan(species.radial.value);
  });

  it('names a source for every figure and marks the unread ones from memory', () => {
    for (const { radial, tangential, gravity12, modulusPsi } of SPECIES) {
      for (const cell of [radial, tangential, gravity12, modulusPsi]) expect(cell.source.length).toBeGreaterThan(10);
    }
    expect(speciesOf('mahogany')!.radial.standing).toBe('from memory');
    expect(speciesOf('sapele')!.tangential.standing).toBe('from memory');
    expect(speciesOf('teak')!.tangential.standing).toBe('second hand');
    expect(speciesOf('hard maple')!.acrossRatio!.tangential.standing).toBe('from memory');
    expect(speciesOf('ash')!.acrossRatio!.tangential.standing).toBe('published');
  });
});

describe('speciesOf', () => {
  it('knows a wood by its key, in any case, and by common other names', () => {
    expect(speciesOf('Hard Maple')?.key).toBe('hard maple');
    expect(speciesOf(' sugar maple ')?.key).toBe('hard maple');
    expect(speciesOf('walnut')?.key).toBe('black walnut');
  });

  it('gives null for a wood that is not in the table', () => {
    expect(speciesOf('balsa')).toBeNull();
    expect(speciesOf('')).toBeNull();
  });
});
