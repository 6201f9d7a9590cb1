// @ts-check

/** Something a person has to put right; its message is one sentence with the way out. */
export class SetupProblem extends Error {
  /** @param {string} message */
  constructor(message) {
    super(message);
    this.name = 'SetupProblem';
  }
}

/** The person stopped the program; nothing went wrong. */
export class Interrupted extends Error {
  /** @param {NodeJS.Signals} signal */
  constructor(signal) {
    super(`Stopped by ${signal}`);
    this.name = 'Interrupted';
    this.signal = signal;
  }
}

/** What shells give a program that ended by the signal. @type {Partial<Record<NodeJS.Signals, number>>} */
const SIGNAL_EXIT_CODES = { SIGHUP: 129, SIGINT: 130, SIGTERM: 143 };

const FULL_DISK = /ENOSPC|no space left on device|could not extend file|not enough space|disk quota exceeded|EDQUOT/i;

/**
 * Tells whether a text that a program wrote, or an error's message, says that the disk is full.
 *
 * @param {string} text
 */
export function saysDiskFull(text) {
  return FULL_DISK.test(text);
}

/**
 * @param {string} where - folder that could not be written
 * @returns {SetupProblem}
 */
export function diskFull(where) {
  return new SetupProblem(
    `The disk that holds ${where} is full: free some space there, then run the same command again.`,
  );
}

/**
 * Turns any failure of a set-up step into one sentence for the person at the keyboard.
 *
 * @param {unknown} error
 * @param {string} where - folder the step was writing to
 * @returns {string}
 */
export function sentenceFor(error, where) {
  if (error instanceof SetupProblem) return error.message;
  const failure = /** @type {NodeJS.ErrnoException} */ (error);
  const text = failure instanceof Error ? failure.message : String(error);
  if (saysDiskFull(text)) return diskFull(failure.path ?? where).message;
  if (failure.code === 'EACCES' || failure.code === 'EPERM' || failure.code === 'EROFS') {
    return `${failure.path ?? where} cannot be written by this user: give this user the right to write there, or use a checkout of your own.`;
  }
  return text;
}

/**
 * @param {unknown} error
 * @returns {number} what the program should exit with, never 0
 */
export function exitCodeFor(error) {
  return (error instanceof Interrupted && SIGNAL_EXIT_CODES[error.signal]) || 1;
}
