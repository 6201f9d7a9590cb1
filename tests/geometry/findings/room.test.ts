import { found, proveCases } from './case';
import { cornerKitchen } from './kitchen';
import { ROOM_CASES } from './room-cases';

describe('findings of the room', () => {
  proveCases(ROOM_CASES);

  it('names several readings together when none of them can be told from the others', () => {
    const context = cornerKitchen({
      fit: { suspects: [{ observation: 'wall A', shouldRead: 80, standardised: 4, orElse: ['wall B', 'corner A-B'] }] },
    });
    const [several] = found(context, 'reading-suspect');
    expect(several!.text).toContain('may be wall A, wall B and corner A-B');
    expect(several!.action).toContain('Tape a cross');
  });

  it('reads a suspect protractor in degrees', () => {
    const context = cornerKitchen({
      corner: { kind: 'angle' },
      fit: { suspects: [{ observation: 'corner A-B', shouldRead: 92.25, standardised: 6, orElse: [] }] },
    });
    expect(found(context, 'reading-suspect')[0]!.text).toContain('92.3 degrees');
  });

  it('leaves an assumed corner alone that no cut depends on', () => {
    const context = cornerKitchen({ corner: { measured: false }, layout: { runs: [], joints: [] } });
    expect(found(context, 'corner-not-measured')).toEqual([]);
  });
});
