import { cornerName, type Rule } from './facts';
import { finding } from './finding';

/** The readings disagree and a corner that was only assumed explains it: nothing measured is accused. */
export const checkCorner: Rule = (facts) => {
  const name = facts.fit?.checkCorner;
  if (!name) return [];
  const corner = facts.fit?.corners.find((c) => name.endsWith(c.between.join('-')));
  const label = corner ? cornerName(facts, corner.between) : name;
  return [
    finding({
      code: 'check-corner',
      severity: 'warn',
      text: `The readings disagree unless corner ${label} is further than 1 degree off ${corner ? 'its drawn angle' : 'square'}.`,
      action: `Measure corner ${label} with a triangle before anything is cut.`,
      at: corner ? { corner: corner.between } : { detail: name },
      source: 'data snooping, two-sided 0.1 % (Baarda 1968, critical value 3.29)',
    }),
  ];
};
