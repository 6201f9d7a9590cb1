import type { Layout } from '@/geometry/core/layout';
import { wallLabel } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import type { Scene } from '@/geometry/scene/display-list';
import { spokenLength } from '@/geometry/tape/format-length';
import type { CanvasTarget } from '../canvas/Canvas';

/** What is chosen on the tops, by the name the drawing uses. */
export type TopsChoice =
  | { readonly kind: 'piece'; readonly letter: string }
  | { readonly kind: 'joint'; readonly between: readonly [string, string] }
  | { readonly kind: 'seam'; readonly letters: readonly [string, string] }
  | { readonly kind: 'cutout'; readonly id: string };

/** `piece Q`, `joint 1-2`, `seam R-S`, `cutout c1`. */
export function choiceName(choice: TopsChoice): string {
  switch (choice.kind) {
    case 'piece':
      return `piece ${choice.letter}`;
    case 'joint':
      return `joint ${choice.between.join('-')}`;
    case 'seam':
      return `seam ${choice.letters.join('-')}`;
    case 'cutout':
      return `cutout ${choice.id}`;
  }
}

/** The choice a name stands for, or null when it is gone from the plan. */
export function choiceOf(plan: Plan, name: string | null): TopsChoice | null {
  if (name === null) return null;
  const all: TopsChoice[] = [
    ...plan.pieces.map((piece): TopsChoice => ({ kind: 'piece', letter: piece.letter })),
    ...plan.joints.map((joint): TopsChoice => ({ kind: 'joint', between: joint.between })),
    ...plan.seams.map((seam): TopsChoice => ({ kind: 'seam', letters: seam.letters })),
    ...plan.cutouts.map((cutout): TopsChoice => ({ kind: 'cutout', id: cutout.id })),
  ];
  return all.find((choice) => choiceName(choice) === name) ?? null;
}

/** Everything on the drawing of the tops that can be touched: handles over seams over cutouts over pieces. */
export function topsTargets(plan: Plan, layout: Layout, scene: Scene): CanvasTarget[] {
  const say = (inches: number) => spokenLength(inches, layout.step);
  return [
    ...plan.pieces.map((piece): CanvasTarget => ({
      id: `piece ${piece.letter}`,
      name: `Piece ${piece.letter}, back ${say(piece.back)}, front ${say(piece.front)}`,
      shape: { kind: 'area', outline: piece.outline },
    })),
    ...plan.joints.map((joint): CanvasTarget => ({
      id: `joint ${joint.between.join('-')}`,
      name: `${jointWord(joint.kind)} ${joint.letters.join(' to ')}, ${say(joint.length)}`,
      shape: { kind: 'segment', from: joint.from, to: joint.to },
      rank: 2,
    })),
    ...plan.cutouts.map((cutout): CanvasTarget => ({
      id: `cutout ${cutout.id}`,
      name: `${cutout.label}, ${say(cutout.width)} wide, strip in front ${say(cutout.frontStrip)}`,
      shape: { kind: 'area', outline: cutout.outline },
      rank: 1,
      draggable: true,
    })),
    ...plan.seams.map((seam): CanvasTarget => ({
      id: `seam ${seam.letters.join('-')}`,
      name: `Seam ${seam.letters.join(' to ')}, ${say(seam.visible)} visible`,
      shape: { kind: 'segment', from: seam.from, to: seam.to },
      rank: 3,
      draggable: !seam.edge,
    })),
    ...handles(scene),
  ];
}

/** Handles stand off their seam by px; they are second hit areas of the seam. */
function handles(scene: Scene): CanvasTarget[] {
  return scene.items.flatMap((item): CanvasTarget[] => {
    if (item.kind !== 'mark' || item.mark !== 'handle' || !item.id) return [];
    return [
      {
        id: `seam ${item.id}`,
        name: item.id,
        unlisted: true,
        draggable: true,
        rank: 4,
        shape: { kind: 'box', at: item.at, ...(item.shift && { shift: item.shift }), width: 48, height: 48 },
      },
    ];
  });
}

export const jointWord = (kind: Plan['joints'][number]['kind']): string =>
  ({ miter: 'Miter', butt: 'Butt joint', diagonal: 'Diagonal corner', square: 'Square seam', step: 'Step' })[kind];

/** "Run on wall B", "Island I". */
export function topName(layout: Layout, id: string): string {
  const run = layout.runs.find((r) => r.id === id);
  if (run) {
    const same = layout.runs.filter((r) => r.wall === run.wall);
    const label = wallLabel(layout.room.walls.findIndex((w) => w.id === run.wall));
    return same.length > 1 ? `Run ${same.indexOf(run) + 1} on wall ${label}` : `Run on wall ${label}`;
  }
  return layout.islands.some((island) => island.id === id) ? `Island ${id}` : id;
}

/** Where something slid along a run comes to rest, inches: at the nearest of the places if one is near, else on a sixteenth. */
export function snapTo(at: number, places: readonly number[], within = 0.75): number {
  const near = places.filter((place) => Math.abs(place - at) <= within);
  if (near.length === 0) return Math.round(at * 16) / 16;
  return near.reduce((best, place) => (Math.abs(place - at) < Math.abs(best - at) ? place : best));
}
