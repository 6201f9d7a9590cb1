import type { Layout } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import type { Scene } from '@/geometry/scene/display-list';
import { runEnds } from '@/geometry/scene/tops/run-ends';
import { spokenLength } from '@/geometry/tape/format-length';
import type { CanvasTarget } from '../canvas/Canvas';
import { cutoutTitle, jointWord, topName } from './tops-choice';

/** Everything on the drawing of the tops that can be touched: handles over seams over cutouts and ends over pieces. */
export function topsTargets(plan: Plan, layout: Layout, scene: Scene): CanvasTarget[] {
  const say = (inches: number) => spokenLength(inches, layout.step);
  const islands = new Set(layout.islands.map((island) => island.id));
  return [
    ...plan.pieces.map((piece): CanvasTarget => ({
      id: `piece ${piece.letter}`,
      name: `Piece ${piece.letter}, back ${say(piece.back)}, front ${say(piece.front)}`,
      shape: { kind: 'area', outline: piece.outline },
      draggable: islands.has(piece.on),
    })),
    ...plan.joints.map((joint): CanvasTarget => ({
      id: `joint ${joint.between.join('-')}`,
      name: `${jointWord(joint.kind)} ${joint.letters.join(' to ')}, ${say(joint.length)}`,
      shape: { kind: 'segment', from: joint.from, to: joint.to },
      rank: 2,
    })),
    ...endTargets(plan, layout),
    ...plan.cutouts.map((cutout): CanvasTarget => ({
      id: `cutout ${cutout.id}`,
      name: `${nameOfCutout(layout, cutout.id)}, ${say(cutout.width)} wide, strip in front ${say(cutout.frontStrip)}`,
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

function nameOfCutout(layout: Layout, id: string): string {
  const cutout = layout.cutouts.find((c) => c.id === id);
  return cutout ? cutoutTitle(cutout) : 'Cutout';
}

function endTargets(plan: Plan, layout: Layout): CanvasTarget[] {
  return runEnds(plan).map(({ run, side, from, to }): CanvasTarget => ({
    id: `end ${run} ${side}`,
    name: `${side === 'left' ? 'Left' : 'Right'} end of ${topName(layout, run)}`,
    shape: { kind: 'segment', from, to },
    rank: 1,
  }));
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

/** Where something slid along a run comes to rest, inches: at the nearest of the places if one is near, else on a sixteenth. */
export function snapTo(at: number, places: readonly number[], within = 0.75): number {
  const near = places.filter((place) => Math.abs(place - at) <= within);
  if (near.length === 0) return Math.round(at * 16) / 16;
  return near.reduce((best, place) => (Math.abs(place - at) < Math.abs(best - at) ? place : best));
}
