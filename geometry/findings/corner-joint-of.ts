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
  return facts.tops.runs.some(
    (run) =>
      (run.wall === between[0] && run.right.kind === 'wall') || (run.wall === between[1] && run.left.kind === 'wall'),
  );
}
