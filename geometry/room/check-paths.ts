import { formatLength } from '../tape/format-length';
import { tapeSdOf } from './room-observations';
import type { RoomError, RoomInput, TieInput } from './types';

/** How far past the possible a tie may read before it is refused, in standard deviations; nearer it is a suspect. */
const IMPOSSIBLE_SDS = 3.29;

interface Side {
  readonly name: string;
  readonly length: number;
  readonly variance: number;
}

/**
 * A tie and the walls between its marks form a closed figure, so none of them may be longer than the others together.
 * Looks along the walls both ways of a ring; skips ways with a wall that was not taped.
 */
export function checkPaths(input: RoomInput): RoomError | null {
  for (const [i, tie] of input.ties.entries()) {
    if (input.ignore.includes(`tie ${tie.id}`)) continue;
    for (const way of waysAlong(input, tie)) {
      const sides: Side[] = [{ name: `tie ${tie.id}`, length: tie.length, variance: tieVariance(input, tie) }, ...way];
      const longest = sides.reduce((a, b) => (b.length > a.length ? b : a));
      const rest = sides.reduce((sum, s) => sum + s.length, 0) - longest.length;
      const slack = IMPOSSIBLE_SDS * Math.sqrt(sides.reduce((sum, s) => sum + s.variance, 0));
      if (longest.length <= rest + slack) continue;
      return { code: 'tie_impossible', message: sentence(tie, longest, way, rest), path: `ties[${i}].length` };
    }
  }
  return null;
}

const inches = (length: number): string => `${formatLength(length, '1/32')} in`;

function sentence(tie: TieInput, longest: Side, way: readonly Side[], rest: number): string {
  const names = listNames(way.map((s) => s.name));
  if (longest.name === `tie ${tie.id}`) {
    return `Tie ${tie.id} at ${inches(tie.length)} is longer than the way along ${names} (${inches(rest)}).`;
  }
  const others = listNames([...way.map((s) => s.name).filter((n) => n !== longest.name), `tie ${tie.id}`]);
  return `Tie ${tie.id} at ${inches(tie.length)} is too short: ${longest.name} alone is longer than ${others} together.`;
}

/** "wall A", "wall A and wall B", "wall A, wall B and wall C". */
export function listNames(names: readonly string[]): string {
  if (names.length < 2) return names.join('');
  return `${names.slice(0, -1).join(', ')} and ${names[names.length - 1]!}`;
}

function tieVariance(input: RoomInput, tie: TieInput): number {
  return (tie.sd ?? tapeSdOf(input.tapeSd, tie.length)) ** 2;
}

function waysAlong(input: RoomInput, tie: TieInput): readonly (readonly Side[])[] {
  const index = (id: string): number => input.walls.findIndex((w) => w.id === id);
  const ends = [tie.from, tie.to].map((mark) => ({ wall: index(mark.wall), at: mark.at }));
  const [a, b] = ends[0]!.wall <= ends[1]!.wall ? [ends[0]!, ends[1]!] : [ends[1]!, ends[0]!];
  if (a.wall === b.wall) return [];
  const n = input.walls.length;
  const ways = [alongFrom(input, a, b, b.wall - a.wall)];
  if (input.closed) ways.push(alongFrom(input, b, a, n - (b.wall - a.wall)));
  return ways.filter((way): way is readonly Side[] => way !== null);
}

interface End {
  readonly wall: number;
  readonly at: number | 'end';
}

/** From a mark to the right, over `steps` corners, to the other mark; null when a wall on the way was not taped. */
function alongFrom(input: RoomInput, from: End, to: End, steps: number): readonly Side[] | null {
  const sides: Side[] = [];
  for (let k = 0; k <= steps; k++) {
    const wall = input.walls[(from.wall + k) % input.walls.length]!;
    if (k === steps && to.at !== 'end') {
      if (to.at > 0) sides.push({ name: `wall ${wall.id}`, length: to.at, variance: 0 });
      continue;
    }
    if (k === 0 && from.at === 'end') continue;
    if (wall.lengths.length === 0 || input.ignore.includes(`wall ${wall.id}`)) return null;
    const taped = Math.max(...wall.lengths);
    const variance = (wall.sd ?? tapeSdOf(input.tapeSd, taped)) ** 2;
    const cut = k === 0 && from.at !== 'end' ? from.at : 0;
    sides.push({ name: `wall ${wall.id}`, length: Math.abs(taped - cut), variance });
  }
  return sides;
}
