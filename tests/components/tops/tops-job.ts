import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import type { Layout } from '@/geometry/core/layout';
import { makePlan } from '@/geometry/plan/make-plan';
import { turnPlan, viewTurn } from '@/geometry/scene/turn-plan';
import { applyEdit, type Edit, type EditDraft } from '@/shared/layout/apply-edit';
import { QUAY_STREET_SCULLERY } from '@/shared/layout/demo/quay-street-scullery';
import { parseJobFile } from '@/shared/layout/parse-job-file';

/** A U whose long run has its seam in the middle of a sink at 75 in; `change` is laid over the file. */
export function scullery(change: object = {}): Layout {
  const parsed = parseJobFile({ ...QUAY_STREET_SCULLERY, ...change });
  if (!parsed.ok) throw new Error(parsed.errors[0]!.message);
  return parsed.layout;
}

let serial = 0;

/** The layout after an edit; throws the reason when it is refused. */
export function after(layout: Layout, draft: EditDraft): Layout {
  const id = `c0000000-0000-4000-8000-${String(++serial).padStart(12, '0')}`;
  const done = applyEdit(layout, { ...draft, id } as Edit);
  if (!done.ok) throw new Error(done.reason);
  return done.layout;
}

export const planOf = (layout: Layout) => makePlan({ layout, settings: DEFAULT_SETTINGS, nest: null });

/** What a drag starts from: the tops and how they are turned for drawing. */
export function startOf(layout: Layout) {
  const plan = planOf(layout);
  const turn = viewTurn(layout.room);
  return { layout, plan, drawn: turnPlan(plan, turn), turn };
}
