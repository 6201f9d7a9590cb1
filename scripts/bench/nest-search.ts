import { nest } from '@/geometry/nest/nest';
import type { NestInstance, NestPlan } from '@/geometry/nest/types';
import { checkBound } from '@/shared/nest-check/bound/check-bound';
import { checkPlan } from '@/shared/nest-check/check-plan';
import { processorMs } from './processor-clock';

export interface Searched {
  readonly instance: NestInstance;
  readonly plan: NestPlan;
  /** Processor ms until the first plan stood, and until the proof or the limit. */
  readonly firstMs: number;
  readonly ms: number;
}

/** More parts than this, and working the bound out again takes longer than the search. */
const MOST_REWORKED = 20;

/**
 * Searches one instance until its price is proved or the limit is over. Every plan told on the way has to pass the checker,
 * and the bound of a small proved one to be worked out again from its evidence, by code that is not the engine's.
 *
 * @param limit - processor ms
 * @throws Error when a plan or a proof is wrong
 */
export function search(instance: NestInstance, limit: number): Searched {
  const begun = processorMs();
  const now = (): number => processorMs() - begun;
  let first = 0;
  let proved = 0;
  const found: NestPlan[] = [];
  const plan = nest(instance, {
    workLimit: Infinity,
    evidence: true,
    stop: () => proved > 0 || now() > limit,
    onBetter(better) {
      first ||= now();
      found.push(better);
    },
    onProgress({ cost, lowerBound }) {
      if (cost !== null && lowerBound >= cost) proved ||= now();
    },
  });
  const ms = proved || now();
  if ('error' in plan) throw new Error(plan.error.message);
  for (const told of [...found, plan]) refuse(instance, checkPlan(instance, told));
  if (plan.proved && instance.parts.length <= MOST_REWORKED) refuse(instance, checkBound(instance, plan));
  return { instance, plan, firstMs: first || ms, ms };
}

function refuse(instance: NestInstance, [wrong]: readonly { readonly text: string }[]): void {
  if (wrong) throw new Error(`${instance.id}: ${wrong.text}`);
}
