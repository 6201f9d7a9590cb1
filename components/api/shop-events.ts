import { API_ROOT } from '@/shared/contracts/contract';
import { EVENTS_PATH, shopEventSchema, type ShopEvent } from '@/shared/contracts/events';
import { renewSession } from './client';
import { session } from './session';

const FIRST_RETRY_MS = 2000;
const LONGEST_RETRY_MS = 60_000;

/**
 * Listens to what changes in the shop. Read with fetch, because an EventSource cannot carry the access token.
 *
 * @param heard - called for every event
 * @param opened - called whenever the stream opens (again): what happened meanwhile was missed
 * @returns the way to stop
 */
export function listenToShop(heard: (event: ShopEvent) => void, opened: () => void): () => void {
  const controller = new AbortController();
  let retryMs = FIRST_RETRY_MS;
  const listen = async (): Promise<void> => {
    while (!controller.signal.aborted) {
      try {
        await readStream(controller.signal, heard, () => {
          retryMs = FIRST_RETRY_MS;
          opened();
        });
      } catch {
        if (controller.signal.aborted) return;
      }
      await new Promise((resolve) => setTimeout(resolve, retryMs));
      retryMs = Math.min(retryMs * 2, LONGEST_RETRY_MS);
    }
  };
  void listen();
  return () => controller.abort();
}

async function readStream(signal: AbortSignal, heard: (event: ShopEvent) => void, opened: () => void): Promise<void> {
  const { accessToken } = session.getState();
  if (!accessToken && !(await renewSession())) return;
  const response = await fetch(`${API_ROOT}${EVENTS_PATH}`, {
    signal,
    headers: { accept: 'text/event-stream', authorization: `Bearer ${session.getState().accessToken ?? ''}` },
  });
  if (response.status === 401) await renewSession();
  if (!response.ok || !response.body) return;
  opened();
  const reader = response.body.pipeThrough(new TextDecoderStream()).getReader();
  let text = '';
  for (;;) {
    const { done, value } = await reader.read();
    if (done) return;
    text += value;
    const blocks = text.split('\n\n');
    text = blocks.pop() ?? '';
    for (const block of blocks) {
      const event = eventOf(block);
      if (event) heard(event);
    }
  }
}

/** The event in one block of a stream of server-sent events; null for comments and what is not understood. */
export function eventOf(block: string): ShopEvent | null {
  const data = block
    .split('\n')
    .filter((line) => line.startsWith('data:'))
    .map((line) => line.slice(5).trimStart())
    .join('\n');
  if (!data) return null;
  try {
    const parsed = shopEventSchema.safeParse(JSON.parse(data));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}
