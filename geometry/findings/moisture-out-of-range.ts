import { MEASURED_MOISTURE } from '../wood/movement';
import type { Rule } from './facts';
import { finding } from './finding';
import { MOVEMENT_SOURCE } from './sources';
import { percent } from './words';

/** Moisture outside the range in which the movement of woods was measured. */
export const moistureOutOfRange: Rule = ({ movement, tops }) => {
  if (!movement.extrapolated || tops.pieces.length === 0) return [];
  const { make, summer, winter } = movement.emc;
  const [low, high] = MEASURED_MOISTURE;
  const driest = Math.min(make, summer, winter);
  const is = driest < low ? driest : Math.max(make, summer, winter);
  return [
    finding({
      code: 'moisture-out-of-range',
      severity: 'note',
      text: `The wood goes to ${percent(is)} moisture; how woods move was measured from ${low} to ${high} %, so the figures are stretched.`,
      action: 'Leave a little more room than the figures ask for.',
      at: { detail: 'climate' },
      source: MOVEMENT_SOURCE,
    }),
  ];
};
