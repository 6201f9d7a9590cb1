import { accessSync, constants } from 'node:fs';
import os from 'node:os';

import { temporaryFolder, withHome } from '@/scripts/setup/own-folders.mjs';

describe('withHome', () => {
  it('leaves an environment alone whose home can be written', () => {
    const environment = { NODE_ENV: 'test' as const, HOME: os.tmpdir() };
    expect(withHome(environment)).toBe(environment);
  });

  it.each([{ HOME: '/nonexistent' }, {}])('gives a user with %j a temporary home and npm a cache in it', (given) => {
    const { HOME, npm_config_cache: cache } = withHome({
      NODE_ENV: 'test',
      npm_config_cache: '/nonexistent/.npm',
      ...given,
    });
    expect(HOME).toBe(temporaryFolder('home'));
    expect(cache).toBe(`${HOME}/.npm`);
    expect(() => accessSync(String(HOME), constants.W_OK)).not.toThrow();
  });
});
