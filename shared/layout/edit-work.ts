import type { Draft } from 'immer';
import { z } from 'zod';

import type { Layout, WorkPlan } from '@/geometry/core/layout';
import { EditRefused, find } from './edit-refused';
import { addedStepSchema, stepChangeSchema, workPlanSchema } from './layout-schema';

const uuid = z.uuid();
const step = z.string().min(1).max(200);
const { text, caution, hours, skipped } = stepChangeSchema.shape;

/** Edits of the order of work. A null takes a change away, so that the generated step stands again. */
export const workEditSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    id: uuid,
    kind: z.literal('setWork'),
    value: z
      .strictObject({
        start: workPlanSchema.shape.start.unwrap().nullable(),
        workDays: workPlanSchema.shape.workDays,
        hoursPerDay: workPlanSchema.shape.hoursPerDay,
      })
      .partial(),
  }),
  z.strictObject({
    id: uuid,
    kind: z.literal('changeStep'),
    step,
    change: z
      .strictObject({
        text: text.unwrap().nullable(),
        caution: caution.unwrap().nullable(),
        hours: hours.unwrap().nullable(),
        skipped: skipped.unwrap().nullable(),
      })
      .partial(),
  }),
  z.strictObject({ id: uuid, kind: z.literal('addStep'), item: addedStepSchema }),
  z.strictObject({ id: uuid, kind: z.literal('removeStep'), step }),
  z.strictObject({ id: uuid, kind: z.literal('orderSteps'), order: workPlanSchema.shape.order }),
]);

export type WorkEdit = z.infer<typeof workEditSchema>;
type Of<K extends WorkEdit['kind']> = Extract<WorkEdit, { kind: K }>;

function setWork(work: Draft<WorkPlan>, { value }: Of<'setWork'>): void {
  const { start, ...rest } = value;
  Object.assign(work, rest);
  if (start === null) delete work.start;
  else if (start !== undefined) work.start = start;
}

function changeStep(work: Draft<WorkPlan>, edit: Of<'changeStep'>): void {
  const index = work.changes.findIndex((one) => one.id === edit.step);
  const changed: Record<string, unknown> = { ...(work.changes[index] ?? { id: edit.step }) };
  for (const [field, value] of Object.entries(edit.change)) {
    if (value === null) delete changed[field];
    else changed[field] = value;
  }
  const next = changed as unknown as Draft<WorkPlan>['changes'][number];
  if (Object.keys(changed).length === 1) work.changes = work.changes.filter((one) => one.id !== edit.step);
  else if (index < 0) work.changes.push(next);
  else work.changes[index] = next;
}

/** Applies one edit of the order of work to a draft; throws EditRefused when it no longer applies. */
export function applyWorkEdit(draft: Draft<Layout>, edit: WorkEdit): void {
  const work: Draft<WorkPlan> = (draft.work ??= { changes: [], added: [], order: [] });
  switch (edit.kind) {
    case 'setWork':
      return setWork(work, edit);
    case 'changeStep':
      return changeStep(work, edit);
    case 'addStep':
      if (work.added.some((one) => one.id === edit.item.id)) throw new EditRefused('This step is there already.');
      work.added.push(edit.item);
      return;
    case 'removeStep':
      find(work.added, edit.step, 'step');
      work.added = work.added.filter((one) => one.id !== edit.step);
      work.changes = work.changes.filter((one) => one.id !== edit.step);
      work.order = work.order.filter((one) => one !== edit.step);
      return;
    case 'orderSteps':
      work.order = [...edit.order];
      return;
  }
}
