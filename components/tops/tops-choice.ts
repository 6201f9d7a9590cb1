import type { Layout } from '@/geometry/core/layout';
import { wallLabel } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';

/** What is chosen on the tops. */
export type TopsChoice =
  | { readonly kind: 'piece'; readonly letter: string }
  | { readonly kind: 'joint'; readonly between: readonly [string, string] }
  | { readonly kind: 'seam'; readonly letters: readonly [string, string] }
  | { readonly kind: 'cutout'; readonly id: string }
  | { readonly kind: 'end'; readonly run: string; readonly side: 'left' | 'right' }
  /** A run, an island or a strip, also one that could not be laid and so has no piece. */
  | { readonly kind: 'top'; readonly id: string };

/** The name the drawing and its targets use: `piece Q`, `joint 1-2`, `seam R-S`, `cutout c1`, `end 1 left`, `top 1`. */
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
    case 'end':
      return `end ${choice.run} ${choice.side}`;
    case 'top':
      return `top ${choice.id}`;
  }
}

/** The choice a name stands for, or null when it is gone. */
export function choiceOf(plan: Plan, layout: Layout, name: string | null): TopsChoice | null {
  if (name === null) return null;
  const all: TopsChoice[] = [
    ...plan.pieces.map((piece): TopsChoice => ({ kind: 'piece', letter: piece.letter })),
    ...plan.joints.map((joint): TopsChoice => ({ kind: 'joint', between: joint.between })),
    ...plan.seams.map((seam): TopsChoice => ({ kind: 'seam', letters: seam.letters })),
    ...layout.cutouts.map((cutout): TopsChoice => ({ kind: 'cutout', id: cutout.id })),
    ...layout.runs.flatMap(({ id }): TopsChoice[] => [
      { kind: 'end', run: id, side: 'left' },
      { kind: 'end', run: id, side: 'right' },
    ]),
    ...topsOf(layout).map(({ id }): TopsChoice => ({ kind: 'top', id })),
  ];
  return all.find((choice) => choiceName(choice) === name) ?? null;
}

/** Runs, islands and strips in the order they were made. */
export const topsOf = (layout: Layout): readonly { readonly id: string }[] => [
  ...layout.runs,
  ...layout.islands,
  ...layout.strips,
];

export const jointWord = (kind: Plan['joints'][number]['kind']): string =>
  ({ miter: 'Miter', butt: 'Butt joint', diagonal: 'Diagonal corner', square: 'Square seam', step: 'Step' })[kind];

/** "Run on wall B", "Island I", the label of a strip. */
export function topName(layout: Layout, id: string): string {
  const run = layout.runs.find((r) => r.id === id);
  if (run) {
    const same = layout.runs.filter((r) => r.wall === run.wall);
    const label = wallName(layout, run.wall);
    return same.length > 1 ? `Run ${same.indexOf(run) + 1} on wall ${label}` : `Run on wall ${label}`;
  }
  const strip = layout.strips.find((s) => s.id === id);
  if (strip) return strip.label || `Strip ${id}`;
  return layout.islands.some((island) => island.id === id) ? `Island ${id}` : id;
}

/** The letter a person reads for a wall. */
export const wallName = (layout: Layout, wall: string): string =>
  wallLabel(
    Math.max(
      0,
      layout.room.walls.findIndex((w) => w.id === wall),
    ),
  );

/** Title of what is chosen: "Seam R to S", "Left end, run on wall A". */
export function choiceTitle(choice: TopsChoice, plan: Plan, layout: Layout): string {
  switch (choice.kind) {
    case 'piece':
      return `Piece ${choice.letter}`;
    case 'joint': {
      const joint = plan.joints.find((j) => j.between.join() === choice.between.join());
      return joint ? `${jointWord(joint.kind)} ${joint.letters.join(' to ')}` : 'Joint';
    }
    case 'seam':
      return `Seam ${choice.letters.join(' to ')}`;
    case 'cutout': {
      const cutout = layout.cutouts.find((c) => c.id === choice.id);
      return cutout ? cutoutTitle(cutout) : 'Cutout';
    }
    case 'end':
      return `${choice.side === 'left' ? 'Left' : 'Right'} end, ${inSentence(topName(layout, choice.run))}`;
    case 'top':
      return topName(layout, choice.id);
  }
}

/** The same name inside a sentence. */
export const inSentence = (name: string): string => name.charAt(0).toLowerCase() + name.slice(1);

const CUTOUT_WORDS = { sink: 'Sink', cooktop: 'Cooktop', tap: 'Tap hole', notch: 'Notch', free: 'Cutout' } as const;

export function cutoutTitle(cutout: Layout['cutouts'][number]): string {
  const label = cutout.label ?? CUTOUT_WORDS[cutout.kind];
  return `${label.charAt(0).toUpperCase()}${label.slice(1)}`;
}

/** An id nothing in the list has: `c3`. */
export function freshId(items: readonly { readonly id: string }[], prefix: string): string {
  let n = items.length + 1;
  while (items.some((item) => item.id === `${prefix}${n}`)) n++;
  return `${prefix}${n}`;
}
