// @ts-check
import { existsSync, readdirSync, readFileSync, readlinkSync, realpathSync } from 'node:fs';
import { createServer, connect } from 'node:net';
import path from 'node:path';

/** Below the range from which Linux picks ports for outgoing connections, so that a stopped server's port stays free. */
const FIRST_PORT = 15432;
const PORTS = 1000;
const LOOPBACK = '127.0.0.1';

/**
 * What runs on a data folder: 'running' answers on its port, 'busy' is starting or stopping, 'stopped' has nothing.
 *
 * @param {string} data
 * @returns {Promise<{state: 'running' | 'busy' | 'stopped', port: number | null}>}
 */
export async function serverState(data) {
  const file = pidFile(data);
  // A pid file alone proves nothing: it outlives a killed server, and its number may be another program's by now.
  if (!file || !processesIn(data).includes(file.pid)) return { state: 'stopped', port: null };
  const answers = file.port !== null && (await answersOn(file.port));
  return { state: answers ? 'running' : 'busy', port: file.port };
}

/**
 * @param {string} data
 * @returns {{pid: number, port: number | null} | null} what the server wrote into its pid file
 */
function pidFile(data) {
  const file = path.join(data, 'postmaster.pid');
  if (!existsSync(file)) return null;
  const lines = readFileSync(file, 'utf8').split('\n');
  const port = Number(lines[3]);
  return { pid: Number(lines[0]), port: Number.isInteger(port) && port > 0 ? port : null };
}

/**
 * Lists the live processes that work in a folder; a PostgreSQL server and its helpers work in their data folder.
 *
 * @param {string} data
 * @returns {number[]}
 */
export function processesIn(data) {
  if (!existsSync(data)) return [];
  const folder = realpathSync(data);
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .map(Number)
    .filter((pid) => {
      try {
        // Ended processes that nobody has collected yet have no folder any more.
        return readlinkSync(`/proc/${pid}/cwd`) === folder;
      } catch {
        return false;
      }
    });
}

/**
 * @param {number} port
 * @returns {Promise<boolean>} whether something listens there
 */
export function answersOn(port) {
  return new Promise((resolve) => {
    const socket = connect({ port, host: LOOPBACK });
    const finish = (/** @type {boolean} */ answer) => {
      socket.destroy();
      resolve(answer);
    };
    socket.setTimeout(1_000, () => finish(false));
    socket.once('connect', () => finish(true));
    socket.once('error', () => finish(false));
  });
}

/**
 * Finds a port nobody listens on.
 *
 * @param {number} seed - where in the range to begin, so that two checkouts seldom try the same one
 * @returns {Promise<number>}
 */
export async function freePort(seed) {
  for (let tried = 0; tried < PORTS; tried += 1) {
    const port = FIRST_PORT + ((seed + tried) % PORTS);
    if (await canListen(port)) return port;
  }
  throw new Error(`no free port between ${FIRST_PORT} and ${FIRST_PORT + PORTS - 1}`);
}

/**
 * @param {number} port
 * @returns {Promise<boolean>}
 */
export function canListen(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host: LOOPBACK, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}
