import { exitCodeFor, Interrupted, saysDiskFull, sentenceFor, SetupProblem } from '@/scripts/setup/problem.mjs';

function systemError(code: string, message: string, path?: string): NodeJS.ErrnoException {
  return Object.assign(new Error(`${code}: ${message}`), { code, path });
}

describe('sentenceFor', () => {
  it('passes on what a step has found out itself', () => {
    expect(sentenceFor(new SetupProblem('Port 8080 is taken.'), '/shop')).toBe('Port 8080 is taken.');
  });

  it('names the place whose disk is full', () => {
    const error = systemError('ENOSPC', 'no space left on device, write', '/shop/dist/index.html');
    expect(sentenceFor(error, '/shop')).toBe(
      'The disk that holds /shop/dist/index.html is full: free some space there, then run the same command again.',
    );
  });

  it('names the folder that this user may not write', () => {
    expect(sentenceFor(systemError('EACCES', 'permission denied, mkdir', '/shop/dist'), '/shop')).toBe(
      '/shop/dist cannot be written by this user: give this user the right to write there, or use a checkout of your own.',
    );
  });
});

describe('saysDiskFull', () => {
  it.each([
    'npm error code ENOSPC',
    'initdb: error: could not write to file "x": No space left on device',
    'ERROR:  could not extend file "base/5/1": No space left on device',
    "E: You don't have enough free space in /var/cache/apt/archives/. not enough space",
  ])('reads "%s" as a full disk', (text) => {
    expect(saysDiskFull(text)).toBe(true);
  });

  it('does not take another failure for it', () => {
    expect(saysDiskFull('npm error code E404')).toBe(false);
  });
});

describe('exitCodeFor', () => {
  it('gives 130 after Ctrl-C, 143 after SIGTERM and 1 for any failure', () => {
    expect(exitCodeFor(new Interrupted('SIGINT'))).toBe(130);
    expect(exitCodeFor(new Interrupted('SIGTERM'))).toBe(143);
    expect(exitCodeFor(new SetupProblem('x'))).toBe(1);
  });
});
