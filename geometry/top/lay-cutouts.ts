import type { Cutout, Layout } from '../core/layout';
import type { Box } from '../core/polygon';
import type { Polygon } from '../core/point';
import { isConvex } from './clip-convex';
import { cutoutShape } from './cutout-outline';
import { outlineToRoom, type Deck } from './deck';
import { spanAt } from './deck-span';
import type { LayProblem, PlacedCutout } from './types';

/** A cutout on its deck, in the deck's own axes. */
export interface LaidCutout {
  readonly id: string;
  readonly cutout: Cutout;
  readonly deck: Deck;
  readonly outline: Polygon;
  readonly box: Box;
  readonly convex: boolean;
  readonly placed: Omit<PlacedCutout, 'letters'>;
}

/**
 * Puts every cutout on its run or island.
 *
 * @returns the cutouts in the layout's order, and a sentence for each that has no top or no size
 */
export function layCutouts(
  layout: Layout,
  decks: ReadonlyMap<string, Deck>,
): { cutouts: readonly LaidCutout[]; problems: readonly LayProblem[] } {
  const cutouts: LaidCutout[] = [];
  const problems: LayProblem[] = [];
  for (const cutout of layout.cutouts) {
    const deck = decks.get(cutout.on);
    const name = cutoutName(cutout);
    const at = { cutout: cutout.id, run: cutout.on };
    if (!deck) {
      problems.push({ code: 'cutout-no-top', message: `${name} is cut in top ${cutout.on}, which is not laid.`, at });
      continue;
    }
    if (!(cutout.outline && cutout.outline.length > 2) && !(cutout.width > 0 && cutout.depth > 0)) {
      problems.push({ code: 'cutout-no-size', message: `${name} has no size. Type its width and depth.`, at });
      continue;
    }
    cutouts.push(layOne(cutout, deck));
  }
  return { cutouts, problems };
}

/** What a sentence calls a cutout. */
export function cutoutName(cutout: Cutout): string {
  if (cutout.label) return cutout.label;
  const kind = cutout.kind === 'tap' ? 'Tap hole' : cutout.kind === 'free' ? 'Cutout' : capital(cutout.kind);
  return `${kind} ${cutout.id}`;
}

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);

function layOne(cutout: Cutout, deck: Deck): LaidCutout {
  const { outline, box, radius } = cutoutShape(cutout, deck.sign * cutout.centre);
  const strips = stripsBeside(deck, box);
  return {
    id: cutout.id,
    cutout,
    deck,
    outline,
    box,
    convex: isConvex(outline),
    placed: {
      id: cutout.id,
      on: cutout.on,
      kind: cutout.kind,
      label: cutoutName(cutout),
      outline: outlineToRoom(deck.frame, outline),
      radius,
      width: box.maxX - box.minX,
      depth: box.maxY - box.minY,
      frontStrip: Math.max(0, strips.front),
      backStrip: Math.max(0, strips.back),
      endGrain: acrossGrain(outline),
    },
  };
}

/** Narrowest wood in front of and behind a box, measured at its two sides and its middle; 0 or less where it is open. */
function stripsBeside(deck: Deck, box: Box): { front: number; back: number } {
  if (deck.shape === 'strip') return { front: box.minY, back: deck.depth - box.maxY };
  let front = Infinity;
  let back = Infinity;
  for (const x of [box.minX, (box.minX + box.maxX) / 2, box.maxX]) {
    const span = spanAt(deck.outline, x);
    if (!span) continue;
    front = Math.min(front, box.minY - span[0]);
    back = Math.min(back, span[1] - box.maxY);
  }
  return { front: Number.isFinite(front) ? front : 0, back: Number.isFinite(back) ? back : 0 };
}

/** Inches of a cutout's edge that show end grain: its extent across the grain, up and down again. */
function acrossGrain(outline: Polygon): number {
  let sum = 0;
  outline.forEach((a, i) => (sum += Math.abs(outline[(i + 1) % outline.length]![1] - a[1])));
  return sum;
}
