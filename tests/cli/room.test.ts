import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** The worked example of the file format, as a file writes it. */
const EXAMPLE = {
  units: 'in',
  closed: false,
  tapeSd: { fixed: 0.03125, perInch: 0.00026 },
  walls: [
    { id: 'A', length: '96 1/4' },
    {
      id: 'B',
      length: '118 5/8',
      profile: [
        { at: 0, off: 0 },
        { at: 60, off: -0.25 },
      ],
    },
    { id: 'C', length: 84 },
  ],
  corners: [
    { between: ['A', 'B'], nominal: 90, triangle: { a: 36, b: 48, c: '60 1/2' } },
    { between: ['B', 'C'], nominal: 90, angle: 88.7, sd: 0.2 },
  ],
  ties: [{ id: 't1', from: { wall: 'A', at: 0 }, to: { wall: 'C', at: 'end' }, length: '119 1/16', sd: 0.0625 }],
  trust: [],
  ignore: [],
  sketch: [
    [0, 0],
    [90, 0],
    [90, -100],
    [10, -100],
  ],
};

// Every case starts a process of its own, which a busy machine may take seconds over.
jest.setTimeout(60_000);

const PROGRAM = ['--import', 'tsx', 'server/cli/room.ts'];

interface Ran {
  readonly status: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

function run(args: readonly string[], input?: string): Ran {
  return spawnSync(process.execPath, [...PROGRAM, ...args], { encoding: 'utf8', input });
}

const room = (json: unknown): Ran => run(['-'], JSON.stringify(json));
const errorOf = (ran: Ran): { code: string; message: string; path: string } =>
  (JSON.parse(ran.stderr) as { error: { code: string; message: string; path: string } }).error;

describe('npm run -s room', () => {
  it('answers the worked example with one line of JSON and exit 0', () => {
    const ran = room(EXAMPLE);
    expect(ran).toMatchObject({ status: 0, stderr: '' });
    expect(ran.stdout.trim().split('\n')).toHaveLength(1);
    const out = JSON.parse(ran.stdout);
    expect(Object.keys(out)).toEqual([
      'points',
      'dof',
      'chi2',
      'chi2Limit',
      'walls',
      'corners',
      'ties',
      'suspects',
      'checkCorner',
      'next',
    ]);
    expect(out.points[1][0]).toBeCloseTo(96.2501, 4);
    expect(out.walls[0]).toMatchObject({ id: 'A', taped: 96.25 });
    expect(out.corners[0].angle).toBeCloseTo(91.003, 3);
    expect(out.corners[0].sd).toBeCloseTo(0.084, 3);
    expect(out.corners[1]).toMatchObject({ between: ['B', 'C'], measured: true, taped: 88.7 });
    expect(out.next).toMatchObject({ kind: 'tie', from: { wall: 'A', at: 'end' }, to: { wall: 'C', at: 'end' } });
    expect(out.next.worstCornerSdNow).toBeCloseTo(0.105, 3);
    expect(out.next.worstCornerSdThen).toBeLessThan(0.105);
  });

  it('reads a file, with a byte order mark or without', () => {
    const folder = mkdtempSync(join(tmpdir(), 'room-'));
    try {
      const file = join(folder, 'room.json');
      writeFileSync(file, `\uFEFF${JSON.stringify(EXAMPLE)}`);
      const text = execFileSync(process.execPath, [...PROGRAM, file], { encoding: 'utf8' });
      expect(JSON.parse(text).dof).toBe(1);
    } finally {
      rmSync(folder, { recursive: true });
    }
  });

  it('answers an array with an array in the same order, errors in their place, and exit 2', () => {
    const ran = room([EXAMPLE, { walls: [{ id: 'A', length: '96 1/3' }] }, { walls: [{ id: 'A', length: 96 }] }]);
    expect(ran).toMatchObject({ status: 2, stderr: '' });
    const [first, second, third] = JSON.parse(ran.stdout);
    expect(first.dof).toBe(1);
    expect(second).toEqual({
      error: { code: 'bad_length', message: expect.stringMatching(/divided into 3/), path: 'walls[0].length' },
    });
    expect(third.points).toEqual([
      [0, 0],
      [96, 0],
    ]);
  });

  it('answers an array of good rooms, even of none, with exit 0', () => {
    expect(room([EXAMPLE, EXAMPLE]).status).toBe(0);
    expect(room([])).toMatchObject({ status: 0, stdout: '[]\n' });
  });

  it('writes one JSON line on standard error for a bad input and exits 2', () => {
    const ran = room({ walls: [{ id: 'A', length: 96, len: 3 }] });
    expect(ran).toMatchObject({ status: 2, stdout: '' });
    expect(ran.stderr.trim().split('\n')).toHaveLength(1);
    expect(errorOf(ran)).toEqual({ code: 'unknown_key', message: 'Unknown key "len".', path: 'walls[0].len' });
  });

  it('names the wall that nothing fixes', () => {
    expect(errorOf(room({ walls: [{ id: 'A', length: 96 }, { id: 'B' }] }))).toMatchObject({
      code: 'undetermined',
      path: 'walls[1].length',
    });
  });

  it.each([
    ['no JSON', '{ "walls": ', 'bad_json'],
    ['no room', '42', 'bad_input'],
    ['no walls', '{}', 'bad_input'],
  ])('refuses %s with exit 2', (_, input, code) => {
    const ran = run(['-'], input);
    expect(ran.status).toBe(2);
    expect(errorOf(ran).code).toBe(code);
  });

  it.each([
    ['no file named', []],
    ['two files named', ['a.json', 'b.json']],
    ['an option it does not know', ['--sheets', 'out', '-']],
  ])('says how it is used when there is %s', (_, args) => {
    const ran = run(args, '{}');
    expect(ran.status).toBe(2);
    expect(errorOf(ran)).toMatchObject({ code: 'usage', message: 'Usage: npm run -s room -- FILE|-' });
  });

  it('says which file it cannot read', () => {
    const ran = run(['no-such-room.json']);
    expect(ran.status).toBe(2);
    expect(errorOf(ran)).toMatchObject({ code: 'no_file', message: 'Cannot read "no-such-room.json".' });
  });
});
