// @ts-check

/** A step that takes longer than this says that it is still at it, ms. */
const FIRST_WORD_MS = 2_000;
/** Where lines cannot be rewritten, one line in this time, ms. */
const NEXT_LINE_MS = 10_000;

/**
 * Says what is being done, how long it has been going on, and how long it took.
 *
 * @template T
 * @param {string} title - such as 'Installing npm packages'
 * @param {() => Promise<T>} work
 * @param {NodeJS.WriteStream} [out]
 * @returns {Promise<T>} what `work` gives
 */
export async function step(title, work, out = process.stdout) {
  const began = Date.now();
  const seconds = () => Math.round((Date.now() - began) / 1000);
  out.write(out.isTTY ? `${title} ...` : `${title} ...\n`);
  const every = out.isTTY ? 1_000 : NEXT_LINE_MS;
  const timer = setInterval(() => {
    if (out.isTTY && Date.now() - began >= FIRST_WORD_MS) out.write(`\r${title} ... ${seconds()} s`);
    if (!out.isTTY) out.write(`  ${title}: ${seconds()} s so far\n`);
  }, every);
  try {
    const result = await work();
    out.write(out.isTTY ? `\r${title}: done in ${took(began)}\x1b[K\n` : `${title}: done in ${took(began)}\n`);
    return result;
  } catch (error) {
    out.write(
      out.isTTY ? `\r${title}: stopped after ${took(began)}\x1b[K\n` : `${title}: stopped after ${took(began)}\n`,
    );
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
