import { constant, sourceText } from '../wood/sourced';
import { baseOfCutout } from './cutout-base';
import { size, type Rule } from './facts';
import { finding } from './finding';
import { sizePair } from './words';

export const CABINET_SIDE = constant('Thickness of a cabinet side', 3 / 4, 'in', 'common practice', '');

/** A sink that does not fit between the sides of its base. */
export const sinkWiderThanBase: Rule = (facts) =>
  facts.layout.cutouts.flatMap((cutout) => {
    const over = cutout.kind === 'sink' ? baseOfCutout(facts, cutout) : null;
    if (!over) return [];
    const inside = over.baseWidth - 2 * CABINET_SIDE.value;
    if (cutout.width <= inside) return [];
    const [is, limit] = sizePair(cutout.width, inside, facts.layout.step);
    return [
      finding({
        code: 'sink-wider-than-base',
        severity: 'stop',
        text: `The sink cutout is ${is} wide; its base of ${size(facts, over.baseWidth)} has ${limit} between its sides.`,
        action: 'Take a wider base or a smaller sink.',
        at: { cutout: cutout.id, base: over.base.id },
        source: sourceText(CABINET_SIDE),
      }),
    ];
  });
