import { CAUTIONS } from '../wood/cautions';
import { finishSetting, FINISHES } from '../wood/finish';
import type { Rule } from './facts';
import { finding } from './finding';

/** Finishes that cure by taking up oxygen: their rags heat up by themselves. */
export const oilyRags: Rule = ({ layout, settings }) => {
  const finish = FINISHES[layout.finish.kind];
  const coats = finishSetting(layout.finish, settings)?.coats ?? 0;
  if (!finish.oilyRags || coats === 0) return [];
  return [
    finding({
      code: 'oily-rags',
      severity: 'note',
      text: `${finish.name} in ${coats} ${coats === 1 ? 'coat' : 'coats'}: the rags of each heat up in a pile and can catch fire.`,
      action: CAUTIONS.rags.text,
      at: { detail: 'finish' },
      source: CAUTIONS.rags.source,
    }),
  ];
};
