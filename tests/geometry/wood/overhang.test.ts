import fc from 'fast-check';
import { checkOverhang, endLoadSag, evenLoadSag, rootStressPsi, stiffnessPsi } from '@/geometry/wood/overhang';
import { speciesOf } from '@/geometry/wood/species';

/** A strip 12 in wide and 1 1/2 in thick, 12 in out: second moment 3.375 in4. Textbook cantilever, computed values. */
const STRIP = [12, 1.5] as const;

describe('endLoadSag', () => {
  it.each([
    ['hard maple', 1.83e6, 0.00933],
    ['black walnut', 1.68e6, 0.01016],
    ['red oak', 1.82e6, 0.00938],
  ])('bends 12 in of %s along the grain under 100 lb by the computed sag', (key, modulus, sag) => {
    expect(speciesOf(key)!.modulusPsi.value).toBeCloseTo(modulus, 3);
    expect(endLoadSag(100, 12, modulus, ...STRIP)).toBeCloseTo(sag, 5);
  });

  it('bends maple 0.1435 in when the grain lies along the edge, at 0.065 of the stiffness', () => {
    const across = stiffnessPsi(speciesOf('hard maple')!, 'across', 'flat');
    expect(across / 1.83e6).toBeCloseTo(0.065, 9);
    expect(endLoadSag(100, 12, across, ...STRIP)).toBeCloseTo(0.1435, 4);
  });
});

describe('evenLoadSag', () => {
  it('bends it 0.00175 in under 50 lb on the square foot', () => {
    expect(evenLoadSag(50 / 12, 12, 1.83e6, ...STRIP)).toBeCloseTo(0.00175, 5);
  });
});

describe('rootStressPsi', () => {
  it('puts 266.7 psi on the root under 100 lb', () => {
    expect(rootStressPsi(100, 12, ...STRIP)).toBeCloseTo(266.7, 1);
  });
});

describe('checkOverhang', () => {
  const maple = speciesOf('hard maple')!;

  it('holds 12 in along the grain and not across it', () => {
    expect(checkOverhang(maple, 'mixed', 'along', 12, 1.5)).toMatchObject({ holds: true, allowed: 12 / 180 });
    expect(checkOverhang(maple, 'mixed', 'across', 12, 1.5).holds).toBe(false);
  });

  it('finds the longest overhang: just under it holds, just over it does not', () => {
    const { longest } = checkOverhang(maple, 'mixed', 'across', 12, 1.5);
    expect(longest).toBeCloseTo(8.18, 2);
    expect(checkOverhang(maple, 'mixed', 'across', longest - 0.001, 1.5).holds).toBe(true);
    expect(checkOverhang(maple, 'mixed', 'across', longest + 0.001, 1.5).holds).toBe(false);
  });

  it('counts edge-grain staves as stiffer across than flat ones, and a wood without ratios as the weakest', () => {
    expect(stiffnessPsi(maple, 'across', 'edge')).toBeCloseTo(0.132 * 1.83e6, 3);
    expect(stiffnessPsi(speciesOf('beech')!, 'across', 'mixed')).toBeCloseTo(0.05 * 1.72e6, 3);
  });

  it('sags more the further out and less the thicker it is', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 2, max: 40, noNaN: true }),
        fc.double({ min: 0.75, max: 3, noNaN: true }),
        (overhang, thickness) => {
          const sag = (o: number, t: number) => checkOverhang(maple, 'mixed', 'across', o, t).sag;
          return (
            sag(overhang + 1, thickness) > sag(overhang, thickness) &&
            sag(overhang, thickness + 0.25) < sag(overhang, thickness)
          );
        },
      ),
      { seed: 471 },
    );
  });
});
