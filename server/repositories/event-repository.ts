import type { Knex } from 'knex';
import type { Client } from 'pg';

const CHANNEL = 'offsquare_shop';

/** Longest wait between two tries to reach the database again. */
const RETRY_MS = 5_000;

export interface Announcement {
  readonly shopId: string;
  readonly event: unknown;
}

/** Tells every server process of a change, when and only when the transaction commits. */
export async function announce(trx: Knex.Transaction, shopId: string, event: object): Promise<void> {
  await trx.raw('select pg_notify(?, ?)', [CHANNEL, JSON.stringify({ shopId, event })]);
}

export interface Listening {
  /** Resolves at the first moment from which nothing is missed. */
  readonly ready: Promise<void>;
  stop(): Promise<void>;
}

/**
 * Calls `heard` with every announcement of any process, over one connection of its own.
 *
 * @param lost - told when the connection breaks: announcements may have been missed until it is back
 */
export function listen(db: Knex, heard: (announcement: Announcement) => void, lost: () => void): Listening {
  let connection: Client | null = null;
  let timer: NodeJS.Timeout | null = null;
  let stopped = false;
  let tellReady = (): void => {};
  const ready = new Promise<void>((resolve) => {
    tellReady = resolve;
  });

  const again = (): void => {
    if (stopped || timer) return;
    timer = setTimeout(() => {
      timer = null;
      void open();
    }, RETRY_MS);
    timer.unref();
  };

  const broken = (): void => {
    if (!connection) return;
    connection = null;
    lost();
    again();
  };

  const open = async (): Promise<void> => {
    try {
      const fresh = (await (
        db.client as { acquireRawConnection(): Promise<unknown> }
      ).acquireRawConnection()) as Client;
      fresh.on('error', broken);
      fresh.on('end', broken);
      fresh.on('notification', ({ payload }) => heard(JSON.parse(payload ?? 'null') as Announcement));
      await fresh.query(`listen ${CHANNEL}`);
      connection = fresh;
      tellReady();
    } catch {
      again();
    }
  };

  const opening = open();
  return {
    ready,
    async stop() {
      stopped = true;
      if (timer) clearTimeout(timer);
      await opening;
      const last = connection;
      connection = null;
      await last?.end();
    },
  };
}
