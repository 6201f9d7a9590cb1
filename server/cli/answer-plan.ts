import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { nest } from '@/geometry/nest/nest';
import { layRoom } from '@/geometry/plan/lay-room';
import { finishPlan } from '@/geometry/plan/make-plan';
import { nestInstanceOf } from '@/geometry/plan/nest-instance';
import { checkPlan } from '@/shared/nest-check/check-plan';
import { parseJobFile } from '@/shared/layout/parse-job-file';
import { toPlanOutput } from '@/shared/layout/plan-output';
import type { Answer, Options } from './batch';
import { writeSheets } from './write-sheets';

/** The same search on every machine: bounded by counted work, not by a clock. */
const WORK_LIMIT = 4_000_000;

/** Plans one job file of the `plan` command; with `--sheets DIR` its sheets are written there as PDF. */
export async function answerPlan(json: unknown, options: Options, index: number): Promise<Answer> {
  const parsed = parseJobFile(json);
  if (!parsed.ok) return { ok: false, error: parsed.errors[0]! };
  const { layout, name } = parsed;
  const laid = layRoom(layout, DEFAULT_SETTINGS);
  if (laid.room.error) return { ok: false, error: { ...laid.room.error, path: `room.${laid.room.error.path}` } };
  const instance = nestInstanceOf(layout, laid.tops.pieces);
  const tried = instance.parts.length > 0 ? nest(instance, { workLimit: WORK_LIMIT }) : null;
  const found = tried !== null && !('error' in tried) ? tried : null;
  const wrong = found ? checkPlan(instance, found) : [];
  if (wrong.length > 0) throw new Error(`The slab plan does not hold: ${wrong[0]!.text}`);
  const plan = finishPlan(laid, layout, DEFAULT_SETTINGS, {
    nest: found,
    nestProblem: tried !== null && 'error' in tried ? tried.error : null,
  });
  const output = toPlanOutput(plan);
  if (options.sheets === undefined) return { ok: true, output };
  const sheets = await writeSheets(options.sheets, { plan, layout, name, index });
  return { ok: true, output: { ...output, sheets } };
}
