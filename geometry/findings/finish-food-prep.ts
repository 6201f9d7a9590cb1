import { finishSetting, FINISHES } from '../wood/finish';
import type { Rule } from './facts';
import { finding } from './finding';

/** Food is prepared straight on a top whose finish does not stand knives: a film that is cut through. */
export const finishFoodPrep: Rule = ({ layout, settings }) => {
  const finish = FINISHES[layout.finish.kind];
  if (!layout.finish.foodPrep || finish.foodPrep) return [];
  const coats = finishSetting(layout.finish, settings)?.coats ?? 0;
  return [
    finding({
      code: 'finish-food-prep',
      severity: 'warn',
      text: `Food is prepared straight on the top and the finish is ${finish.name.toLowerCase()}: once a knife is through its ${coats} coats it no longer keeps food off the wood.`,
      action: 'Take oil or hard wax oil there, or promise a cutting board.',
      at: { detail: 'finish' },
      source: finish.foodContact.source,
    }),
  ];
};
