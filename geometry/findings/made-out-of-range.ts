import type { Rule } from './facts';
import { finding } from './finding';
import { MOVEMENT_SOURCE } from './sources';
import { percent } from './words';

/** Made wetter than the house ever is, or drier: then the wood only ever moves one way, and further. */
export const madeOutOfRange: Rule = ({ movement, tops }) => {
  const { make, summer, winter } = movement.emc;
  const [driest, wettest] = [Math.min(summer, winter), Math.max(summer, winter)];
  if (tops.pieces.length === 0 || (make >= driest && make <= wettest)) return [];
  const wet = make > wettest;
  return [
    finding({
      code: 'made-out-of-range',
      severity: 'warn',
      text: `The wood is cut at ${percent(make)} moisture, ${wet ? 'wetter' : 'drier'} than the house ever makes it; its year lies between ${percent(driest)} and ${percent(wettest)}.`,
      action: `Let the slabs settle to about ${percent((driest + wettest) / 2)} before cutting.`,
      at: { detail: 'climate' },
      source: MOVEMENT_SOURCE,
    }),
  ];
};
