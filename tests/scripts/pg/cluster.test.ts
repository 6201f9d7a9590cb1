import { mkdtempSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { createServer, type Server } from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';

import { Client } from 'pg';

import { clusterState, clusterUrl, destroyCluster, startCluster, stopCluster } from '@/scripts/pg/cluster.mjs';
import { handOver } from '@/scripts/pg/home.mjs';
import { canListen, processesIn } from '@/scripts/pg/postmaster.mjs';

let home: string;

function newHome(): string {
  // The user that runs PostgreSQL for root cannot enter a private TMPDIR of root's.
  const folder = mkdtempSync(path.join(process.getuid?.() === 0 ? '/tmp' : os.tmpdir(), 'offsquare-cluster-'));
  handOver(folder);
  return folder;
}

beforeAll(() => {
  home = newHome();
});

afterEach(() => stopCluster(home));

afterAll(() => destroyCluster(home));

/** Most of these need no disk that is safe against a power cut. */
const start = () => startCluster(home, { throwaway: true });

async function killServer(): Promise<void> {
  const pid = Number(readFileSync(path.join(home, 'data/postmaster.pid'), 'utf8').split('\n')[0]);
  process.kill(pid, 'SIGKILL');
  while (processesIn(path.join(home, 'data')).includes(pid)) await sleep(10);
}

async function ask(url: string, sql: string): Promise<unknown[]> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query(sql)).rows;
  } finally {
    await client.end();
  }
}

describe('startCluster', () => {
  it('keeps the data from one start to the next', async () => {
    const first = await startCluster(home);
    expect(first.startedNow).toBe(true);
    await ask(first.url, 'create table walls as select 96.25::float8 as length');
    expect(await stopCluster(home)).toBe(true);
    expect(await clusterState(home)).toBe('stopped');

    const second = await startCluster(home);
    expect(await ask(second.url, 'select length from walls')).toEqual([{ length: 96.25 }]);
  });

  it('finds a cluster that runs already', async () => {
    const { url } = await start();
    expect(await start()).toEqual({ url, startedNow: false });
  });

  it('listens on loopback alone, wants the password, and keeps it from other users', async () => {
    const { url } = await start();
    expect(await ask(url, 'show listen_addresses')).toEqual([{ listen_addresses: '127.0.0.1' }]);
    expect(await ask(url, 'show unix_socket_directories')).toEqual([{ unix_socket_directories: '' }]);
    const guess = new URL(url);
    guess.password = 'guess';
    await expect(ask(guess.href, 'select 1')).rejects.toMatchObject({ code: '28P01' });
    expect(statSync(path.join(home, 'conn.json')).mode & 0o777).toBe(0o600);
  });

  it("starts again after its server was killed, with the killed server's note still there", async () => {
    const { url } = await startCluster(home);
    await ask(url, 'create table corners as select 91.5::float8 as angle');
    await killServer();
    const again = await startCluster(home);
    expect(again.startedNow).toBe(true);
    expect(await ask(again.url, 'select angle from corners')).toEqual([{ angle: 91.5 }]);
  });

  it('is not misled by a note whose number belongs to another program by now', async () => {
    await start();
    const note = path.join(home, 'data/postmaster.pid');
    const text = readFileSync(note, 'utf8');
    await stopCluster(home);
    writeFileSync(note, text.replace(/^\d+/, String(process.pid)));
    expect(await clusterState(home)).toBe('stopped');
    expect(await stopCluster(home)).toBe(false);
    expect((await start()).startedNow).toBe(true);
  });

  it('moves to another port when somebody has taken its own, and stays there', async () => {
    const { url } = await start();
    await stopCluster(home);
    const taken = await occupy(Number(new URL(url).port));
    try {
      const moved = await start();
      expect(new URL(moved.url).port).not.toBe(new URL(url).port);
      expect(clusterUrl(home)).toBe(moved.url);
      expect(await ask(moved.url, 'select 1 as one')).toEqual([{ one: 1 }]);
    } finally {
      taken.close();
    }
  });

  it('says which version is missing when the data is of one that is not installed', async () => {
    await start();
    await stopCluster(home);
    const versionFile = path.join(home, 'data/PG_VERSION');
    const version = readFileSync(versionFile, 'utf8');
    writeFileSync(versionFile, '9\n');
    await expect(start()).rejects.toThrow(
      `The data in ${home}/data was written by PostgreSQL 9, which is not installed: install postgresql-9.`,
    );
    writeFileSync(versionFile, version);
  });
});

describe('stopCluster', () => {
  it('leaves no process behind', async () => {
    await start();
    expect(processesIn(path.join(home, 'data')).length).toBeGreaterThan(0);
    await stopCluster(home);
    expect(processesIn(path.join(home, 'data'))).toEqual([]);
  });

  it('has nothing to do where nothing runs', async () => {
    expect(await stopCluster(home)).toBe(false);
    const empty = newHome();
    expect(await clusterState(empty)).toBe('absent');
    expect(await stopCluster(empty)).toBe(false);
    await destroyCluster(empty);
  });
});

async function occupy(port: number): Promise<Server> {
  const server = createServer();
  await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve));
  expect(await canListen(port)).toBe(false);
  return server;
}
