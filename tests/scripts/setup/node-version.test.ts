import { nodeVersionProblem } from '@/scripts/setup/node-version.mjs';

describe('nodeVersionProblem', () => {
  it.each(['20.19.4', '20.20.0', '22.1.0', '30.0.0'])('takes Node.js %s', (version) => {
    expect(nodeVersionProblem(version)).toBeNull();
  });

  it.each(['20.19.3', '20.9.9', '18.20.8', '8.17.0'])(
    'refuses Node.js %s and names the version to install',
    (version) => {
      expect(nodeVersionProblem(version)).toBe(
        `Node.js ${version} is too old: install Node.js 20.19.4 or newer, then run the same command again.`,
      );
    },
  );
});
