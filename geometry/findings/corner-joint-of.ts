import type { Facts } from './facts';

/** The joint that lies at a corner between two walls, if one does. */
export function jointAtCorner(facts: Facts, between: readonly [string, string]): Facts['joints'][number] | null {
  return (
    facts.joints.find((joint) => {
      const walls = joint.between.map((id) => facts.laidById.get(id)?.wall);
      return walls[0] === between[0] && walls[1] === between[1];
    }) ?? null
  );
}

/** Whether a top ends against either wall of a corner there, so that the corner's angle is cut into it. */
export function endsAtCorner(facts: Facts, between: readonly [string, string]): boolean {
  const [left, right] = between.map((wall) => facts.runsByWall.get(wall) ?? []);
  return Boolean(left?.some((run) => run.right.kind === 'wall') || right?.some((run) => run.left.kind === 'wall'));
}
