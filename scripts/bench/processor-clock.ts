import { existsSync, readFileSync } from 'node:fs';

/** Linux: first figure = nanoseconds that this thread has run (kernel documentation, scheduler/sched-stats). */
const SCHEDSTAT = '/proc/thread-self/schedstat';
/** Wall ms for which a reading is good enough: each costs some twenty microseconds. */
const READ_EVERY = 1;

const hasThreadTime = existsSync(SCHEDSTAT);
let readAt = -Infinity;
let reading = 0;

/**
 * Processor ms of this thread so far, brought up to date by the kernel every few ms: neither other programs on the machine
 * nor the compiler's own threads count. Where the system does not tell it, that of the whole process.
 */
export function processorMs(): number {
  const now = performance.now();
  if (now < readAt + READ_EVERY) return reading;
  readAt = now;
  reading = hasThreadTime ? threadMs() : processMs();
  return reading;
}

const threadMs = (): number => Number(readFileSync(SCHEDSTAT, 'utf8').split(' ')[0]) / 1e6;

function processMs(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}
