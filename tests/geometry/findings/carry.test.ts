import { CARRY_CASES } from './carry-cases';
import { found, proveCases } from './case';
import { cornerKitchen, kitchen } from './kitchen';

describe('findings of carrying', () => {
  proveCases(CARRY_CASES);

  it('adds up what is glued in the shop and weighs the rest apart', () => {
    const heavy = (assembled: 'shop' | 'site') => {
      const context = cornerKitchen({ walls: [50, 50], joint: { assembled } });
      const pieces = context.pieces.map((piece) => ({ ...piece, weight: 40 }));
      return found({ ...context, pieces }, 'heavy-section');
    };
    expect(heavy('site')).toEqual([]);
    expect(heavy('shop')[0]!.text).toContain('P and Q weigh 80 lb and need four people or a lifting aid');
  });

  it('asks a crew of one for a second pair of hands over 8 ft', () => {
    const long = (length: number) => {
      const context = kitchen({ walls: [length], layout: { access: { ...kitchen().layout.access, crew: 1 } } });
      const pieces = context.pieces.map((piece) => ({ ...piece, weight: 20 }));
      return found({ ...context, pieces }, 'heavy-section');
    };
    expect(long(90)).toEqual([]);
    // The diagonal of 93 x 25 is 96.3 in.
    expect(long(93)).toHaveLength(1);
  });

  it("keeps warning over three people's strength however large the crew is", () => {
    const context = kitchen({ layout: { access: { ...kitchen().layout.access, crew: 6 } } });
    const pieces = context.pieces.map((piece) => ({ ...piece, weight: 77 }));
    expect(found({ ...context, pieces }, 'heavy-section')[0]!.text).toContain('3 together lift 77 lb');
  });
});
