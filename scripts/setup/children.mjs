// @ts-check
import { spawn } from 'node:child_process';

import { Interrupted } from './problem.mjs';

/** How long a program may take to end after being asked, ms. */
const PATIENCE_MS = 10_000;

/** @type {Set<import('node:child_process').ChildProcess>} */
const running = new Set();

/** @type {NodeJS.Signals | null} */
let stoppedBy = null;

/**
 * @typedef {object} Ended
 * @property {number} code - exit code; 1 when a signal ended it
 * @property {string} output - everything it wrote, unless it wrote to the terminal
 */

/**
 * Runs a program to its end. It gets a process group of its own, so that a signal to us can be passed on to it and
 * to whatever it started.
 *
 * @param {string} command
 * @param {readonly string[]} args
 * @param {{cwd?: string, env?: NodeJS.ProcessEnv, show?: boolean, onOutput?: (text: string) => void}} [options]
 *   `show` lets it write to the terminal; otherwise its output is collected, and passed to `onOutput` as it comes
 * @returns {Promise<Ended>}
 * @throws {Interrupted} when the person stops us while it runs
 */
export function run(command, args, { cwd, env = process.env, show = false, onOutput } = {}) {
  if (stoppedBy) return Promise.reject(new Interrupted(stoppedBy));
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      cwd,
      env,
      detached: true,
      stdio: show ? ['ignore', 'inherit', 'inherit'] : ['ignore', 'pipe', 'pipe'],
    });
    running.add(child);
    let output = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream?.setEncoding('utf8').on('data', (text) => {
        output += text;
        onOutput?.(text);
      });
    }
    child.once('error', (error) => {
      running.delete(child);
      reject(error);
    });
    child.once('close', (code) => {
      running.delete(child);
      if (stoppedBy) reject(new Interrupted(stoppedBy));
      else resolve({ code: code ?? 1, output });
    });
  });
}

/**
 * Starts a program that stays, with a message channel to it: when we vanish, even by SIGKILL, the channel closes and
 * the program can end itself.
 *
 * @param {string} command
 * @param {readonly string[]} args
 * @param {{cwd: string, env: NodeJS.ProcessEnv}} options
 * @returns {Promise<Ended>} settles when it ends; code 0 also when it closed down as it should after a signal
 * @throws {Interrupted} when a signal ended it before it could
 */
export function runUntilStopped(command, args, { cwd, env }) {
  if (stoppedBy) return Promise.reject(new Interrupted(stoppedBy));
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd, env, detached: true, stdio: ['ignore', 'inherit', 'inherit', 'ipc'] });
    running.add(child);
    child.once('error', (error) => {
      running.delete(child);
      reject(error);
    });
    child.once('exit', (code) => {
      running.delete(child);
      if (stoppedBy && code !== 0) reject(new Interrupted(stoppedBy));
      else resolve({ code: code ?? 1, output: '' });
    });
  });
}

/**
 * From now on Ctrl-C, SIGTERM and a closed terminal end the running program first; the call that waited for it then
 * throws `Interrupted`, so that every step can clean up behind itself.
 */
export function passSignalsOn() {
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      // A second Ctrl-C means: now.
      const kind = stoppedBy ? 'SIGKILL' : 'SIGTERM';
      stoppedBy ??= signal;
      for (const child of running) signalGroup(child, kind);
      setTimeout(() => {
        for (const child of running) signalGroup(child, 'SIGKILL');
      }, PATIENCE_MS).unref();
    });
  }
}

/** @throws {Interrupted} when the person has asked us to stop */
export function checkStopped() {
  if (stoppedBy) throw new Interrupted(stoppedBy);
}

/**
 * @param {import('node:child_process').ChildProcess} child
 * @param {NodeJS.Signals} signal
 */
function signalGroup(child, signal) {
  if (child.pid === undefined) return;
  try {
    process.kill(-child.pid, signal);
  } catch {
    // It has ended between the check and the signal.
  }
}
