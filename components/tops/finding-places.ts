import type { Finding } from '@/geometry/findings/types';
import type { Plan } from '@/geometry/plan/types';
import type { Point } from '@/geometry/core/point';
import { choiceName, type TopsChoice } from './tops-choice';

/** What on the drawing a finding is about, by name, or null when it has no place there. */
export function placeOf(finding: Finding, plan: Plan): string | null {
  const { at } = finding;
  if (at.cutout) return `cutout ${at.cutout}`;
  const joint = at.joint && plan.joints.find((j) => sameTwo(j.between, at.joint!));
  if (joint) return `joint ${joint.between.join('-')}`;
  const seam = at.seam && plan.seams.find((s) => s.on === at.seam!.on && Math.abs(s.at - at.seam!.at) < 1);
  if (seam) return `seam ${seam.letters.join('-')}`;
  const [piece] = at.pieces ?? [];
  if (piece && plan.pieces.some((p) => p.letter === piece)) return `piece ${piece}`;
  return at.run ? `top ${at.run}` : null;
}

const sameTwo = (a: readonly string[], b: readonly string[]): boolean => a.every((item) => b.includes(item));

/** Letters of the pieces a finding is about. */
export function piecesOf(finding: Finding, plan: Plan): readonly string[] {
  const { at } = finding;
  if (at.pieces && at.pieces.length > 0) return at.pieces;
  const joint = at.joint && plan.joints.find((j) => sameTwo(j.between, at.joint!));
  if (joint) return joint.letters;
  const cutout = at.cutout && plan.cutouts.find((c) => c.id === at.cutout);
  if (cutout) return cutout.letters;
  const on = at.run ?? at.seam?.on;
  return on ? plan.pieces.filter((piece) => piece.on === on).map((piece) => piece.letter) : [];
}

/** Everything that has to be in sight to see a finding, inches on the drawing; empty when it has no place there. */
export function pointsOf(finding: Finding, drawn: Plan): readonly Point[] {
  const { at } = finding;
  const cutout = at.cutout && drawn.cutouts.find((c) => c.id === at.cutout);
  if (cutout) return cutout.outline;
  const joint = at.joint && drawn.joints.find((j) => sameTwo(j.between, at.joint!));
  if (joint) return [joint.from, joint.to];
  const letters = piecesOf(finding, drawn);
  return drawn.pieces.filter((piece) => letters.includes(piece.letter)).flatMap((piece) => [...piece.outline]);
}

/** Findings about what is chosen. */
export function findingsAt(choice: TopsChoice, plan: Plan): Finding[] {
  const name = choiceName(choice);
  return plan.findings.filter(
    (finding) =>
      placeOf(finding, plan) === name ||
      (choice.kind === 'piece' && piecesOf(finding, plan).includes(choice.letter)) ||
      (choice.kind === 'seam' && finding.at.seam !== undefined && sameTwo(choice.letters, finding.at.pieces ?? [])) ||
      (choice.kind === 'top' && finding.at.run === choice.id),
  );
}
