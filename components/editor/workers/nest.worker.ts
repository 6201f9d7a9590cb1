import { nest } from '@/geometry/nest/nest';
import type { NestError, NestInstance, NestPlan, NestProgress } from '@/geometry/nest/types';

/** Searches for slabs beside the page, so that no frame waits for it. One search at a time; a newer one ends the older. */
export type NestRequest = { readonly instance: NestInstance; readonly workLimit: number };
export type NestReply =
  | { readonly kind: 'better'; readonly plan: NestPlan; readonly lowerBound: number }
  | { readonly kind: 'progress'; readonly progress: NestProgress }
  | { readonly kind: 'done'; readonly plan: NestPlan }
  | { readonly kind: 'failed'; readonly error: NestError['error'] };

const scope = globalThis as unknown as {
  onmessage: ((event: { data: NestRequest }) => void) | null;
  postMessage: (reply: NestReply) => void;
};

/** ms between two words on progress: a count that runs faster cannot be read. */
const TELL_EVERY = 100;

scope.onmessage = ({ data }) => {
  let told = -TELL_EVERY;
  const result = nest(data.instance, {
    workLimit: data.workLimit,
    onProgress(progress) {
      const now = performance.now();
      if (now - told < TELL_EVERY) return;
      told = now;
      scope.postMessage({ kind: 'progress', progress });
    },
    onBetter: (plan, lowerBound) => scope.postMessage({ kind: 'better', plan, lowerBound }),
  });
  scope.postMessage('error' in result ? { kind: 'failed', error: result.error } : { kind: 'done', plan: result });
};
