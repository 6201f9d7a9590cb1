import { nest } from '@/geometry/nest/nest';
import type { NestError, NestInstance, NestPlan } from '@/geometry/nest/types';

/** Searches for slabs beside the page, so that no frame waits for it. One search at a time; a newer one ends the older. */
export type NestRequest = { readonly instance: NestInstance; readonly workLimit: number };
export type NestReply =
  | { readonly kind: 'better'; readonly plan: NestPlan; readonly lowerBound: number }
  | { readonly kind: 'done'; readonly plan: NestPlan }
  | { readonly kind: 'failed'; readonly error: NestError['error'] };

const scope = globalThis as unknown as {
  onmessage: ((event: { data: NestRequest }) => void) | null;
  postMessage: (reply: NestReply) => void;
};

scope.onmessage = ({ data }) => {
  const result = nest(data.instance, {
    workLimit: data.workLimit,
    onBetter: (plan, lowerBound) => scope.postMessage({ kind: 'better', plan, lowerBound }),
  });
  scope.postMessage('error' in result ? { kind: 'failed', error: result.error } : { kind: 'done', plan: result });
};
