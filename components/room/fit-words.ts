import type { Layout, Step } from '@/geometry/core/layout';
import type { RoomState } from '@/geometry/plan/lay-room';
import type { RoomFit, Suspect } from '@/geometry/room/types';
import { roundLength } from '@/geometry/tape/format-length';
import { inches } from '@/geometry/top/sentence';
import { observationWords, targetOf, type Target } from './tape-walk';

/** What the fit report says, and what it offers. */
export interface FitWords {
  readonly mood: 'empty' | 'missing' | 'right' | 'bare' | 'retake' | 'unsure' | 'broken';
  readonly fact: string;
  readonly detail: string;
  /** The reading to go to, if one is named. */
  readonly target: Target | null;
}

/** Number of readings that hold the room: every tape reading, triangle, angle and tie that is not ignored. */
export function readingCount(layout: Layout): number {
  const { walls, corners, ties, ignore } = layout.room;
  const kept = (name: string) => !ignore.includes(name);
  return (
    walls.filter((w) => kept(`wall ${w.id}`)).reduce((sum, wall) => sum + wall.length.length, 0) +
    corners.filter((c) => (c.triangle || c.angle !== undefined) && kept(`corner ${c.between.join('-')}`)).length +
    ties.filter((t) => kept(`tie ${t.id}`)).length
  );
}

/** The fit report in plain words. Never names a reading when the spares do not allow it. */
export function fitWords(layout: Layout, room: RoomState): FitWords {
  const { walls } = layout.room;
  const say = (mood: FitWords['mood'], fact: string, detail: string, target: Target | null = null): FitWords => ({
    mood,
    fact,
    detail,
    target,
  });
  if (walls.length === 0) return say('empty', 'No walls yet', 'Choose a shape to start with, or trace the walls.');
  if (room.untaped.length > 0) {
    const taped = walls.length - room.untaped.length;
    const first: Target = { kind: 'wall', wall: room.untaped[0]! };
    return say('missing', `${taped} of ${walls.length} walls taped`, missingCorners(layout), first);
  }
  if (room.error) return say('broken', 'These readings do not fit together', room.error.message);
  const { fit } = room;
  if (!fit) return say('broken', 'No shape fits', 'Check the readings.');
  if (fit.checkCorner) return checkCorner(layout, fit, say);
  const [suspect] = fit.suspects;
  if (suspect) return suspected(layout, suspect, say);
  const spare = spareReadings(fit);
  const count = readingCount(layout);
  const readings = `${count} ${count === 1 ? 'reading' : 'readings'}`;
  const open = fit.corners.find((corner) => !corner.measured);
  if (open) {
    const target: Target = { kind: 'corner', between: open.between };
    return say('missing', 'Corners are guessed', `${readings}. ${missingCorners(layout)}`, target);
  }
  if (spare === 0)
    return say(
      'bare',
      'Nothing to spare',
      `${readings}, none spare: a slip of the tape cannot be noticed. Tape a cross.`,
    );
  return say(
    'right',
    `Closes within ${closesWithin(fit, layout.step)}`,
    `${readings}, ${spare} spare. You can lay tops.`,
  );
}

type Say = (mood: FitWords['mood'], fact: string, detail: string, target?: Target | null) => FitWords;

function checkCorner(layout: Layout, fit: RoomFit, say: Say): FitWords {
  const name = fit.checkCorner!;
  const target = targetOf(layout, name);
  return say(
    'unsure',
    `Check ${observationWords(layout, name)}`,
    'Nobody measured it, and it would explain why the rest does not close.',
    target,
  );
}

function suspected(layout: Layout, suspect: Suspect, say: Say): FitWords {
  const off = offBy(layout, suspect);
  if (suspect.orElse.length > 0)
    return say(
      'unsure',
      `Something is off by about ${off}`,
      'Too few spare readings to name one. Tape a cross to find out which.',
    );
  const others = readingCount(layout) - 1;
  const words = observationWords(layout, suspect.observation);
  return say(
    'retake',
    `Re-take ${words}`,
    `Off by about ${off}. The other ${others} readings agree; they say ${shouldRead(layout, suspect)}.`,
    targetOf(layout, suspect.observation),
  );
}

/** How far off the suspect reads, in its own unit. */
function offBy(layout: Layout, suspect: Suspect): string {
  const target = targetOf(layout, suspect.observation);
  const read = target ? readValue(layout, target, suspect.shouldRead) : null;
  if (read === null) return 'something';
  const off = Math.abs(suspect.shouldRead - read.value);
  return read.unit === 'deg' ? `${off.toFixed(1)} degrees` : inches(roughly(off, layout.step), layout.step);
}

function shouldRead(layout: Layout, suspect: Suspect): string {
  const target = targetOf(layout, suspect.observation);
  const read = target ? readValue(layout, target, suspect.shouldRead) : null;
  return read?.unit === 'deg' ? `${suspect.shouldRead.toFixed(1)} degrees` : inches(suspect.shouldRead, layout.step);
}

/** A rough figure is rounded roughly: nobody needs 3/4 in to the thirty-second. */
const roughly = (off: number, step: Step): number =>
  !step.endsWith('mm') && off >= 0.5 ? roundLength(off, '1/8') : off;

/** What was read there; of a wall taped more than once, the reading farthest from what it should be. Degrees for an angle. */
export function readValue(
  layout: Layout,
  target: Target,
  shouldRead: number,
): { value: number; unit: 'in' | 'deg' } | null {
  const { walls, corners, ties } = layout.room;
  if (target.kind === 'wall') {
    const readings = walls.find((w) => w.id === target.wall)?.length ?? [];
    const off = (value: number) => Math.abs(value - shouldRead);
    const [worst] = [...readings].sort((a, b) => off(b.value) - off(a.value));
    return worst ? { value: worst.value, unit: 'in' } : null;
  }
  if (target.kind === 'corner') {
    const corner = corners.find((c) => c.between.join() === target.between.join());
    if (corner?.triangle) return { value: corner.triangle.c.value, unit: 'in' };
    return corner?.angle === undefined ? null : { value: corner.angle, unit: 'deg' };
  }
  const tie = ties.find((t) => t.id === target.id);
  return tie ? { value: tie.length.value, unit: 'in' } : null;
}

function missingCorners(layout: Layout): string {
  const { corners } = layout.room;
  const open = corners.filter((c) => !c.triangle && c.angle === undefined).length;
  if (open === 0) return 'All corners checked.';
  return open === 1 ? '1 corner is still guessed; check it.' : `${open} corners are still guessed; check them.`;
}

/** Spare readings: degrees of freedom that real readings give, without the guesses at corners. */
export function spareReadings(fit: RoomFit): number {
  return Math.max(0, fit.dof - fit.corners.filter((corner) => !corner.measured).length);
}

/** Largest disagreement of any tape reading with the solved room, rounded up to the display step. */
export function closesWithin(fit: RoomFit, step: Step): string {
  const residuals = [
    ...fit.walls.flatMap((wall) => (wall.ignored ? [] : wall.readings.map((r) => Math.abs(r.residual)))),
    ...fit.corners.flatMap((c) => (c.kind === 'triangle' && !c.ignored ? [Math.abs(c.residual)] : [])),
    ...fit.ties.flatMap((tie) => (tie.ignored ? [] : [Math.abs(tie.residual)])),
  ];
  const size = step.endsWith('mm') ? (step === '1 mm' ? 1 : 0.5) / 25.4 : 1 / Number(step.slice(2));
  const up = Math.max(1, Math.ceil(Math.max(0, ...residuals) / size - 1e-9)) * size;
  return inches(up, step);
}
