import { found, proveCases } from './case';
import { JOINT_CASES, summer } from './joint-cases';
import { base, cornerKitchen } from './kitchen';

describe('findings of joints and hardware', () => {
  proveCases(JOINT_CASES);

  it('warns of a miter that opens over 1/8 in, and of any that shows in an unheated house', () => {
    const opens = (rh: number, heated: boolean) =>
      found(
        cornerKitchen({ joint: { assembled: 'site' }, layout: { climate: summer(rh, heated) } }),
        'miter-opens',
      )[0]!;
    expect(opens(57, true).severity).toBe('note');
    expect(opens(60, true).severity).toBe('warn');
    expect(opens(60, true).text).toContain('over 1/8 in');
    expect(opens(53, false).severity).toBe('warn');
    expect(opens(53, false).text).toContain('unheated');
  });

  it('says what makes it open less, and to what', () => {
    const [opens] = found(
      cornerKitchen({ joint: { assembled: 'site' }, layout: { climate: summer(70) } }),
      'miter-opens',
    );
    expect(opens!.action).toMatch(/then it opens \d.*in\. Or glue it in the shop/);
  });

  it('warns when a glued corner swings further than the gap or the slots let it', () => {
    const swings = (rh: number) => found(cornerKitchen({ layout: { climate: summer(rh) } }), 'corner-swings')[0]!;
    expect(swings(51).severity).toBe('note');
    expect(swings(65).severity).toBe('warn');
    expect(swings(65).action).toContain('Leave more than');
  });

  it('keeps silent about access where nothing is drawn under a joint, or it is glued in the shop', () => {
    expect(found(cornerKitchen({ joint: { assembled: 'site' } }), 'joint-no-access')).toEqual([]);
    const closed = [base({ from: 50, kind: 'corner base', access: 'none' })];
    expect(found(cornerKitchen({ layout: { bases: closed } }), 'joint-no-access')).toEqual([]);
  });

  it('stops a screw that does not bite at all', () => {
    const [none] = found(cornerKitchen({ layout: { fixing: { rail: 3.25, backsplash: 0.5 } } }), 'screw-too-short');
    expect(none!.severity).toBe('stop');
  });

  it('never raises a connector that the layout itself has set out', () => {
    for (const angle of [40, 60, 75, 90, 120, 150, 210]) {
      expect(found(cornerKitchen({ angles: [angle] }), 'connector-comes-through')).toEqual([]);
    }
  });
});
