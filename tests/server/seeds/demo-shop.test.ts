import { readFileSync } from 'node:fs';
import path from 'node:path';

import { pino } from 'pino';
import request from 'supertest';

import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { createApp } from '@/server/app';
import { presentDemoSignIns } from '@/server/demo-sign-ins';
import { seedWhenEmpty } from '@/server/db/migrate';
import { thumbnailOf } from '@/server/services/thumbnail';
import { DEMO_JOBS } from '@/shared/layout/demo/demo-jobs';
import { DEMO_RACK, DEMO_SLABS } from '@/shared/layout/demo/demo-stock';
import { parseJobFile } from '@/shared/layout/parse-job-file';
import { freshDatabase, type TestDatabase } from '@/tests/helpers/database';
import { TEST_CONFIG } from '@/tests/helpers/test-server';

let database: TestDatabase;

beforeAll(async () => {
  database = await freshDatabase('demo');
});

afterAll(() => database.drop());

function seedFile(name: string): unknown {
  return JSON.parse(readFileSync(path.resolve(__dirname, `../../../seeds/demo/${name}.json`), 'utf8'));
}

describe('seeds/demo', () => {
  it.each(Object.entries(DEMO_JOBS))('%s.json is what its job file gives today', (name, file) => {
    const parsed = parseJobFile(file);

    expect(parsed.ok).toBe(true);
    if (!parsed.ok) return;
    const thumbnail = thumbnailOf(parsed.layout, DEFAULT_SETTINGS);
    const fresh = { name: parsed.name, doc: parsed.layout, thumbnail };
    expect(seedFile(name)).toEqual(JSON.parse(JSON.stringify(fresh)));
  });

  it('stock.json is what the demo stock gives today', () => {
    expect(seedFile('stock')).toEqual({ slabs: DEMO_SLABS, rack: DEMO_RACK });
  });
});

describe('the demo shop', () => {
  it('lets its four people in with the passwords that the server prints', async () => {
    const app = createApp({ config: TEST_CONFIG, db: database.db, log: pino({ level: 'silent' }) });
    const signIns = await presentDemoSignIns(database.db);

    expect(signIns.map(({ role }) => role).sort()).toEqual(['designer', 'installer', 'owner', 'shop_hand']);
    for (const { email, password, role } of signIns) {
      const { body } = await request(app).post('/api/v1/auth/sign-in').send({ email, password }).expect(200);
      expect(body.me.role).toBe(role);
      const jobs = await request(app)
        .get('/api/v1/jobs')
        .set('Authorization', `Bearer ${body.accessToken}`)
        .expect(200);
      expect(jobs.body.items.map((job: { number: number }) => job.number)).toEqual([1, 2, 3, 4]);
      expect(jobs.body.items.every((job: { thumbnail: unknown }) => job.thumbnail !== null)).toBe(true);
    }
  });

  it('opens each of its four layouts', async () => {
    const app = createApp({ config: TEST_CONFIG, db: database.db, log: pino({ level: 'silent' }) });
    const [owner] = await presentDemoSignIns(database.db);
    const session = await request(app)
      .post('/api/v1/auth/sign-in')
      .send(owner && { email: owner.email, password: owner.password });
    const layouts = await database.db('layouts').pluck<string[]>('id');

    expect(layouts).toHaveLength(4);
    for (const id of layouts) {
      const { body } = await request(app)
        .get(`/api/v1/layouts/${id}`)
        .set('Authorization', `Bearer ${session.body.accessToken as string}`)
        .expect(200);
      expect(body.layout.room.walls.length).toBeGreaterThanOrEqual(3);
    }
  });

  it('is filled once and not again', async () => {
    expect(await seedWhenEmpty(database.db)).toBe(false);
    expect(await database.db('jobs').count('id as n').first()).toEqual({ n: 4 });
  });
});
