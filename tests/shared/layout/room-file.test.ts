import { readRoomFile } from '@/shared/layout/read-room-file';
import { parseJobFile } from '@/shared/layout/parse-job-file';
import { roomInputOf } from '@/geometry/plan/room-input';
import type { RoomInput } from '@/geometry/room/types';

function read(json: unknown): RoomInput {
  const result = readRoomFile(json);
  if (!result.ok) throw new Error(`${result.error.path}: ${result.error.message}`);
  return result.input;
}

function refuse(json: unknown): { code: string; message: string; path: string } {
  const result = readRoomFile(json);
  if (result.ok) throw new Error('the file was read');
  return result.error;
}

const walls = [
  { id: 'A', length: 96 },
  { id: 'B', length: 120 },
];

describe('readRoomFile', () => {
  it('fills in what a small file leaves out', () => {
    expect(read({ walls })).toEqual({
      closed: false,
      walls: [
        { id: 'A', lengths: [96] },
        { id: 'B', lengths: [120] },
      ],
      corners: [],
      ties: [],
      tapeSd: { fixed: 1 / 32, perInch: 1 / 64 / 60 },
      trust: [],
      ignore: [],
    });
  });

  it('reads numbers in the units of the file and texts in their own', () => {
    const input = read({
      units: 'mm',
      tapeSd: { fixed: 0.8, perInch: 0.0003 },
      walls: [
        { id: 'A', length: 2540 },
        { id: 'B', length: [`8' 4"`, '254 cm', 2540] },
      ],
      corners: [{ between: ['A', 'B'], triangle: { a: 914.4, b: '48 in', c: 1524 } }],
      ties: [{ id: 't', from: { wall: 'A', at: 254 }, to: { wall: 'B', at: 'end' }, length: 3000, sd: 2.54 }],
      sketch: [
        [0, 0],
        [2540, 0],
        [2540, -2540],
      ],
    });
    expect(input.walls[0]!.lengths[0]).toBeCloseTo(100, 12);
    expect(input.walls[1]!.lengths.map((l) => Math.round(l * 1e9) / 1e9)).toEqual([100, 100, 100]);
    expect(input.tapeSd.fixed).toBeCloseTo(0.8 / 25.4, 12);
    // Inches for an inch are millimeters for a millimeter.
    expect(input.tapeSd.perInch).toBe(0.0003);
    expect(input.corners[0]!.triangle!.a).toBeCloseTo(36, 12);
    expect(input.corners[0]!.triangle!.b).toBe(48);
    expect(input.ties[0]).toMatchObject({ from: { wall: 'A', at: 10 }, to: { wall: 'B', at: 'end' } });
    expect(input.ties[0]!.sd).toBeCloseTo(0.1, 12);
    expect(input.sketch![2]![1]).toBeCloseTo(-100, 12);
  });

  it('takes bumps under zero in a profile', () => {
    const profile = [
      { at: 0, off: '-1/4' },
      { at: 60, off: 0.125 },
    ];
    expect(read({ walls: [{ id: 'A', length: 96, profile }] }).walls[0]!.profile).toEqual([
      { at: 0, off: -0.25 },
      { at: 60, off: 0.125 },
    ]);
  });

  it('reads the sd of a corner in degrees beside a protractor, as a length beside a triangle', () => {
    const protractor = read({ walls, corners: [{ between: ['A', 'B'], angle: 90, sd: 0.5 }] });
    expect(protractor.corners[0]).toEqual({ between: ['A', 'B'], angleDeg: 90, angleSdDeg: 0.5 });
    const triangle = { a: 36, b: 48, c: 60 };
    const taped = read({ units: 'in', walls, corners: [{ between: ['A', 'B'], triangle, sd: '1/16' }] });
    expect(taped.corners[0]).toEqual({ between: ['A', 'B'], triangle: { ...triangle, sd: 0.0625 } });
    const own = read({
      walls,
      corners: [{ between: ['A', 'B'], triangle: { ...triangle, sd: 0.1 }, angle: 90, sd: 0.5 }],
    });
    expect(own.corners[0]).toMatchObject({ angleSdDeg: 0.5, triangle: { sd: 0.1 } });
  });

  it('gives the solver the same corners when the room stands in a job file', () => {
    const triangle = { a: 36, b: 48, c: 60 };
    const corners = [
      { between: ['A', 'B'], nominal: 90, triangle, angle: 90, sd: 0.5 },
      { between: ['B', 'C'], nominal: 90, triangle, sd: '1/16' },
    ];
    const room = { walls: [...walls, { id: 'C', length: 80 }], corners };
    const job = parseJobFile({ room, runs: [] });
    if (!job.ok) throw new Error(job.errors[0]!.message);
    expect(roomInputOf(job.layout.room).corners).toEqual(read(room).corners);
    expect(read(room).corners[0]!.triangle).not.toHaveProperty('sd');
  });

  it('leaves a wall without a length, or with an empty list, unknown', () => {
    const input = read({ walls: [{ id: 'A' }, { id: 'B', length: [] }] });
    expect(input.walls.map((w) => w.lengths)).toEqual([[], []]);
  });

  it.each<[string, unknown, string, RegExp, string]>([
    ['an unknown key', { walls, wall: 3 }, 'unknown_key', /"wall"/, 'wall'],
    ['an unknown key of a wall', { walls: [{ id: 'A', lenght: 3 }] }, 'unknown_key', /"lenght"/, 'walls[0].lenght'],
    [
      'an unknown key of a triangle',
      { walls, corners: [{ between: ['A', 'B'], triangle: { a: 3, b: 4, c: 5, d: 6 } }] },
      'unknown_key',
      /"d"/,
      'corners[0].triangle.d',
    ],
    ['letters in a length', { walls: [{ id: 'A', length: '9x' }] }, 'bad_length', /"x" is not part/, 'walls[0].length'],
    [
      'one bad reading of several',
      { walls: [{ id: 'A', length: [96, '96 1/3'] }] },
      'bad_length',
      /into 3/,
      'walls[0].length[1]',
    ],
    ['a negative wall', { walls: [{ id: 'A', length: -4 }] }, 'bad_length', /negative/, 'walls[0].length'],
    [
      'a length that is neither number nor text',
      { walls: [{ id: 'A', length: true }] },
      'bad_input',
      /number or a text/,
      'walls[0].length',
    ],
    [
      'a bad mark',
      { walls, ties: [{ id: 't', from: { wall: 'A', at: 'start' }, to: { wall: 'B', at: 0 }, length: 3 }] },
      'bad_length',
      /"start"/,
      'ties[0].from.at',
    ],
    [
      'a tie without a length',
      { walls, ties: [{ id: 't', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' } }] },
      'bad_input',
      /missing/,
      'ties[0].length',
    ],
    [
      'an angle of a full turn',
      { walls, corners: [{ between: ['A', 'B'], angle: 360 }] },
      'bad_input',
      /under 360/,
      'corners[0].angle',
    ],
    [
      'degrees as a text',
      { walls, corners: [{ between: ['A', 'B'], angle: 90, sd: '1/4' }] },
      'bad_length',
      /number of degrees/,
      'corners[0].sd',
    ],
    ['an unknown unit', { units: 'yd', walls }, 'bad_input', /./, 'units'],
    ['a wall without a name', { walls: [{ length: 3 }] }, 'bad_input', /name/, 'walls[0].id'],
    [
      'two walls of one name',
      { walls: [...walls, { id: 'A', length: 3 }] },
      'bad_room',
      /Two walls are called A/,
      'walls[2].id',
    ],
    ['a misspelt name to ignore', { walls, ignore: ['wall Z'] }, 'bad_room', /no reading called "wall Z"/, 'ignore[0]'],
    ['a misspelt name to trust', { walls, trust: ['wall A', 'Wall B'] }, 'bad_room', /"Wall B"/, 'trust[1]'],
    ['no object', [], 'bad_input', /object with walls/, ''],
  ])('refuses %s by name', (_, json, code, message, path) => {
    const error = refuse(json);
    expect(error.code).toBe(code);
    expect(error.message).toMatch(message);
    expect(error.path).toBe(path);
  });

  it('takes the names of walls, corners and ties to trust and to ignore', () => {
    const ties = [{ id: 't', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' }, length: 150 }];
    const input = read({ walls, ties, trust: ['corner A-B'], ignore: ['tie t', 'wall B'] });
    expect(input).toMatchObject({ trust: ['corner A-B'], ignore: ['tie t', 'wall B'] });
  });
});
