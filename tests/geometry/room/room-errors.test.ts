import type { CornerInput, RoomInput, TieInput } from '@/geometry/room/types';
import { refused, roomInput, walls } from '@/tests/builders/room-input';

const diagonal = (length: number): TieInput => ({
  id: 'd',
  from: { wall: 'A', at: 0 },
  to: { wall: 'B', at: 'end' },
  length,
});

const corner = (pair: string, rest: Partial<CornerInput>): CornerInput => ({
  between: [pair[0]!, pair[1]!],
  ...rest,
});

describe('fitRoom names the measurement that cannot be', () => {
  it.each<[string, Partial<RoomInput>, string, RegExp, string]>([
    ['a wall of nothing', { walls: walls(96, 0) }, 'zero_wall', /Wall B reads 0/, 'walls[1].length'],
    ['a wall under nothing', { walls: walls(96, -3) }, 'zero_wall', /Wall B reads -3/, 'walls[1].length'],
    ['a wall that is no number', { walls: walls(Number.NaN) }, 'bad_length', /Wall A/, 'walls[0].length'],
    [
      'a triangle longer than its two marks',
      { walls: walls(96, 96), corners: [corner('AB', { triangle: { a: 36, b: 48, c: 90 } })] },
      'triangle_impossible',
      /Corner A-B: marks at 36 in and 48 in cannot be 90 in apart. It has to be under 84 in/,
      'corners[0].triangle.c',
    ],
    [
      'a triangle shorter than the difference of its marks',
      { walls: walls(96, 96), corners: [corner('AB', { triangle: { a: 36, b: 48, c: 11 } })] },
      'triangle_impossible',
      /over 12 in/,
      'corners[0].triangle.c',
    ],
    [
      'a ring wall longer than the rest together',
      { closed: true, walls: walls(300, 100, 90, 100) },
      'wall_too_long',
      /Wall A at 300 in is longer than the rest together \(290 in\)/,
      'walls[0].length',
    ],
    [
      'a diagonal longer than the two walls',
      { walls: walls(96, 100), ties: [diagonal(230)] },
      'tie_impossible',
      /Tie d at 230 in is longer than the way along wall A and wall B \(196 in\)/,
      'ties[0].length',
    ],
    [
      'a diagonal shorter than the difference of the two walls',
      { walls: walls(200, 50), ties: [diagonal(100)] },
      'tie_impossible',
      /Tie d at 100 in is too short: wall A alone is longer than wall B and tie d together/,
      'ties[0].length',
    ],
    [
      'corners of a ring that add up to too little',
      {
        closed: true,
        walls: walls(100, 60, 40, 60, 60, 120),
        corners: ['AB', 'BC', 'CD', 'DE', 'EF', 'FA'].map((p) => corner(p, { angleDeg: 90 })),
      },
      'cannot_close',
      /The corners add up to 540 degrees, 6 walls that close need 720. Corner A-B looks like 270 instead of 90/,
      'corners[0]',
    ],
    [
      'a protractor misread by a digit',
      {
        closed: true,
        walls: walls(144, 120, 144, 120),
        corners: [corner('AB', { angleDeg: 90 }), corner('BC', { nominalDeg: 90, angleDeg: 9 })],
      },
      'cannot_close',
      /Corner B-C reads 9, far from the drawing/,
      'corners[1]',
    ],
    [
      'an angle of a full turn',
      { corners: [corner('AB', { angleDeg: 360 })] },
      'bad_room',
      /Corner A-B reads 360/,
      'corners[0].angle',
    ],
    [
      'a standard deviation of nothing',
      { ties: [{ ...diagonal(120), sd: 0 }] },
      'bad_length',
      /Tie d: its standard deviation/,
      'ties[0].sd',
    ],
  ])('%s', (_, overrides, code, message, path) => {
    const error = refused(roomInput(overrides));
    expect(error.code).toBe(code);
    expect(error.message).toMatch(message);
    expect(error.path).toBe(path);
  });

  it('readings that no room meets although none is to spare', () => {
    // Square corner, wall A 90 in: no length of wall B brings its far end within 85 in of A's left end.
    const corners = [corner('AB', { triangle: { a: 36, b: 48, c: 60 } })];
    const error = refused(roomInput({ walls: walls(90, null), corners, ties: [diagonal(85)] }));
    expect(error.code).toBe('contradictory');
    expect(error.message).toMatch(/tie d/);
    expect(error.path).toBe('ties[0].length');
  });
});

describe('fitRoom names what nothing fixes', () => {
  it('an open wall that was not taped', () => {
    expect(refused(roomInput({ walls: walls(96, null, 84) }))).toEqual({
      code: 'undetermined',
      message: 'Nothing fixes the length of wall B. Tape it, or a tie that reaches it.',
      path: 'walls[1].length',
    });
  });

  it('two parallel walls of a ring, of which one would do', () => {
    const error = refused(roomInput({ closed: true, walls: walls(null, 120, null, 120) }));
    expect(error.message).toBe(
      'Nothing fixes the length of wall A and wall C. Tape one of them, or a tie that reaches it.',
    );
  });

  it('an ignored wall', () => {
    const error = refused(roomInput({ ignore: ['wall C'] }));
    expect(error.message).toBe(
      'Nothing fixes the length of wall C. Its only reading is ignored. Tape it, or a tie that reaches it.',
    );
    expect(error.path).toBe('walls[2].length');
  });

  it('a wall whose only tie stands square to it', () => {
    // The far corner may slide along wall B without changing the tie from the near end of wall A to first order.
    const ties: TieInput[] = [{ id: 'd', from: { wall: 'A', at: 0 }, to: { wall: 'B', at: 'end' }, length: 90 }];
    const corners = [corner('AB', { triangle: { a: 36, b: 48, c: 60 } })];
    const error = refused(roomInput({ walls: walls(90, null), ties, corners }));
    expect(error.code).toBe('undetermined');
    expect(error.message).toMatch(/wall B/);
  });
});

describe('fitRoom refuses a structure that does not hang together', () => {
  it.each<[string, Partial<RoomInput>, RegExp, string]>([
    ['no walls', { walls: [] }, /no walls yet/, 'walls'],
    ['a ring of two', { closed: true, walls: walls(96, 96) }, /at least three walls/, 'walls'],
    ['two walls of one name', { walls: [...walls(96), ...walls(84)] }, /Two walls are called A/, 'walls[1].id'],
    ['a wall without a name', { walls: [{ id: '', lengths: [3] }] }, /needs a name/, 'walls[0].id'],
    [
      'a corner of a wall that is not there',
      { corners: [corner('AX', {})] },
      /there is no wall X/,
      'corners[0].between',
    ],
    [
      'a corner listed right to left',
      { corners: [corner('BA', {})] },
      /wall A does not follow wall B/,
      'corners[0].between',
    ],
    [
      'a corner across the room',
      { corners: [corner('AC', {})] },
      /wall C does not follow wall A/,
      'corners[0].between',
    ],
    [
      'the open end as a corner',
      { corners: [corner('CA', {})] },
      /wall A does not follow wall C/,
      'corners[0].between',
    ],
    ['a corner twice', { corners: [corner('AB', {}), corner('AB', {})] }, /listed twice/, 'corners[1].between'],
    ['two ties of one name', { ties: [diagonal(120), diagonal(121)] }, /Two ties are called d/, 'ties[1].id'],
    [
      'a tie to a wall that is not there',
      { ties: [{ ...diagonal(120), to: { wall: 'X', at: 3 } }] },
      /Tie d: there is no wall X/,
      'ties[0].to.wall',
    ],
    [
      'a tie from a mark to itself, named twice',
      { ties: [{ ...diagonal(120), from: { wall: 'A', at: 'end' }, to: { wall: 'B', at: 0 } }] },
      /to the same mark/,
      'ties[0].to',
    ],
    [
      'a tie along one wall',
      { ties: [{ ...diagonal(20), from: { wall: 'A', at: 10 }, to: { wall: 'A', at: 30 } }] },
      /lies along wall A/,
      'ties[0].to',
    ],
    [
      'a sketch of too few points',
      {
        sketch: [
          [0, 0],
          [9, 9],
        ],
      },
      /2 points, 3 walls need 4/,
      'sketch',
    ],
    [
      'a sketch point that is nowhere',
      {
        sketch: [
          [0, 0],
          [9, 9],
          [Number.NaN, 0],
          [1, 1],
        ],
      },
      /point 3/,
      'sketch[2]',
    ],
    ['a tape without a standard deviation', { tapeSd: { fixed: 0, perInch: 0 } }, /has to be over 0/, 'tapeSd'],
  ])('%s', (_, overrides, message, path) => {
    const error = refused(roomInput(overrides));
    expect(error.code).toBe('bad_room');
    expect(error.message).toMatch(message);
    expect(error.path).toBe(path);
  });
});
