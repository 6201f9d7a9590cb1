import { lettersOn, runName, wallName, type Rule } from './facts';
import { finding } from './finding';
import { capital, listText, sizePair } from './words';

/** A top between two side walls that close in towards the room: it does not slide straight back. */
export const lowerFromAbove: Rule = (facts) =>
  facts.wallFit.slides
    .filter((slide) => !slide.slides)
    .map((slide) => {
      const laid = facts.laidById.get(slide.run)!;
      const [short, limit] = sizePair(slide.short, 0, facts.layout.step);
      return finding({
        code: 'lower-from-above',
        severity: 'note',
        text: `${capital(runName(facts, slide.run))} is ${short} wider than the way in between the walls beside wall ${wallName(facts, laid.wall)}; to slide straight back it may be ${limit} wider.`,
        action: `Tilt ${listText(lettersOn(facts, slide.run))} and lower it from above, back edge first; keep the wall above it clear.`,
        at: { run: slide.run, wall: laid.wall },
        source: 'plane geometry',
      });
    });
