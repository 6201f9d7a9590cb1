import { ensureDebianPackages } from '@/scripts/setup/debian-packages.mjs';

interface Answer {
  readonly code: number;
  readonly output: string;
}

const DONE: Answer = { code: 0, output: '' };

/** A machine on which `answers` are given in order, and what was asked of it is kept. */
function machine(uid: number, programs: readonly string[], answers: readonly Answer[]) {
  const asked: string[] = [];
  return {
    asked,
    uid,
    find: (program: string) => (programs.includes(program) ? `/usr/bin/${program}` : null),
    run: async (command: string, args: readonly string[]) => {
      asked.push([command, ...args].join(' '));
      return answers[asked.length - 1] ?? DONE;
    },
  };
}

/** Missing until it has been looked for once. */
function missingAtFirst(name: string, insteadOf?: string) {
  let looked = false;
  const present = () => {
    const was = looked;
    looked = true;
    return was;
  };
  return { name, present, ...(insteadOf ? { insteadOf } : {}) };
}

const INSTALL =
  'env DEBIAN_FRONTEND=noninteractive apt-get -q -o DPkg::Lock::Timeout=120 install -y --no-install-recommends';

beforeEach(() => {
  jest.spyOn(process.stdout, 'write').mockReturnValue(true);
});

afterEach(() => jest.restoreAllMocks());

describe('ensureDebianPackages', () => {
  it('asks nothing of the machine when everything is here', async () => {
    const here = machine(0, ['apt-get'], []);
    await ensureDebianPackages([{ name: 'chromium', present: () => true }], here);
    expect(here.asked).toEqual([]);
  });

  it('installs only what is missing, in one go, when root runs it', async () => {
    const here = machine(0, ['apt-get'], []);
    await ensureDebianPackages(
      [missingAtFirst('chromium'), { name: 'postgresql', present: () => true }, missingAtFirst('poppler-utils')],
      here,
    );
    expect(here.asked).toEqual([`${INSTALL} chromium poppler-utils`]);
  });

  it('uses sudo for others when it asks for no password', async () => {
    const here = machine(1000, ['apt-get', 'sudo'], []);
    await ensureDebianPackages([missingAtFirst('chromium')], here);
    expect(here.asked).toEqual(['sudo -n true', `sudo -n ${INSTALL} chromium`]);
  });

  it('fetches the package lists once when the first try fails', async () => {
    const here = machine(0, ['apt-get'], [{ code: 100, output: 'E: Unable to locate package chromium' }]);
    await ensureDebianPackages([missingAtFirst('chromium')], here);
    expect(here.asked.map((command) => command.split(' ')[6])).toEqual(['install', 'update', 'install']);
  });

  it.each([
    ['sudo wants a password', ['apt-get', 'sudo'], [{ code: 1, output: 'sudo: a password is required' }]],
    ['there is no sudo', ['apt-get'], []],
    ['there is no apt-get', ['sudo'], []],
  ])('says in one sentence what to run when %s', async (_, programs, answers) => {
    const wish = ensureDebianPackages(
      [missingAtFirst('postgresql', 'set DATABASE_URL to a PostgreSQL server you have')],
      machine(1000, programs, answers),
    );
    await expect(wish).rejects.toThrow(
      'This needs postgresql from Debian\'s packages, and this user may not install: run "sudo apt-get install -y ' +
        '--no-install-recommends postgresql", or set DATABASE_URL to a PostgreSQL server you have.',
    );
  });

  it('tells a full disk from other failures', async () => {
    const full = { code: 100, output: 'dpkg: error: write failed (No space left on device)' };
    const wish = ensureDebianPackages([missingAtFirst('chromium')], machine(0, ['apt-get'], [full]));
    await expect(wish).rejects.toThrow('The disk that holds / is full');
  });

  it("passes on apt-get's own reason when it fails twice", async () => {
    const lost = { code: 100, output: 'Reading lists\nE: Unable to locate package chromium\n' };
    const wish = ensureDebianPackages([missingAtFirst('chromium')], machine(0, ['apt-get'], [lost, DONE, lost]));
    await expect(wish).rejects.toThrow(
      'apt-get could not install chromium (E: Unable to locate package chromium): put that right, then run the same command again.',
    );
  });
});
