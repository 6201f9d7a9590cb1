import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import type { NestInstance, NestPlan } from '@/geometry/nest/types';
import { checkPlan } from '@/shared/nest-check/check-plan';
import { DEMO_JOBS } from '@/shared/layout/demo/demo-jobs';
import { DEMO_SLABS } from '@/shared/layout/demo/demo-stock';
import type { PlanOutput } from '@/shared/layout/plan-output';

// Every case starts a process of its own, which a busy machine may take seconds over.
jest.setTimeout(120_000);

function run(command: string, args: readonly string[], input?: unknown) {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ['--import', 'tsx', `server/cli/${command}.ts`, ...args],
    { encoding: 'utf8', input: input === undefined ? undefined : JSON.stringify(input) },
  );
  return { status, stdout, stderr };
}

const INSTANCE = {
  format: 'nest-instance/1',
  id: 'two',
  units: 'in',
  kerf: '1/8',
  trim: 0.5,
  reuseMin: 18,
  limitMs: 5000,
  stock: [{ id: 'S96x25', length: 96, depth: 25, price: 37900, count: null }],
  parts: [
    { id: 'P', outline: [[0, 0], [51.4, 0], [75.8, 25], [0, 25]] },
    { id: 'Q', outline: [[0, 0], [40, 0], [40, 25], [0, 25]] },
  ],
}; // prettier-ignore

describe('the nest command', () => {
  it('answers with a plan that the independent checker holds true, its bound and its gap', () => {
    const { status, stdout } = run('nest', ['-'], INSTANCE);
    expect(status).toBe(0);
    const plan = JSON.parse(stdout) as NestPlan & { format: string; ms: number };
    expect(plan).toMatchObject({
      format: 'nest-plan/1',
      instance: 'two',
      cost: 75800,
      lowerBound: 75800,
      proved: true,
    });
    const { format: _f, units: _u, limitMs: _l, ...rest } = INSTANCE;
    expect(checkPlan({ ...rest, kerf: 0.125 } as unknown as NestInstance, plan)).toEqual([]);
  });

  it('answers a batch in order, a bad input in its place, and exits 2', () => {
    const bad = { ...INSTANCE, stock: [{ ...INSTANCE.stock[0], price: -1 }] };
    const { status, stdout } = run('nest', ['-'], [bad, INSTANCE]);
    expect(status).toBe(2);
    const [first, second] = JSON.parse(stdout) as [{ error: { message: string } }, { cost: number }];
    expect(first.error.message).toMatch(/price/i);
    expect(second.cost).toBe(75800);
  });

  it.each([
    ['an unknown key', { ...INSTANCE, colour: 1 }, 'colour'],
    ['letters for a length', { ...INSTANCE, kerf: 'thin' }, 'kerf'],
    ['no parts', { ...INSTANCE, parts: undefined }, 'parts'],
  ])('refuses %s with one JSON line and exit 2', (_what, input, path) => {
    const { status, stdout, stderr } = run('nest', ['-'], input);
    expect(status).toBe(2);
    expect(stdout).toBe('');
    expect(stderr.trim().split('\n')).toHaveLength(1);
    expect((JSON.parse(stderr) as { error: { path: string } }).error.path).toBe(path);
  });

  it('says which part fits no slab', () => {
    const long = { id: 'L', outline: [[0, 0], [140, 0], [140, 25], [0, 25]] }; // prettier-ignore
    const { status, stderr } = run('nest', ['-'], { ...INSTANCE, parts: [long] });
    expect(status).toBe(2);
    expect((JSON.parse(stderr) as { error: { message: string } }).error.message).toMatch(/\bL\b/);
  });
});

describe('the plan command', () => {
  const folder = mkdtempSync(join(tmpdir(), 'offsquare-plan-'));
  afterAll(() => rmSync(folder, { recursive: true }));

  const scullery = {
    ...DEMO_JOBS['quay-street-scullery'],
    stock: { slabs: DEMO_SLABS.filter((slab) => slab.species === 'hard maple') },
  };

  it('plans the scullery: two miters of width over the sine of half the corner, a seam in the sink, proved slabs', () => {
    const file = join(folder, 'scullery.json');
    writeFileSync(file, JSON.stringify(scullery));
    const { status, stdout } = run('plan', [file, '--sheets', folder]);
    expect(status).toBe(0);
    const plan = JSON.parse(stdout) as PlanOutput & { sheets: string[] };
    expect(plan.joints).toHaveLength(2);
    for (const joint of plan.joints) {
      // Equal widths: J = w / sin(t / 2), plane trigonometry.
      expect(joint.length).toBeCloseTo(25 / Math.sin((joint.corner * Math.PI) / 360), 9);
      expect(joint.angles[0]).toBeCloseTo(joint.corner / 2, 9);
    }
    expect(plan.seams).toHaveLength(1);
    expect(plan.seams[0]!.inCutout).not.toBeNull();
    expect(plan.cost).toMatchObject({ proved: true, gap: 0 });
    const laid = plan.slabs.flatMap((slab) => slab.pieces.map((piece) => piece.letter)).sort();
    expect(laid).toEqual(plan.pieces.map((piece) => piece.letter).sort());
    const kinds = plan.sheets.map((file) => /-([a-z]+)\.pdf$/.exec(file)![1]);
    expect(kinds).toEqual(expect.arrayContaining(['cut', 'joint', 'fit', 'order', 'finish', 'labels', 'customer']));
    for (const file of plan.sheets) expect(existsSync(file)).toBe(true);
  });

  it('names the reading that makes a room impossible, and exits 2', () => {
    const room = {
      ...scullery.room,
      corners: [{ between: ['A', 'B'], triangle: { a: 36, b: 48, c: 90 } }],
    };
    const { status, stderr } = run('plan', ['-'], { ...scullery, room });
    expect(status).toBe(2);
    const { error } = JSON.parse(stderr) as { error: { code: string; message: string; path: string } };
    expect(error.code).toBe('triangle_impossible');
    expect(error.path).toMatch(/^room\.corners/);
  });

  it('refuses a file without runs, naming them', () => {
    const { status, stderr } = run('plan', ['-'], { room: scullery.room });
    expect(status).toBe(2);
    expect((JSON.parse(stderr) as { error: { path: string } }).error.path).toBe('runs');
  });
});
