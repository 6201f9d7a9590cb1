/** Outside the browser there is no worker: whoever renders there passes a nest result of their own. */
export function startNestWorker(): Worker | null {
  return null;
}
