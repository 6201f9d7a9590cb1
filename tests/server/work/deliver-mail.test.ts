import { SMTPServer } from 'smtp-server';
import type { AddressInfo } from 'node:net';
import { pino } from 'pino';

import { outboxOnlyTransport, smtpTransport } from '@/server/mail/mail-transport';
import { invitationMail, resetMail } from '@/server/mail/mail-texts';
import { sweep } from '@/server/repositories/sweep-repository';
import { deliverMail } from '@/server/work/deliver-mail';
import { startWork } from '@/server/work/start-work';
import { openTestServer, TEST_CONFIG, type TestServer } from '@/tests/helpers/test-server';

let server: TestServer;
let smtp: SMTPServer;
let smtpUrl: string;
let received: { to: string; from: string; text: string }[];

beforeAll(async () => {
  server = await openTestServer();
  smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onRcptTo: ({ address }, _session, done) =>
      done(address.startsWith('refused') ? Object.assign(new Error('no such person'), { responseCode: 550 }) : null),
    onData(stream, { envelope }, done) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('end', () => {
        const from = envelope.mailFrom === false ? '' : envelope.mailFrom.address;
        received.push({ to: envelope.rcptTo[0]?.address ?? '', from, text: Buffer.concat(chunks).toString('utf8') });
        done();
      });
    },
  });
  await new Promise<void>((resolve) => smtp.listen(0, '127.0.0.1', () => resolve()));
  smtpUrl = `smtp://127.0.0.1:${(smtp.server.address() as AddressInfo).port}`;
});

afterAll(async () => {
  await new Promise<void>((resolve) => smtp.close(() => resolve()));
  await server.close();
});

beforeEach(async () => {
  received = [];
  await server.db('outbox').delete();
});

async function put(to: string): Promise<void> {
  const text = resetMail('Odile Karrasch', 'http://localhost:8080/reset?token=abc', 60);
  const { subject, body } = text;
  await server.db('outbox').insert({ shop_id: server.shop.id, kind: 'reset', to_address: to, subject, body });
}

const transport = () => smtpTransport(smtpUrl, 'Tidewater Tops <office@tidewater-tops.example>');

describe('deliverMail', () => {
  it('sends what waits, once, and wipes the link from the outbox', async () => {
    await put('odile@tidewater-tops.example');

    expect(await deliverMail(server.db, transport())).toEqual({ sent: 1, failed: 0 });
    expect(await deliverMail(server.db, transport())).toEqual({ sent: 0, failed: 0 });

    expect(received).toHaveLength(1);
    expect(received[0]).toMatchObject({ to: 'odile@tidewater-tops.example', from: 'office@tidewater-tops.example' });
    expect(received[0]?.text).toContain('Subject: A new password for Offsquare');
    expect(received[0]?.text.replaceAll('=\r\n', '')).toContain('/reset?token=3Dabc');
    expect(await server.db('outbox').first('body', 'attempts')).toEqual({ body: '', attempts: 1 });
  });

  it('sends each mail once when two processes deliver at the same moment', async () => {
    for (let n = 0; n < 6; n++) await put(`person-${n}@tidewater-tops.example`);
    await Promise.all([deliverMail(server.db, transport()), deliverMail(server.db, transport())]);

    expect(new Set(received.map(({ to }) => to)).size).toBe(6);
    expect(received).toHaveLength(6);
  });

  it('tries again after a minute, ten, an hour and six, then gives up, and goes on with the others', async () => {
    await put('refused@tidewater-tops.example');
    await put('odile@tidewater-tops.example');
    const waits: number[] = [];
    for (let n = 0; n < 5; n++) {
      await server.db('outbox').update({ send_after: new Date(Date.now() - 1000) });
      await deliverMail(server.db, transport());
      const row = await server.db('outbox').where({ to_address: 'refused@tidewater-tops.example' }).first();
      if (row.given_up_at === null) waits.push(Math.round((row.send_after.getTime() - Date.now()) / 60_000));
    }
    const refused = await server.db('outbox').where({ to_address: 'refused@tidewater-tops.example' }).first();

    expect(waits).toEqual([1, 10, 60, 360]);
    expect(refused).toMatchObject({ attempts: 5, sent_at: null, last_error: 'EENVELOPE' });
    expect(refused.given_up_at).not.toBeNull();
    expect(received.map(({ to }) => to)).toEqual(['odile@tidewater-tops.example']);
  });

  it('keeps the mail readable in the outbox of a shop without a mail server', async () => {
    await put('odile@tidewater-tops.example');
    await deliverMail(server.db, outboxOnlyTransport());
    const row = await server.db('outbox').first();

    expect(row.sent_at).not.toBeNull();
    expect(row.body).toContain('/reset?token=abc');
  });

  it('notes no address in the error', async () => {
    await put('odile@tidewater-tops.example');
    await deliverMail(server.db, smtpTransport('smtp://127.0.0.1:1', 'office@tidewater-tops.example'));

    expect(await server.db('outbox').first('last_error')).toEqual({ last_error: 'ESOCKET' });
  });
});

describe('startWork', () => {
  it('delivers by itself and ends when it is told to', async () => {
    const work = startWork({ config: { ...TEST_CONFIG, smtpUrl }, db: server.db, log: pino({ level: 'silent' }) });
    await put('odile@tidewater-tops.example');
    while (received.length === 0) await new Promise((resolve) => setTimeout(resolve, 50));
    await work.stop();

    expect(received[0]?.from).toBe('no-reply@localhost');
    expect(await server.db('outbox').whereNull('sent_at')).toEqual([]);
  });
});

describe('sweep', () => {
  it('deletes sign-ins a week after they ran out and keys after three days, and no others', async () => {
    const days = (n: number) => new Date(Date.now() - n * 86_400_000);
    const { id } = server.shop.people.owner;
    const signIn = { person_id: id, shop_id: server.shop.id, purpose: 'session', family: id };
    const hash = (n: number) => Buffer.alloc(32, n);
    await server.db('sign_ins').insert([
      { ...signIn, token_hash: hash(1), expires_at: days(8) },
      { ...signIn, token_hash: hash(2), expires_at: days(6) },
    ]);
    const key = { shop_id: server.shop.id, person_id: id, request_hash: hash(0) };
    await server.db('idempotency_keys').insert([
      { ...key, key: 'four days', created_at: days(4) },
      { ...key, key: 'two days', created_at: days(2) },
    ]);

    expect(await server.db.transaction(sweep)).toEqual({ signIns: 1, keys: 1 });
    expect(await server.db('idempotency_keys').pluck('key')).toEqual(['two days']);
  });
});

describe('invitationMail', () => {
  it('says who asks, into which shop, as what, and how long the link works', () => {
    const { subject, body } = invitationMail(
      'Tidewater Tops',
      'Maren',
      'shop_hand',
      'http://x.example/join?token=t',
      7,
    );

    expect(subject).toBe('Tidewater Tops asks you to join on Offsquare');
    expect(body).toContain('Maren asks you to join Tidewater Tops as shop hand.');
    expect(body).toContain('for 7 days');
  });
});
