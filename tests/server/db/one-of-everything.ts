import { createHash, randomUUID } from 'node:crypto';

import type { Knex } from 'knex';

import type { TestShop } from '@/tests/helpers/test-server';

type Row = Record<string, unknown>;

const json = (value: unknown): string => JSON.stringify(value);
const someHash = (): Buffer => createHash('sha256').update(randomUUID()).digest();

/**
 * Puts one row into every table that belongs to a shop, as the owner of the database.
 *
 * @returns the rows by table; a table that is missing here has no row, and the tests that go through all tables fail
 */
export async function addOneOfEverything(db: Knex, shop: TestShop): Promise<Readonly<Record<string, Row>>> {
  const rows: Record<string, Row> = {};
  const by = shop.people.owner.id;
  const add = async (table: string, row: Row): Promise<string> => {
    const [made] = await db(table)
      .insert({ shop_id: shop.id, ...row })
      .returning<Row[]>('*');
    rows[table] = made ?? {};
    return String(made?.['id']);
  };

  const wood = { species: 'cherry', thickness: 1.5, length: 96, depth: 25 };
  const soon = new Date(Date.now() + 3_600_000);
  const jobId = await add('jobs', { number: 1, name: 'Ferry Steps larder' });
  const layoutId = await add('layouts', { job_id: jobId, doc: json({}) });
  await add('layout_edits', { layout_id: layoutId, id: randomUUID(), seq: 1, edit: json({}), person_id: by });
  await add('stock_slabs', { ...wood, code: 'C96', price_cents: 43_600 });
  const pieceId = await add('rack_pieces', { ...wood, code: 'R1', length: 31, person_id: by });
  await add('reservations', { rack_piece_id: pieceId, job_id: jobId, person_id: by });
  const frozen = { doc: json({}), settings: json({}), plan: json({}), engine: '1.0.0', sha256: someHash() };
  const revisionId = await add('revisions', { job_id: jobId, number: 1, layout_seq: 1, ...frozen, person_id: by });
  const check = { kind: 'joint', subject: '1|2', verdict: 'accepted' };
  await add('checks', { revision_id: revisionId, ...check, person_id: by });
  const picture = { storage_key: randomUUID(), media_type: 'image/jpeg', bytes: 9, width_px: 3, height_px: 3 };
  await add('photos', { job_id: jobId, ...picture, sha256: someHash(), person_id: by });
  await add('comments', { job_id: jobId, body: 'Mind the pipe.', person_id: by });
  await add('cut_marks', { revision_id: revisionId, slab: 1, cut: 1, person_id: by });
  await add('glue_ups', { revision_id: revisionId, joint: '1|2', cured_at: soon, person_id: by });
  const money = { total_cents: 400_000, deposit_cents: 100_000, currency: 'USD', lines: json([]) };
  const priceId = await add('prices', { revision_id: revisionId, ...money, person_id: by });
  const proposalId = await add('proposals', { price_id: priceId, person_id: by });
  await add('payments', { proposal_id: proposalId, amount_cents: 100_000, currency: 'USD', reference: randomUUID() });
  const link = { token_hash: someHash(), expires_at: soon, person_id: by };
  await add('share_links', { revision_id: revisionId, ...link });
  const asked = { email: 'new@ferry-steps.example', role: 'installer', token_hash: someHash(), expires_at: soon };
  await add('work_acts', { job_id: jobId, step: 'Load', act: 'done', acted_at: new Date(), person_id: by });
  await add('invitations', { ...asked, invited_by: by });
  await add('outbox', { kind: 'reset', to_address: 'a@b.example', subject: 'Hello', body: 'Hello' });
  await add('audit_log', { person_id: by, job_id: jobId, action: 'job.created' });
  await add('idempotency_keys', { person_id: by, key: randomUUID(), request_hash: someHash() });
  return rows;
}
