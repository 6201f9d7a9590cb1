import { OPEN, run } from '@/tests/helpers/tops-builder';
import { found, proveCases } from './case';
import { base, kitchen } from './kitchen';
import { SUPPORT_CASES } from './support-cases';

describe('findings of what carries the top', () => {
  proveCases(SUPPORT_CASES);

  it('lets an open end hang along the grain as far as that holds: 32 in of maple, not 33', () => {
    const hanging = (to: number) =>
      kitchen({ layout: { runs: [run('1', 'A', { right: OPEN })], bases: [base({ to })] } });
    // The top ends 1 in past the wall's 90 in.
    expect(found(hanging(59), 'overhang-unsupported')).toEqual([]);
    const [found33] = found(hanging(58), 'overhang-unsupported');
    expect(found33!.text).toContain('33 in past the cabinets at the right, along the grain');
  });

  it('goes by what was drawn of the end where no base is', () => {
    const context = kitchen({
      layout: { runs: [run('1', 'A', { right: { kind: 'open', overhang: 40, radius: 1 } })] },
    });
    expect(found(context, 'overhang-unsupported')[0]!.text).toContain('40 in past');
  });
});
