import { toRadians } from '../core/angle';
import { mortiseCover } from '../wood/connectors';
import { jointName, size, type Facts, type Rule } from './facts';
import { finding } from './finding';
import { PRACTICE } from './sources';
import { sizePair } from './words';

/** Sine of 5 degrees: under it the joint runs along a piece's edge and has no point. */
const NO_POINT = Math.sin(toRadians(5));

/** Float dust: a mortise set exactly at the limit is allowed. */
const DUST = 1e-9;

/** A connector whose mortise leaves too little wood at an acute point, or comes through it. */
export const connectorComesThrough: Rule = (facts) =>
  facts.joints.flatMap((joint) => {
    const worst = worstMortise(joint, facts.settings.connectors);
    const { cover, depth } = facts.settings.connectors;
    if (!worst || worst.cover >= cover - DUST) return [];
    const [is, limit] = sizePair(worst.cover, cover, facts.layout.step);
    return [
      finding({
        code: 'connector-comes-through',
        severity: 'stop',
        text: `${jointName(joint)}: the connector ${size(facts, worst.at)} from the back, ${size(facts, depth)} deep, ${worst.cover <= 0 ? `comes through the edge (${is} of wood left)` : `leaves ${is} of wood at the edge`}; ${limit} is the least.`,
        action: 'Move it in from the point, or take a shallower one.',
        at: { joint: joint.between, pieces: joint.letters },
        source: PRACTICE,
      }),
    ];
  });

function worstMortise(
  { connectors, angles, length }: Facts['joints'][number],
  { width, depth }: Facts['settings']['connectors'],
): { readonly at: number; readonly cover: number } | null {
  let worst: { at: number; cover: number } | null = null;
  for (const at of connectors) {
    for (const angle of angles.map(toRadians)) {
      if (Math.sin(angle) < NO_POINT) continue;
      const cover = Math.min(
        mortiseCover(at, angle, width, depth),
        mortiseCover(length - at, Math.PI - angle, width, depth),
      );
      if (!worst || cover < worst.cover) worst = { at, cover };
    }
  }
  return worst;
}
