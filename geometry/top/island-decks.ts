import { toRadians } from '../core/angle';
import type { Island, Layout } from '../core/layout';
import type { Point, Polygon } from '../core/point';
import { boundingBox, counterClockwise, signedArea } from '../core/polygon';
import { isConvex } from './clip-convex';
import type { Deck, DeckEnd } from './deck';
import { crossesItself } from './simple-polygon';
import type { SolvedRoom } from './solved-room';
import type { LayProblem } from './types';

/** Clear floor between the room and an island that has no place yet, inches. */
const BESIDE_ROOM = 24;

/**
 * Islands as decks: at their own place and bearing, or one above the other to the right of the room.
 *
 * @returns the decks, and a sentence for each island whose outline cannot be cut
 */
export function islandDecks(
  layout: Layout,
  room: SolvedRoom,
): { decks: readonly Deck[]; problems: readonly LayProblem[] } {
  const decks: Deck[] = [];
  const problems: LayProblem[] = [];
  const box = boundingBox(room.points);
  const besideX = (Number.isFinite(box.maxX) ? box.maxX : 0) + BESIDE_ROOM;
  let besideY = Number.isFinite(box.minY) ? box.minY : 0;
  for (const island of layout.islands) {
    const outline = islandOutline(island);
    const why = outlineProblem(island, outline);
    if (why) {
      problems.push({ code: 'island-outline', message: `Island ${island.id} ${why}`, at: { run: island.id } });
      continue;
    }
    const deck = islandDeck(island, outline, island.at ?? [besideX, besideY]);
    if (!island.at) besideY += boundingBox(deck.outline).maxY + BESIDE_ROOM;
    decks.push(deck);
  }
  return { decks, problems };
}

/** Outline in the island's own axes. A rounded island keeps its square corners here; its radius stands at its ends. */
function islandOutline(island: Island): Polygon {
  const { length, depth } = island;
  if (island.shape === 'free') return island.outline ?? [];
  const c = island.shape === 'clipped' ? (island.corner ?? 0) : 0;
  if (c <= 0) {
    return [
      [0, 0],
      [length, 0],
      [length, depth],
      [0, depth],
    ];
  }
  return [
    [c, 0],
    [length - c, 0],
    [length, c],
    [length, depth - c],
    [length - c, depth],
    [c, depth],
    [0, depth - c],
    [0, c],
  ];
}

function outlineProblem(island: Island, outline: Polygon): string | null {
  if (island.shape === 'free') {
    if (outline.length < 3) return 'has no outline yet. Give it at least three corners.';
    if (crossesItself(outline)) return 'has an outline that crosses itself.';
    return Math.abs(signedArea(outline)) > 0 ? null : 'has an outline without any area.';
  }
  if (!(island.length > 0)) return 'has no length.';
  if (!(island.depth > 0)) return 'has no depth. Type how deep the top is.';
  const corner = island.corner ?? 0;
  const most = Math.min(island.length, island.depth) / 2;
  if (island.shape === 'clipped' && corner >= most) return `cannot lose ${corner} in at every corner.`;
  if (island.shape === 'rounded' && corner > most) return `cannot have corners of ${corner} in radius.`;
  return null;
}

function islandDeck(island: Island, raw: Polygon, at: Point): Deck {
  const low = boundingBox(raw);
  const outline = counterClockwise(raw).map(([x, y]): Point => [x, y - low.minY]);
  const box = boundingBox(outline);
  const bearing = toRadians(island.bearing ?? 0);
  const x: Point = [Math.cos(bearing), Math.sin(bearing)];
  const y: Point = [-x[1], x[0]];
  const free = island.shape === 'free';
  // A free outline keeps its own zero: dragging one of its corners must not move the others.
  const origin: Point = free ? [at[0] + y[0] * low.minY, at[1] + y[1] * low.minY] : at;
  const radius = island.shape === 'rounded' ? (island.corner ?? 0) : 0;
  const end = (along: number): DeckEnd => ({
    kind: 'open',
    back: along,
    front: along,
    wing: null,
    finished: true,
    radius,
  });
  return {
    id: island.id,
    kind: 'island',
    frame: { origin, x, y },
    sign: 1,
    depth: box.maxY,
    outline,
    shape: free || island.shape === 'clipped' ? (isConvex(outline) ? 'convex' : 'free') : 'strip',
    left: end(box.minX),
    right: end(box.maxX),
    frontSeen: true,
    backSeen: true,
  };
}
