import { randomUUID } from 'node:crypto';

import type { Layout } from '@/geometry/core/layout';
import { applyEdit, type Edit, type EditDraft } from '@/shared/layout/apply-edit';
import { emptyLayout } from '@/shared/layout/empty-layout';
import { layoutSchema } from '@/shared/layout/layout-schema';
import { parseJobFile } from '@/shared/layout/parse-job-file';
import { toJobFile } from '@/shared/layout/to-job-file';

const done = (layout: Layout, draft: EditDraft) => {
  const result = applyEdit(layout, { ...draft, id: randomUUID() } as Edit);
  if (!result.ok) throw new Error(result.reason);
  return result;
};
const after = (draft: EditDraft, layout = emptyLayout()): Layout => done(layout, draft).layout;

const PLUMBER = { id: 'a1', text: 'Ring the plumber', part: 'site', hours: 0.25 } as const;

describe('edits of the order of work', () => {
  it('keep a first day and take it away again', () => {
    const started = after({ kind: 'setWork', value: { start: '2026-03-16', workDays: [1, 2, 3, 4] } });
    expect(started.work).toMatchObject({ start: '2026-03-16', workDays: [1, 2, 3, 4] });
    expect(after({ kind: 'setWork', value: { start: null } }, started).work?.start).toBeUndefined();
  });

  it('keep words, hours and the reason why a step is left out; null brings the generated one back', () => {
    const changed = after({ kind: 'changeStep', step: 'Sand', change: { text: 'Sand to 220', hours: 3 } });
    const skipped = after({ kind: 'changeStep', step: 'Sand', change: { skipped: 'Done by the mill.' } }, changed);
    expect(skipped.work?.changes).toEqual([
      { id: 'Sand', text: 'Sand to 220', hours: 3, skipped: 'Done by the mill.' },
    ]);
    const change = { text: null, hours: null, skipped: null };
    expect(after({ kind: 'changeStep', step: 'Sand', change }, skipped).work?.changes).toEqual([]);
  });

  it('add a step once, and take it away with what was changed of it', () => {
    const added = after({ kind: 'addStep', item: PLUMBER });
    const again = applyEdit(added, { id: randomUUID(), kind: 'addStep', item: PLUMBER });
    expect(again).toEqual({ ok: false, reason: 'This step is there already.' });
    const changed = after({ kind: 'changeStep', step: 'a1', change: { hours: 1 } }, added);
    const ordered = after({ kind: 'orderSteps', order: ['a1', 'Sand'] }, changed);
    expect(after({ kind: 'removeStep', step: 'a1' }, ordered).work).toEqual({
      changes: [],
      added: [],
      order: ['Sand'],
    });
    const gone = applyEdit(emptyLayout(), { id: randomUUID(), kind: 'removeStep', step: 'a1' });
    expect(gone).toEqual({ ok: false, reason: 'The step this belongs to is gone.' });
  });

  it('are undone step by step, also after somebody else changed another step', () => {
    const first = done(emptyLayout(), { kind: 'changeStep', step: 'Sand', change: { hours: 3 } });
    const mine = done(first.layout, { kind: 'changeStep', step: 'Load', change: { hours: 2 } });
    const theirs = after({ kind: 'changeStep', step: 'Cut the pieces', change: { hours: 5 } }, mine.layout);
    const undone = after(mine.inverse as EditDraft, theirs);
    expect(undone.work?.changes.map((change) => change.id)).toEqual(['Sand', 'Cut the pieces']);
    expect(after(first.inverse as EditDraft, first.layout).work).toBeUndefined();
  });

  it('fit the stored document and the job file', () => {
    const drawn = after({ kind: 'addStep', item: PLUMBER }, after({ kind: 'setWork', value: { start: '2026-03-16' } }));
    expect(layoutSchema.safeParse(drawn).success).toBe(true);
    const file = toJobFile(
      { ...drawn, room: { ...drawn.room, walls: [{ id: 'A', length: [{ text: '90', value: 90 }], profile: [] }] } },
      'Quay Street',
    );
    const read = parseJobFile(file);
    expect(read.ok && read.layout.work).toEqual(drawn.work);
  });
});
