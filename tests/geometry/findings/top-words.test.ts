import type { Layout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { makePlan } from '@/geometry/plan/make-plan';
import { QUAY_STREET_SCULLERY } from '@/shared/layout/demo/quay-street-scullery';
import { parseJobFile } from '@/shared/layout/parse-job-file';

/** What must be fixed when something of the U is changed. */
function mustFix(change: (layout: Layout) => Partial<Layout>): string[] {
  const parsed = parseJobFile(QUAY_STREET_SCULLERY);
  if (!parsed.ok) throw new Error(parsed.errors[0]!.message);
  const layout = { ...parsed.layout, ...change(parsed.layout) };
  const { findings } = makePlan({ layout, settings: DEFAULT_SETTINGS, nest: null });
  return findings.filter((finding) => finding.code === 'cannot-lay').map((finding) => finding.text);
}

describe('what cannot be laid, in the words of the screen', () => {
  it('a run is known by its wall', () => {
    expect(mustFix(({ runs }) => ({ runs: [{ ...runs[0]!, left: { kind: 'joint' } }, runs[1]!, runs[2]!] }))).toEqual([
      "The run on wall A should end on a joint at its left, but no run joins it there. It is cut square at the wall's end.",
    ]);
    expect(mustFix(({ runs }) => ({ runs: [runs[0]!, runs[1]!, { ...runs[2]!, to: 120 }] }))).toEqual([
      'The run on wall C goes 33 15/16 in past the end of wall C, which is 86 1/16 in long.',
    ]);
  });

  it('two runs on a wall are counted along it', () => {
    const far: Layout['runs'][number] = {
      id: 'x9',
      wall: 'C',
      from: 70,
      to: 'end',
      depth: 0,
      backGap: 0.25,
      left: { kind: 'open', overhang: 0, radius: 0 },
      right: { kind: 'open', overhang: 0, radius: 0 },
    };
    expect(mustFix(({ runs }) => ({ runs: [...runs, far] }))).toEqual([
      'Run 2 on wall C has no depth. Type how deep the top is.',
    ]);
  });

  it('a cutout off its top names the top', () => {
    expect(mustFix(({ cutouts }) => ({ cutouts: [{ ...cutouts[0]!, centre: 3 }] }))).toEqual([
      'Sink reaches past the end of the run on wall B.',
    ]);
    const island = { id: 'I1', length: 60, depth: 24 };
    expect(
      mustFix(({ cutouts }) => ({ islands: [island], cutouts: [{ ...cutouts[0]!, on: 'I1', centre: 90 }] })),
    ).toEqual(['Sink lies off island I1.']);
  });
});
