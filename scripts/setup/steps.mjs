// @ts-check

/** Where lines cannot be rewritten, a step that goes on says so once in this time, ms. */
const NEXT_LINE_MS = 10_000;

/**
 * Says what is being done, how long it has been going on, and how it ended.
 *
 * @template T
 * @param {string} title - such as 'Installing npm packages'
 * @param {() => Promise<T>} work
 * @param {(result: T) => string} [outcome] - what to say of the result, 'done' unless given
 * @returns {Promise<T>} what `work` gives
 */
export async function step(title, work, outcome = () => 'done') {
  const out = process.stdout;
  const began = Date.now();
  const finish = (/** @type {string} */ word) => {
    const line = `${title}: ${word} in ${took(began)}`;
    out.write(out.isTTY ? `\r${line}\x1b[K\n` : `${line}\n`);
  };
  out.write(out.isTTY ? `${title} ...` : `${title} ...\n`);
  const timer = setInterval(
    () => out.write(out.isTTY ? `\r${title} ... ${took(began)}` : `${title} ... ${took(began)}\n`),
    out.isTTY ? 1_000 : NEXT_LINE_MS,
  );
  try {
    const result = await work();
    finish(outcome(result));
    return result;
  } catch (error) {
    finish('stopped');
    throw error;
  } finally {
    clearInterval(timer);
  }
}

/**
 * @param {number} began - ms since 1970
 * @returns {string} such as '0.4 s' or '75 s'
 */
export function took(began) {
  const seconds = (Date.now() - began) / 1000;
  return seconds < 10 ? `${seconds.toFixed(1)} s` : `${Math.round(seconds)} s`;
}
