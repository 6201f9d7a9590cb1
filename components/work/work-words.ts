import { dayWords } from '../jobs/job-words';

/** "10:12" of a moment today, else "Mon, Mar 16, 10:12". */
export function whenWords(iso: string, now: Date = new Date()): string {
  const at = new Date(iso);
  const time = at.toLocaleTimeString(undefined, { hour: '2-digit', minute: '2-digit', hour12: false });
  if (at.toDateString() === now.toDateString()) return time;
  const day = at.toLocaleDateString(undefined, { weekday: 'short', day: 'numeric', month: 'short' });
  return `${day}, ${time}`;
}

/** "Mon, Mar 16, 8:30" of a planned day and hour. */
export function plannedWords(day: string, hour: number): string {
  const minutes = Math.round((hour % 1) * 60);
  return `${dayWords(day)}, ${Math.floor(hour)}:${String(minutes).padStart(2, '0')}`;
}

/** "20 min", "1.5 h", "3 days". */
export function hoursWords(hours: number): string {
  if (hours < 1) return `${Math.max(5, Math.round((hours * 60) / 5) * 5)} min`;
  if (hours >= 48) return `${Number((hours / 24).toFixed(1))} days`;
  return `${Number(hours.toFixed(1))} h`;
}

/** First name, as crews call each other. */
export const firstName = (name: string): string => name.split(' ')[0] ?? name;
