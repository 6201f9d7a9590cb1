import { constant, sourceText } from '../wood/sourced';
import { backsplashHeight, plumbGap } from '../wood/level-support';
import { size, wallName, type Rule } from './facts';
import { finding } from './finding';
import { sizePair } from './words';

export const PLUMB_LIMIT = constant(
  'Gap that a bead of caulk closes at a backsplash',
  1 / 8,
  'in',
  'common practice',
  '',
);

/** A leaning wall behind a backsplash that stands straight. */
export const wallOutOfPlumb: Rule = (facts) => {
  if (facts.layout.fixing.backsplash <= 0) return [];
  const height = backsplashHeight(facts.layout);
  return facts.layout.room.walls.flatMap((wall) => {
    const gap = plumbGap(wall, height);
    const used = facts.runsByWall.has(wall.id);
    if (!used || Math.abs(gap) <= PLUMB_LIMIT.value) return [];
    const [opens, limit] = sizePair(Math.abs(gap), PLUMB_LIMIT.value, facts.layout.step);
    const [name, tall] = [wallName(facts, wall.id), size(facts, height)];
    return [
      finding({
        code: 'wall-out-of-plumb',
        severity: 'warn',
        text:
          gap > 0
            ? `Wall ${name} leans away from the room: behind the top edge of the ${tall} backsplash the gap is ${opens}, and caulk closes ${limit}.`
            : `Wall ${name} leans into the room: at the foot of the ${tall} backsplash the gap is ${opens}, and caulk closes ${limit}.`,
        action: 'Scribe the backsplash to the wall or pack it out.',
        at: { wall: wall.id },
        source: sourceText(PLUMB_LIMIT),
      }),
    ];
  });
};
