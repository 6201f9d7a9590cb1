// @ts-check
// Kept to syntax that very old versions of Node.js can read: this file has to run on them to refuse them.

/** Oldest version that the bundler and React Native accept. */
export const OLDEST_NODE = '20.19.4';

/**
 * @param {string} version - as in `process.versions.node`
 * @returns {string | null} one sentence with the way out when this Node.js is too old
 */
export function nodeVersionProblem(version) {
  const have = version.split('.').map(Number);
  const need = OLDEST_NODE.split('.').map(Number);
  for (let i = 0; i < need.length; i += 1) {
    const difference = (have[i] || 0) - (need[i] || 0);
    if (difference > 0) return null;
    if (difference < 0) {
      return `Node.js ${version} is too old: install Node.js ${OLDEST_NODE} or newer, then run the same command again.`;
    }
  }
  return null;
}
