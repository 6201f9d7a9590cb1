/** The worker's own bundle; this exact form is what the bundler recognises. */
export function startNestWorker(): Worker {
  return new Worker(new URL('./workers/nest.worker', import.meta.url));
}
