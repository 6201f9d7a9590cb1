import type { Step } from './types';

/** When a crew works. */
export interface WorkCalendar {
  readonly hoursPerDay: number;
  /** Hour of the day at which work starts. */
  readonly startHour: number;
  /** 0 Sunday to 6 Saturday. */
  readonly workDays: readonly number[];
  /** Days off, as YYYY-MM-DD. */
  readonly closed: readonly string[];
}

export const USUAL_CALENDAR: WorkCalendar = { hoursPerDay: 8, startHour: 8, workDays: [1, 2, 3, 4, 5], closed: [] };

/** A step with its days. Dates are YYYY-MM-DD; hours are hours of the day. */
export interface DatedStep extends Step {
  readonly starts: string;
  readonly startsAt: number;
  readonly ends: string;
  readonly endsAt: number;
  /** When the waiting behind it is over: the glue has cured, the coat can be sanded. */
  readonly ready: string;
  readonly readyAt: number;
}

const DAY = 24;
/** Float dust of adding hours; far under a second. */
const TINY = 1e-9;

/**
 * Dates for an order of work by one crew: one step at a time on working days, waiting by day and night in between. A step
 * starts when all it follows are ready, or at the next working hour.
 *
 * @param start - first day, YYYY-MM-DD
 * @throws RangeError when `start` is no such date, or the calendar has no working day
 */
export function datedSchedule(
  steps: readonly Step[],
  start: string,
  calendar: WorkCalendar = USUAL_CALENDAR,
): readonly DatedStep[] {
  if (calendar.workDays.length === 0 || calendar.hoursPerDay <= 0)
    throw new RangeError('the calendar has no working day');
  const first = dayNumber(start);
  const ready = new Map<string, number>();
  let crewFree = first * DAY;
  return steps.map((step) => {
    const earliest = Math.max(crewFree, ...step.after.map((name) => ready.get(name) ?? crewFree));
    const begin = nextWorkingHour(earliest, calendar);
    const end = addWork(begin, step.hours, calendar);
    const over = end + step.waitHours;
    ready.set(step.step, over);
    crewFree = end;
    return { ...step, ...moment('starts', begin), ...moment('ends', end), ...moment('ready', over) } as DatedStep;
  });
}

function moment(name: 'starts' | 'ends' | 'ready', hour: number): Record<string, string | number> {
  const day = Math.floor((hour + TINY) / DAY);
  return { [name]: dateText(day), [`${name}At`]: Math.max(0, hour - day * DAY) };
}

const isOpen = (day: number, { workDays, closed }: WorkCalendar): boolean =>
  // Day 0 is Thursday, 1 January 1970.
  workDays.includes((((day + 4) % 7) + 7) % 7) && !closed.includes(dateText(day));

/** Same hour when it is a working one, else the start of the next working day. */
function nextWorkingHour(hour: number, calendar: WorkCalendar): number {
  let day = Math.floor((hour + TINY) / DAY);
  const opens = calendar.startHour;
  const closes = opens + calendar.hoursPerDay;
  const within = hour - day * DAY;
  if (isOpen(day, calendar) && within < closes - TINY) return day * DAY + Math.max(within, opens);
  for (let tries = 0; tries < MOST_DAYS_SHUT; tries++) {
    day += 1;
    if (isOpen(day, calendar)) return day * DAY + opens;
  }
  throw new RangeError('the calendar has no working day');
}

/** A shop that is shut for longer than this in a row has no working day. */
const MOST_DAYS_SHUT = 400;

function addWork(begin: number, hours: number, calendar: WorkCalendar): number {
  let at = begin;
  let left = hours;
  for (;;) {
    const day = Math.floor((at + TINY) / DAY);
    const closes = day * DAY + calendar.startHour + calendar.hoursPerDay;
    if (left <= closes - at + TINY) return at + left;
    left -= closes - at;
    at = nextWorkingHour(closes, calendar);
  }
}

/** Days since 1 January 1970 of a date that exists. */
function dayNumber(date: string): number {
  const parts = /^(\d{4})-(\d{2})-(\d{2})$/.exec(date);
  const day = parts ? Date.UTC(Number(parts[1]), Number(parts[2]) - 1, Number(parts[3])) / (DAY * 3_600_000) : NaN;
  if (!Number.isFinite(day) || dateText(day) !== date) throw new RangeError(`${date} is no date`);
  return day;
}

const dateText = (day: number): string => new Date(day * DAY * 3_600_000).toISOString().slice(0, 10);
