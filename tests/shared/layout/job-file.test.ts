import { parseJobFile } from '@/shared/layout/parse-job-file';
import { toJobFile } from '@/shared/layout/to-job-file';

const FILE = {
  format: 'offsquare-job',
  version: 1,
  name: 'Quay Street scullery',
  units: 'in',
  step: '1/16',
  room: {
    closed: false,
    tapeSd: { fixed: 0.03125, perInch: 0.00026 },
    walls: [
      { id: 'A', length: '96 1/4' },
      {
        id: 'B',
        length: ['118 5/8', '118 9/16'],
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
  },
  bases: [{ id: 'b1', wall: 'B', from: 42, to: 78, kind: 'sink base', depth: 24, access: 'open' }],
  runs: [
    { id: '1', wall: 'A', from: 0, to: 'end', left: { kind: 'open', overhang: -0.5 }, right: { kind: 'joint' } },
    { id: '2', wall: 'B', left: { kind: 'joint' }, right: { kind: 'wall' } },
  ],
  cutouts: [{ id: 'c1', on: '2', kind: 'sink', centre: "5'", width: 30, depth: 21, radius: 0.75 }],
  joints: [{ between: ['1', '2'], kind: 'miter' }],
  stock: { slabs: [{ id: 'S96', length: 96, depth: 25, price: 37900, count: null }], kerf: '1/8' },
} as const;

function parse(file: unknown) {
  const parsed = parseJobFile(file);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.errors));
  return parsed;
}

const errorsOf = (file: unknown) => {
  const parsed = parseJobFile(file);
  return parsed.ok ? [] : parsed.errors;
};

describe('parseJobFile', () => {
  it('keeps texts of readings beside their inches and fills what is left out with the shop defaults', () => {
    const { layout, name } = parse(FILE);
    expect(name).toBe('Quay Street scullery');
    expect(layout.room.walls[0]!.length).toEqual([{ text: '96 1/4', value: 96.25 }]);
    expect(layout.room.walls[1]!.length.map((r) => r.value)).toEqual([118.625, 118.5625]);
    expect(layout.runs[0]).toMatchObject({ depth: 25, backGap: 0.25, left: { overhang: -0.5, radius: 1 } });
    expect(layout.runs[1]).toMatchObject({ from: 0, to: 'end', right: { kind: 'wall', clearance: 0.25 } });
    expect(layout.cutouts[0]).toMatchObject({ centre: 60, setback: 2 });
    expect(layout.stock).toMatchObject({ kerf: 0.125, trim: 0.5, reuseMin: 18 });
  });

  it('draws a first sketch of a U as seen from its open side: wall A goes up, the room on its right-hand side', () => {
    const [p0, p1, p2, p3] = parse(FILE).layout.room.sketch;
    expect(p0).toEqual([0, 0]);
    expect(p1![0]).toBeCloseTo(0, 9);
    expect(p1![1]).toBeCloseTo(96.25, 9);
    expect(p2![0]).toBeCloseTo(118.625, 9);
    expect(p3![1]).toBeLessThan(p2![1]);
  });

  it('reads a file in millimetres: 2445 mm is 96.2598 in (1 in = 25.4 mm, NIST SP 811)', () => {
    const file = { units: 'mm', room: { walls: [{ id: 'A', length: 2445 }] }, runs: [] };
    const { layout } = parse(file);
    expect(layout.room.walls[0]!.length[0]).toEqual({ text: '2445 mm', value: 2445 / 25.4 });
    expect(layout.units).toBe('mm');
    expect(layout.step).toBe('1 mm');
  });

  it('comes back the same through export and import', () => {
    const { layout, name } = parse(FILE);
    const again = parse(JSON.parse(JSON.stringify(toJobFile(layout, name))));
    expect(again.layout).toEqual({
      ...layout,
      room: { ...layout.room, walls: layout.room.walls, sketch: layout.room.sketch },
    });
  });

  it.each([
    ['an unknown key', { ...FILE, colour: 'red' }, 'colour', /Unknown key "colour"/],
    [
      'letters in a length',
      { ...FILE, room: { ...FILE.room, walls: [{ id: 'A', length: 'abc' }] } },
      'room.walls[0].length',
      /abc/,
    ],
    ['a run on no wall', { ...FILE, runs: [{ ...FILE.runs[0], wall: 'Z' }] }, 'runs[0].wall', /no wall "Z"/],
    ['a cutout in no top', { ...FILE, cutouts: [{ ...FILE.cutouts[0], on: '9' }] }, 'cutouts[0].on', /no run/],
    ['a seam on no run', { ...FILE, seams: [{ on: '7', at: 10 }] }, 'seams[0].on', /no run or island "7"/],
    ['two runs of one name', { ...FILE, runs: [FILE.runs[1], FILE.runs[1]] }, 'runs', /"2"/],
    [
      'a corner of walls that are no neighbours',
      { ...FILE, room: { ...FILE.room, corners: [{ between: ['A', 'C'], angle: 90 }] } },
      'room.corners[2].between',
      /not neighbours/,
    ],
    ['no runs at all', { room: FILE.room }, 'runs', /./],
  ])('refuses %s, naming the place', (_what, file, path, message) => {
    const [error] = errorsOf(file);
    expect(error).toBeDefined();
    expect(error!.path.startsWith(path)).toBe(true);
    expect(error!.message).toMatch(message);
  });
});
