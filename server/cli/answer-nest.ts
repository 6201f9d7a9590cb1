import { nest } from '@/geometry/nest/nest';
import { pathText } from '@/shared/layout/parse-job-file';
import { readNestFile, toNestOutput } from '@/shared/layout/nest-file';
import { checkPlan } from '@/shared/nest-check/check-plan';
import type { Answer } from './batch';

/** Nests one instance of the `nest` command; its `limitMs` bounds the search, which is otherwise the same everywhere. */
export function answerNest(json: unknown): Answer {
  const read = readNestFile(json);
  if (!read.ok) return read;
  const begun = performance.now();
  const end = begun + read.limitMs;
  const plan = nest(read.instance, { stop: () => performance.now() > end });
  if ('error' in plan) {
    const { code, message, path } = plan.error;
    return { ok: false, error: { code, message, path: pathText(path) } };
  }
  const [wrong] = checkPlan(read.instance, plan);
  if (wrong) throw new Error(`The slab plan does not hold: ${wrong.text}`);
  return { ok: true, output: toNestOutput(plan, Math.round(performance.now() - begun)) };
}
