import { randomUUID } from 'node:crypto';

import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { ALL_CONTRACTS, type NamedContract } from '@/shared/contracts/all-contracts';
import { may, PERMISSIONS, ROLES, type Permission } from '@/shared/roles/roles';
import { stageMove, STAGES, STAGE_SETTERS } from '@/shared/roles/stages';
import { addShop, openTestServer, type Caller, type TestServer, type TestShop } from '@/tests/helpers/test-server';
import { addOneOfEverything } from '../db/one-of-everything';

let server: TestServer;
/** A shop of its own with a row in every table, for everybody else's requests to miss. */
let other: TestShop;
let rowsOfOther: Readonly<Record<string, Record<string, unknown>>>;

beforeAll(async () => {
  server = await openTestServer();
  other = await addShop(server.db, 'Breakwater Benches');
  rowsOfOther = await addOneOfEverything(server.db, other);
});

afterAll(() => server.close());

const SLAB = { species: 'cherry', thickness: 1.5, length: 96, depth: 25 };

/** A body that is right, for every contract that takes one. */
const BODIES: Readonly<Record<string, () => object>> = {
  signIn: () => ({ email: 'nobody@here.example', password: 'x' }),
  requestReset: () => ({ email: 'nobody@here.example' }),
  resetPassword: () => ({ token: 'x'.repeat(43), password: 'long enough, this' }),
  findInvitation: () => ({ token: 'x'.repeat(43) }),
  join: () => ({ token: 'x'.repeat(43), name: 'Nobody', password: 'long enough, this' }),
  updateMe: () => ({ name: 'Somebody' }),
  changeRole: () => ({ role: 'designer' }),
  invite: () => ({ email: `${randomUUID()}@here.example`, role: 'installer' }),
  updateShop: () => ({ settings: DEFAULT_SETTINGS }),
  createJob: () => ({ name: 'A job' }),
  updateJob: () => ({ name: 'A job' }),
  moveStage: () => ({ to: 'measured' }),
  postEdits: () => ({ base: 0, edits: [] }),
  takeStock: () => ({ editId: randomUUID(), base: 0 }),
  importJob: () => ({ file: { room: { walls: [{ id: 'A', length: 90 }] }, runs: [] } }),
  nestJob: () => ({ limitMs: 100 }),
  freezeRevision: () => ({ seq: 0, nest: null }),
  sendBack: () => ({ note: 'No.' }),
  createStock: () => ({ ...SLAB, code: randomUUID(), priceCents: 1 }),
  updateStock: () => ({ count: 1 }),
  importStock: () => ({ slabs: [{ ...SLAB, code: randomUUID(), priceCents: 1 }] }),
  mailSheets: () => ({ personId: randomUUID(), revision: 1 }),
  removeStock: () => ({ ids: [randomUUID()] }),
  createRackPiece: () => SLAB,
  postWork: () => ({ sentAt: new Date().toISOString(), acts: [] }),
};

type Ids = Readonly<Record<string, string>>;

/** Ids of rows that are there, but in no shop of the caller's. */
const theirIds = (): Ids => ({
  jobId: String(rowsOfOther['jobs']?.['id']),
  layoutId: String(rowsOfOther['layouts']?.['id']),
  slabId: String(rowsOfOther['stock_slabs']?.['id']),
  invitationId: String(rowsOfOther['invitations']?.['id']),
  personId: other.people.installer.id,
  number: '1',
});

function send(caller: Caller, { name, contract }: NamedContract, ids: Ids) {
  const path = contract.path.replaceAll(/:(\w+)/g, (_match, id: string) => {
    const value = ids[id];
    if (!value) throw new Error(`no id for :${id} of ${name}`);
    return value;
  });
  const body = BODIES[name];
  if (contract.body && !body) throw new Error(`no body for ${name}`);
  return body ? caller[contract.method](path, body()) : caller[contract.method](path);
}

const signedIn = ALL_CONTRACTS.filter(({ contract }) => contract.may !== 'public');
const named = (list: readonly NamedContract[]) => list.map((one): [string, NamedContract] => [one.name, one]);

describe('contracts', () => {
  it('are all here, each under a method and a path of its own', () => {
    const places = ALL_CONTRACTS.map(({ contract }) => `${contract.method} ${contract.path}`);

    expect(ALL_CONTRACTS.length).toBeGreaterThan(35);
    expect(new Set(places).size).toBe(places.length);
  });

  it.each(named(signedIn))('%s is closed to somebody who is not signed in', async (_name, one) => {
    const { status, body } = await send(server.nobody, one, theirIds());

    expect([status, body.code]).toEqual([401, 'not_signed_in']);
  });

  it.each(named(ALL_CONTRACTS))('%s never answers 500 to a good request', async (_name, one) => {
    const owner = await server.as('owner');
    const { status } = await send(owner, one, theirIds());

    expect(status).toBeLessThan(500);
  });
});

describe('roles', () => {
  const withPermission = signedIn.filter(({ contract }) => contract.may !== 'member');

  it.each(named(withPermission))('%s is open to the roles of the table and to no other', async (_name, one) => {
    const permission = one.contract.may as Permission;
    for (const role of ROLES) {
      const { status, body } = await send(await server.as(role), one, theirIds());
      const refused = status === 403 && body.code === 'not_allowed';
      expect([role, refused]).toEqual([role, !may(role, permission)]);
    }
  });

  it.each(STAGES.flatMap((to) => ROLES.map((role): [string, string] => [role, to])))(
    '%s may move a job to %s as the table of stages says',
    async (role, to) => {
      const installer = await server.as('installer');
      const { body: job } = await installer.post('/jobs', { name: 'A job' }).expect(201);
      const before = STAGES[Math.max(0, STAGES.indexOf(to as (typeof STAGES)[number]) - 1)];
      await server.db('jobs').where({ id: job.id }).update({ stage: before });
      const caller = await server.as(role as (typeof ROLES)[number]);
      const { status } = await caller.post(`/jobs/${job.id as string}/stage`, { to });

      const setters = STAGE_SETTERS[to as (typeof STAGES)[number]] as readonly string[];
      // New is where a job stands already; Signed off comes by signing.
      const byHand = to !== 'new' && to !== 'signed_off';
      const expected = to === 'new' || (setters.includes(role) && !byHand) ? 409 : setters.includes(role) ? 200 : 403;
      expect(status).toBe(expected);
    },
  );
});

describe('another shop', () => {
  const withIds = signedIn.filter(({ contract }) => contract.params);

  it.each(named(withIds))('%s finds nothing of it, for an owner', async (_name, one) => {
    const before = await server.db('jobs').where({ shop_id: other.id }).first();
    const { status, body } = await send(await server.as('owner'), one, theirIds());
    const after = await server.db('jobs').where({ shop_id: other.id }).first();

    expect([status, body.code]).toEqual([404, 'not_found']);
    expect(after).toEqual(before);
  });
});

describe('the table of roles', () => {
  it('gives the owner everything', () => {
    for (const permission of Object.keys(PERMISSIONS)) expect(may('owner', permission as Permission)).toBe(true);
  });

  it('says of prices, stock, layouts and the rack what the shop agreed on', () => {
    const who = (permission: Permission) => ROLES.filter((role) => may(role, permission));

    expect(who('layout.edit')).toEqual(['owner', 'designer', 'installer']);
    expect(who('revision.sign')).toEqual(['owner', 'designer']);
    expect(who('cutting.mark')).toEqual(['owner', 'shop_hand']);
    expect(who('price.see')).toEqual(['owner', 'designer']);
    expect(who('price.edit')).toEqual(['owner']);
    expect(who('stock.see')).toEqual(['owner', 'designer', 'shop_hand']);
    expect(who('stock.edit')).toEqual(['owner']);
    expect(who('crew.edit')).toEqual(['owner']);
    expect(who('shop.edit')).toEqual(['owner']);
  });

  it('lets those take a stage back who may set it', () => {
    expect(stageMove('shop_hand', 'cut', 'signed_off')).toEqual({ kind: 'allowed' });
    expect(stageMove('installer', 'cut', 'drawn')).toEqual({ kind: 'not_allowed' });
    expect(stageMove('designer', 'signed_off', 'drawn')).toEqual({ kind: 'allowed' });
    expect(stageMove('installer', 'fitted', 'cut')).toEqual({ kind: 'allowed' });
  });
});
