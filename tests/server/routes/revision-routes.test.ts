import { randomUUID } from 'node:crypto';

import { nest } from '@/geometry/nest/nest';
import type { NestPlan } from '@/geometry/nest/types';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { makePlan } from '@/geometry/plan/make-plan';
import { canonicalJson, sha256Of } from '@/server/services/canonical-json';
import { QUAY_STREET_SCULLERY } from '@/shared/layout/demo/quay-street-scullery';
import { layoutSchema } from '@/shared/layout/layout-schema';
import { openTestServer, type Caller, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let installer: Caller;
let designer: Caller;

beforeAll(async () => {
  server = await openTestServer();
  installer = await server.as('installer');
  designer = await server.as('designer');
});

afterAll(() => server.close());

interface Job {
  readonly id: string;
  readonly layoutId: string;
}

async function scullery(): Promise<Job> {
  const { body } = await installer.post('/job-files', { file: QUAY_STREET_SCULLERY }).expect(201);
  return body as Job;
}

/** A nest result as a browser would find it, for the layout as the server gives it. */
async function searched({ layoutId }: Job): Promise<NestPlan> {
  const { body } = await installer.get(`/layouts/${layoutId}`).expect(200);
  const plan = makePlan({ layout: layoutSchema.parse(body.layout), settings: DEFAULT_SETTINGS, nest: null });
  const found = nest(plan.instance, { workLimit: 200_000 });
  if ('error' in found) throw new Error(found.error.message);
  return found;
}

const freeze = (job: Job, body: object) => installer.post(`/jobs/${job.id}/revisions`, body);

async function drawnWithRevision(): Promise<{ job: Job; plan: NestPlan }> {
  const job = await scullery();
  for (const to of ['measured', 'drawn']) await installer.post(`/jobs/${job.id}/stage`, { to }).expect(200);
  const plan = await searched(job);
  await freeze(job, { seq: 0, nest: plan }).expect(201);
  return { job, plan };
}

async function edit({ layoutId }: Job, base: number): Promise<void> {
  const edits = [{ id: randomUUID(), kind: 'setFinish', value: { coats: 2 } }];
  await installer.post(`/layouts/${layoutId}/edits`, { base, edits }).expect(200);
}

describe('POST /jobs/:jobId/revisions', () => {
  it("freezes layout, settings and a plan of the server's own under number 1, with its checksum", async () => {
    const { job, plan } = await drawnWithRevision();
    const { body } = await installer.get(`/jobs/${job.id}/revisions/1`).expect(200);
    const own = makePlan({ layout: layoutSchema.parse(body.layout), settings: DEFAULT_SETTINGS, nest: plan });

    expect(body).toMatchObject({ number: 1, layoutSeq: 0, engine: own.engine, changedSince: false, signedOff: null });
    expect(body.settings).toEqual(DEFAULT_SETTINGS);
    expect(body.plan).toEqual(JSON.parse(JSON.stringify(own)));
    expect(body.plan.joints.map(({ length }: { length: number }) => length.toFixed(3))).toEqual(['35.039', '35.813']);
    const frozen = { doc: body.layout, settings: body.settings, nest: plan, plan: body.plan, engine: body.engine };
    expect(body.sha256).toBe(sha256Of(frozen).toString('hex'));
  });

  it('counts revisions, newest first, and says which were changed since', async () => {
    const { job } = await drawnWithRevision();
    await edit(job, 0);
    await freeze(job, { seq: 1, nest: null, note: 'Fewer coats.' }).expect(201);
    const { body } = await installer.get(`/jobs/${job.id}/revisions`).expect(200);

    expect(
      body.revisions.map((one: { number: number; changedSince: boolean; note: string }) => [
        one.number,
        one.changedSince,
        one.note,
      ]),
    ).toEqual([
      [2, false, 'Fewer coats.'],
      [1, true, ''],
    ]);
    const seen = await installer.get(`/jobs/${job.id}`).expect(200);
    expect(seen.body).toMatchObject({ revision: 2, changedSince: false, signedOff: false });
  });

  it('keeps what it froze when the layout, the settings and the stock change afterwards', async () => {
    const { job } = await drawnWithRevision();
    const before = await installer.get(`/jobs/${job.id}/revisions/1`).expect(200);
    await edit(job, 0);
    const owner = await server.as('owner');
    await owner.patch('/shop', { settings: { ...DEFAULT_SETTINGS, backGap: 0.5 } }).expect(200);
    const after = await installer.get(`/jobs/${job.id}/revisions/1`).expect(200);
    await owner.patch('/shop', { settings: DEFAULT_SETTINGS }).expect(200);

    expect(after.body).toEqual({ ...before.body, changedSince: true });
  });

  it('refuses a layout that has moved on since the person saw it', async () => {
    const job = await scullery();
    await edit(job, 0);
    const { body } = await freeze(job, { seq: 0, nest: null }).expect(409);

    expect(body).toMatchObject({ code: 'layout_moved_on', detail: 'The layout has 1 edits by now, and you saw 0.' });
  });

  it('refuses a nest result of other pieces', async () => {
    const job = await scullery();
    const plan = await searched(job);
    const { body } = await freeze(job, { seq: 0, nest: { ...plan, instance: 'another' } }).expect(409);

    expect(body.code).toBe('plan_refused');
    expect(body.detail).toMatch(/^The slabs were planned for other pieces/);
  });

  it('refuses a nest result that cannot be sawn: a piece that is missing, a price that is wrong', async () => {
    const job = await scullery();
    const plan = await searched(job);
    const missing = { ...plan, slabs: plan.slabs.slice(1) };
    const cheap = { ...plan, cost: plan.cost - 100 };

    const first = await freeze(job, { seq: 0, nest: missing }).expect(409);
    const second = await freeze(job, { seq: 0, nest: cheap }).expect(409);

    expect(first.body.issues.map(({ path }: { path: string }) => path)).toContain('nest.part_missing');
    expect(second.body.issues.map(({ path }: { path: string }) => path)).toContain('nest.cost_wrong');
  });

  it('gives two that are frozen at once two numbers, and a resend none', async () => {
    const job = await scullery();
    const key = randomUUID();
    const send = () => freeze(job, { seq: 0, nest: null }).set('Idempotency-Key', key);
    const answers = await Promise.all([send(), send(), freeze(job, { seq: 0, nest: null })]);

    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect(answers[0].body.number).toBe(answers[1].body.number);
    expect(new Set(answers.map(({ body }) => body.number))).toEqual(new Set([1, 2]));
  });

  it('waits for nobody for ever while others edit and freeze the same job', async () => {
    const job = await scullery();
    const answers = await Promise.all(
      Array.from({ length: 12 }, (_, n) =>
        n % 2 === 0
          ? freeze(job, { seq: 0, nest: null })
          : designer.post(`/layouts/${job.layoutId}/edits`, {
              base: 0,
              edits: [{ id: randomUUID(), kind: 'setFinish', value: { coats: n } }],
            }),
      ),
    );

    expect(answers.map(({ status }) => status).filter((status) => ![200, 201, 409].includes(status))).toEqual([]);
    const { body } = await installer.get(`/layouts/${job.layoutId}`).expect(200);
    expect(body.seq).toBe(6);
  });
});

describe('sign-off', () => {
  const decide = (who: Caller, job: Job, number: number, what: string, body?: object) =>
    who.post(`/jobs/${job.id}/revisions/${number}/${what}`, body);

  it('is kept with who and when, and moves the job to Signed off', async () => {
    const { job } = await drawnWithRevision();
    await installer.post(`/jobs/${job.id}/send-for-check`).expect(200);
    const { body } = await decide(designer, job, 1, 'sign-off').expect(200);

    expect(body.signedOff.by).toEqual({ id: server.shop.people.designer.id, name: 'designer of Tidewater Tops' });
    const seen = await installer.get(`/jobs/${job.id}`).expect(200);
    expect(seen.body).toMatchObject({ stage: 'signed_off', signedOff: true, sentForCheckAt: null });
    const log = await installer.get(`/jobs/${job.id}/activity?limit=1`).expect(200);
    expect(log.body.items[0]).toMatchObject({ action: 'revision.signed_off', data: { revision: 1, to: 'signed_off' } });
    const shopHand = await server.as('shop_hand');
    await shopHand.post(`/jobs/${job.id}/stage`, { to: 'cut' }).expect(200);
  });

  it('is decided once', async () => {
    const { job } = await drawnWithRevision();
    await decide(designer, job, 1, 'sign-off').expect(200);

    const again = await decide(designer, job, 1, 'sign-off').expect(409);
    const back = await decide(designer, job, 1, 'send-back', { note: 'No.' }).expect(409);

    expect([again.body.code, back.body.code]).toEqual(['already_decided', 'already_decided']);
  });

  it('speaks of the newest revision only', async () => {
    const { job, plan } = await drawnWithRevision();
    await freeze(job, { seq: 0, nest: plan }).expect(201);
    const { body } = await decide(designer, job, 1, 'sign-off').expect(409);

    expect(body.detail).toBe('Revision 2 is newer; decide on that one.');
  });

  it('sends back with what has to change', async () => {
    const { job } = await drawnWithRevision();
    await decide(designer, job, 1, 'send-back', { note: ' ' }).expect(422);
    const { body } = await decide(designer, job, 1, 'send-back', { note: 'Seam to the left.' }).expect(200);

    expect(body.sentBack).toMatchObject({ note: 'Seam to the left.', by: { name: 'designer of Tidewater Tops' } });
    const after = await decide(designer, job, 1, 'sign-off').expect(409);
    expect(after.body.detail).toBe('Revision 1 was sent back.');
  });

  it('is refused before the job is drawn, without slabs, and without a room', async () => {
    const early = await scullery();
    await freeze(early, { seq: 0, nest: await searched(early) }).expect(201);
    const tooEarly = await decide(designer, early, 1, 'sign-off').expect(409);

    const { job: unnested } = await drawnWithRevision();
    await freeze(unnested, { seq: 0, nest: null }).expect(201);
    const noSlabs = await decide(designer, unnested, 2, 'sign-off').expect(409);

    const { body: empty } = await installer.post('/jobs', { name: 'Empty' }).expect(201);
    for (const to of ['measured', 'drawn']) await installer.post(`/jobs/${empty.id}/stage`, { to }).expect(200);
    await freeze(empty, { seq: 0, nest: null }).expect(201);
    const noRoom = await decide(designer, empty, 1, 'sign-off').expect(409);

    expect([tooEarly.body.code, noSlabs.body.code, noRoom.body.code]).toEqual([
      'stage_refused',
      'plan_refused',
      'plan_refused',
    ]);
    expect(tooEarly.body.detail).toBe('The job is in New; set it to Drawn first.');
  });

  it('is held by what has to be fixed, and says what', async () => {
    const job = await scullery();
    for (const to of ['measured', 'drawn']) await installer.post(`/jobs/${job.id}/stage`, { to }).expect(200);
    // The sink base is 36 in wide.
    const change = { width: 40 };
    const edits = [{ id: randomUUID(), kind: 'changeItem', section: 'cutouts', item: 'c1', change }];
    await installer.post(`/layouts/${job.layoutId}/edits`, { base: 0, edits }).expect(200);
    await freeze(job, { seq: 1, nest: await searched(job) }).expect(201);

    const { body } = await decide(designer, job, 1, 'sign-off').expect(409);

    expect(body.code).toBe('plan_refused');
    expect(body.issues.length).toBeGreaterThan(0);
    expect(body.issues[0].path).toMatch(/^findings\./);
  });

  it('answers not_found for a revision that is not there', async () => {
    const job = await scullery();
    await decide(designer, job, 1, 'sign-off').expect(404);
    await installer.get(`/jobs/${job.id}/revisions/1`).expect(404);
    await installer.get(`/jobs/${job.id}/revisions/first`).expect(404);
  });
});

describe('an accepted finding', () => {
  const accept = (finding: string) => ({
    id: randomUUID(),
    kind: 'acceptFinding',
    finding,
    accepted: { reason: 'Looked at.', by: 'Ilse', at: '2026-12-01' },
  });

  it('is an edit for designer and owner; from others it comes back', async () => {
    const job = await scullery();
    const path = `/layouts/${job.layoutId}/edits`;
    const { body } = await installer.post(path, { base: 0, edits: [accept('miter-opens')] }).expect(409);
    await designer.post(path, { base: 0, edits: [accept('miter-opens')] }).expect(200);

    expect(body.refused[0].reason).toBe('Only a designer or the owner accepts what was found.');
  });

  it('cannot be smuggled in with a whole layout', async () => {
    const job = await scullery();
    const { body: held } = await installer.get(`/layouts/${job.layoutId}`).expect(200);
    const accepted = { 'miter-opens': accept('miter-opens').accepted };
    const replace = (layout: object) => ({ id: randomUUID(), kind: 'replaceLayout', layout });
    const path = `/layouts/${job.layoutId}/edits`;

    await installer.post(path, { base: 0, edits: [replace({ ...held.layout, accepted })] }).expect(409);
    await installer.post(path, { base: 0, edits: [replace(held.layout)] }).expect(200);
  });
});

describe('canonicalJson', () => {
  it('gives one text for one value, whatever the order of its keys', () => {
    expect(canonicalJson({ b: [1, { d: null, c: 'ö' }], a: -0 })).toBe('{"a":0,"b":[1,{"c":"ö","d":null}]}');
    expect(canonicalJson({ a: 0, b: [1, { c: 'ö', d: null }] })).toBe(
      canonicalJson({ b: [1, { d: null, c: 'ö' }], a: 0 }),
    );
  });

  it('sorts and writes numbers as RFC 8785, 3.2.3 and appendix B show', () => {
    // The example of 3.2.3 and four numbers of appendix B.
    const example = {
      '\u20ac': 'Euro Sign',
      '\r': 'Carriage Return',
      '1': 'One',
      '\ufb33': 'Hebrew Letter Dalet With Dagesh',
    };
    expect(canonicalJson(example)).toBe(
      '{"\\r":"Carriage Return","1":"One","\u20ac":"Euro Sign","\ufb33":"Hebrew Letter Dalet With Dagesh"}',
    );
    expect(canonicalJson([333333333.33333329, 1e30, 4.5, 2e-3, 1e-27])).toBe(
      '[333333333.3333333,1e+30,4.5,0.002,1e-27]',
    );
  });

  it('leaves out what is undefined, as JSON does, and refuses what JSON cannot say', () => {
    expect(canonicalJson({ a: undefined, b: [undefined] })).toBe('{"b":[null]}');
    expect(() => canonicalJson([Number.NaN])).toThrow('JSON has no NaN');
    expect(() => canonicalJson(() => 1)).toThrow('JSON has no function');
  });
});
