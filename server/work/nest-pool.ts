import path from 'node:path';
import { Worker } from 'node:worker_threads';

import type { NestError, NestInstance, NestPlan } from '@/geometry/nest/types';

const WORKER = path.join(__dirname, 'nest-worker.cjs');

const AT_ONCE = 2;
const MOST_WAITING = 16;
/** A search that does not stop by itself this long after its limit is ended from outside, ms: start-up included. */
const OVERTIME_MS = 10_000;

/** Too many searches wait already. */
export class NestBusyError extends Error {
  override readonly name = 'NestBusyError';
}

/** Runs nesting searches in threads of their own, a few at a time, so that no request waits for one that is not its own. */
export class NestPool {
  private running = 0;
  private readonly waiting: (() => void)[] = [];

  /**
   * @param limitMs - the search stops with its best plan after this time
   * @param signal - ends the search, or the waiting for it, when nobody wants the answer any more
   * @throws NestBusyError when too many wait; the signal's reason when it ended the search
   */
  async run(instance: NestInstance, limitMs: number, signal: AbortSignal): Promise<NestPlan | NestError> {
    await this.turn(signal);
    try {
      // It may have fired between two turns of the event loop, when nobody listened.
      signal.throwIfAborted();
      return await search(instance, limitMs, signal);
    } finally {
      this.running--;
      this.waiting.shift()?.();
    }
  }

  private async turn(signal: AbortSignal): Promise<void> {
    signal.throwIfAborted();
    if (this.running >= AT_ONCE) {
      if (this.waiting.length >= MOST_WAITING) throw new NestBusyError('too many searches wait already');
      await new Promise<void>((resolve, reject) => {
        const go = (): void => {
          signal.removeEventListener('abort', leave);
          resolve();
        };
        const leave = (): void => {
          this.waiting.splice(this.waiting.indexOf(go), 1);
          reject(signal.reason as Error);
        };
        this.waiting.push(go);
        signal.addEventListener('abort', leave, { once: true });
      });
    }
    this.running++;
  }
}

function search(instance: NestInstance, limitMs: number, signal: AbortSignal): Promise<NestPlan | NestError> {
  return new Promise((resolve, reject) => {
    const worker = new Worker(WORKER, { workerData: { instance, limitMs }, execArgv: [] });
    const end = (outcome: () => void): void => {
      clearTimeout(overtime);
      signal.removeEventListener('abort', stop);
      outcome();
      void worker.terminate();
    };
    const stop = (): void => end(() => reject(signal.reason as Error));
    const overtime = setTimeout(
      () => end(() => reject(new Error('the search did not stop at its limit'))),
      limitMs + OVERTIME_MS,
    );
    signal.addEventListener('abort', stop, { once: true });
    worker.once('message', (answer: NestPlan | NestError) => end(() => resolve(answer)));
    worker.once('error', (error) => end(() => reject(error)));
    worker.once('exit', (code) => end(() => reject(new Error(`the search ended with ${code} and no answer`))));
  });
}
