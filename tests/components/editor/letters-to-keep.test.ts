import { lettersToKeep } from '@/components/editor/letters-to-keep';
import type { Layout } from '@/geometry/core/layout';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { layRoom } from '@/geometry/plan/lay-room';
import { applyEdit, type Edit, type EditDraft } from '@/shared/layout/apply-edit';
import { QUAY_STREET_SCULLERY } from '@/shared/layout/demo/quay-street-scullery';
import { parseJobFile } from '@/shared/layout/parse-job-file';

function scullery(): Layout {
  const parsed = parseJobFile(QUAY_STREET_SCULLERY);
  if (!parsed.ok) throw new Error(parsed.errors[0]!.message);
  return parsed.layout;
}

let count = 0;
function after(layout: Layout, draft: EditDraft): Layout {
  const id = `10000000-0000-4000-8000-${String(++count).padStart(12, '0')}`;
  const done = applyEdit(layout, { ...draft, id } as Edit);
  if (!done.ok) throw new Error(done.reason);
  return done.layout;
}

const letters = (layout: Layout) =>
  Object.fromEntries(layRoom(layout, DEFAULT_SETTINGS).tops.pieces.map((piece) => [piece.key, piece.letter]));

/** Run A deeper than a slab: it is glued from two pieces, which come before those of run B. */
const deeper: EditDraft = { kind: 'changeItem', section: 'runs', item: '1', change: { depth: 26.5 } };

describe('letters of pieces', () => {
  it('stay with their pieces when another run gets one more', () => {
    const start = scullery();
    const kept = after(start, lettersToKeep(start, DEFAULT_SETTINGS)!);
    const before = letters(start);
    const now = letters(after(kept, deeper));
    const same = Object.keys(before).filter((key) => key in now);
    expect(same.length).toBeGreaterThanOrEqual(3);
    for (const key of same) expect(now[key]).toBe(before[key]);
    expect(new Set(Object.values(now)).size).toBe(Object.keys(now).length);
    expect(lettersToKeep(kept, DEFAULT_SETTINGS)).toBeNull();
  });

  it('are given to one piece only when two people kept them at once', () => {
    const start = scullery();
    const one = after(start, { kind: 'keepLetters', value: { 'I.1': 'T' } });
    const two = after(one, { kind: 'keepLetters', value: { 's.1': 'T', 'I.1': 'U' } });
    expect(two.letters).toEqual({ ...start.letters, 'I.1': 'T' });
  });

  it('are nothing to keep before there is a top', () => {
    expect(lettersToKeep({ ...scullery(), runs: [], cutouts: [], joints: [] }, DEFAULT_SETTINGS)).toBeNull();
  });
});
