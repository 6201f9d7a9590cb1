import { cornerName, size, wallName, type Facts, type Rule } from './facts';
import { finding } from './finding';
import { capital, degrees, listText } from './words';

/** Largest standardised residual that is put down to chance: 0.1 % of good readings pass it. */
const SUSPICION = 3.29;

/** A tape reading that the others contradict. Several that explain it equally well are named together. */
export const readingSuspect: Rule = (facts) =>
  (facts.fit?.suspects ?? []).map((suspect) => {
    const named = [suspect.observation, ...suspect.orElse].map((name) => readingName(facts, name));
    const single = named.length === 1;
    const off = `${Math.abs(suspect.standardised).toFixed(1)} times its own error`;
    return finding({
      code: 'reading-suspect',
      severity: 'stop',
      text: single
        ? `${capital(named[0]!)} is off by ${off}, and ${SUSPICION} is the limit: the others say it should read ${shouldRead(facts, suspect)}.`
        : `Something is off by ${off}, and ${SUSPICION} is the limit: it may be ${listText(named)}.`,
      action: single ? `Re-take ${named[0]!}.` : 'Tape a cross to find out which, or re-take each.',
      at: { ...placeOf(suspect.observation), detail: suspect.observation },
      source: 'data snooping, two-sided 0.1 % (Baarda 1968, critical value 3.29)',
    });
  });

function shouldRead(
  facts: Facts,
  { observation, shouldRead: value }: { observation: string; shouldRead: number },
): string {
  const corner = facts.fit?.corners.find((c) => `corner ${c.between.join('-')}` === observation);
  return corner?.kind === 'angle' ? degrees(value) : size(facts, value);
}

/** "wall A", "corner A-B", "the cross from wall A to wall C": labels that a person in the room knows, instead of ids. */
export function readingName(facts: Facts, observation: string): string {
  if (observation.startsWith('wall ')) return `wall ${wallName(facts, observation.slice(5))}`;
  const corner = facts.fit?.corners.find((c) => `corner ${c.between.join('-')}` === observation);
  if (corner) return `corner ${cornerName(facts, corner.between)}`;
  const tie = facts.layout.room.ties.find((t) => `tie ${t.id}` === observation);
  return tie
    ? `the cross from wall ${wallName(facts, tie.from.wall)} to wall ${wallName(facts, tie.to.wall)}`
    : observation;
}

const placeOf = (observation: string) => (observation.startsWith('wall ') ? { wall: observation.slice(5) } : {});
