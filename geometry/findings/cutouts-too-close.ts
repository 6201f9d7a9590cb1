import { cutoutName, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { weakens } from './strip-widths';
import { sizePair } from './words';

/** Two cutouts of one top with too little wood between them. */
export const cutoutsTooClose: Rule = (facts) => {
  const cutouts = facts.layout.cutouts.filter(weakens);
  return cutouts.flatMap((a, i) =>
    cutouts.slice(i + 1).flatMap((b) => {
      if (a.on !== b.on) return [];
      const along = Math.abs(a.centre - b.centre) - (a.width + b.width) / 2;
      const deep = Math.max(a.setback - (b.setback + b.depth), b.setback - (a.setback + a.depth));
      const between = Math.max(along, deep);
      const least = facts.settings.seams.strip;
      if (between >= least) return [];
      const [is, limit] = sizePair(Math.max(between, 0), least, facts.layout.step);
      return [
        finding({
          code: 'cutouts-too-close',
          severity: 'warn',
          text: `Between ${cutoutName(facts, a)} and ${cutoutName(facts, b)} only ${is} of wood is left; ${limit} is the least.`,
          action: 'Move one of them, or make it one cutout.',
          at: { cutout: a.id, detail: b.id },
          source: PRACTICE,
        }),
      ];
    }),
  );
};
