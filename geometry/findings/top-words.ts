import type { Facts } from './facts';
import { wallName } from './facts';
import { capital } from './words';

/**
 * A sentence of the layout in a person's words: it speaks of runs and tops by their names in the job file ("Run 2",
 * "top 2"), a person knows a run by its wall ("The run on wall B").
 */
export function inPersonsWords(facts: Facts, sentence: string): string {
  const { runs, islands } = facts.layout;
  const pairs = sentence.replace(/\b(R|r)uns (\S+) and (\S+)\b/g, (all, r: string, a: string, b: string) => {
    const [left, right] = [a, b].map((id) => runs.find((run) => run.id === id));
    if (!left || !right) return all;
    return `${r === 'R' ? 'The' : 'the'} runs on walls ${wallName(facts, left.wall)} and ${wallName(facts, right.wall)}`;
  });
  const single = pairs.replace(/\b(Run|run|Top|top) ([^\s,.:;]+)/g, (all, word: string, id: string) => {
    const name = runs.some((run) => run.id === id) ? runWords(facts, id) : islandWords(islands, id);
    if (!name) return all;
    return word.charAt(0) === word.charAt(0).toUpperCase() ? capital(name) : name;
  });
  return capital(single);
}

/** "the run on wall B", "run 2 on wall B" where there are several. */
function runWords(facts: Facts, id: string): string {
  const { runs } = facts.layout;
  const run = runs.find((one) => one.id === id)!;
  const same = runs.filter((one) => one.wall === run.wall);
  const wall = `on wall ${wallName(facts, run.wall)}`;
  return same.length > 1 ? `run ${same.indexOf(run) + 1} ${wall}` : `the run ${wall}`;
}

const islandWords = (islands: Facts['layout']['islands'], id: string): string | null =>
  islands.some((island) => island.id === id) ? `island ${id}` : null;
