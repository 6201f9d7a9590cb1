import type { Base, Layout, PinnedSeam } from '../core/layout';
import { boundingBox } from '../core/polygon';
import type { ShopSettings } from '../core/settings';
import { outlineToOwn, outlineToRoom, type Deck } from '../top/deck';
import type { LaidCutout } from '../top/lay-cutouts';
import type { LaidJoint } from '../top/lay-joints';
import type { RoomWalls } from '../top/wall-frame';
import { longestCarried, longStock, WholePieces } from './long-stock';
import type { SeamGround } from './seam-plan';
import type { Hole, Support } from './seam-zones';

/** Cutouts that may touch each deck, by deck id: its own, and those of the runs it is joined to. */
export function cutoutsByDeck(
  decks: readonly Deck[],
  cutouts: readonly LaidCutout[],
  joints: readonly LaidJoint[],
): ReadonlyMap<string, readonly LaidCutout[]> {
  const own = new Map<string, LaidCutout[]>(decks.map((deck) => [deck.id, []]));
  for (const cutout of cutouts) own.get(cutout.deck.id)!.push(cutout);
  const touching = new Map([...own].map(([id, list]) => [id, [...list]]));
  for (const { between } of joints) {
    const [a, b] = between;
    touching.get(a)!.push(...own.get(b)!);
    touching.get(b)!.push(...own.get(a)!);
  }
  return touching;
}

/** What decides about the seams of each deck. Made afresh for every laying: it keeps count of the rack. */
export function seamGrounds(
  layout: Layout,
  settings: ShopSettings,
  decks: readonly Deck[],
  cutouts: ReadonlyMap<string, readonly LaidCutout[]>,
  walls: RoomWalls,
): readonly SeamGround[] {
  const stock = longStock(layout);
  const whole = new WholePieces(stock);
  const carried = longestCarried(layout.access, layout.material.thickness);
  const bases = grouped(layout.bases, (base) => base.wall);
  const pins = grouped(layout.seams, (pin: PinnedSeam) => pin.on);
  // What stands along a wall stands on its room side: it says nothing about a top on the far side.
  const wallOf = new Map(
    layout.runs.map((run) => [run.id, run.side === 'back' ? undefined : walls.byId.get(run.wall)]),
  );
  return decks.map((deck) => {
    const wall = wallOf.get(deck.id);
    return {
      deck,
      holes: (cutouts.get(deck.id) ?? []).map((cutout) => holeOn(deck, cutout)),
      supports: wall ? (bases.get(wall.id) ?? []).map((base) => supportOf(base, wall.length)) : [],
      pins: (pins.get(deck.id) ?? []).map((pin) => pin.at),
      limits: settings.seams,
      stock,
      whole,
      carried,
      step: layout.step,
    };
  });
}

function supportOf(base: Base, wallLength: number): Support {
  const { kind, from } = base;
  return { kind, from, to: base.to === 'end' ? wallLength : base.to, name: base.label ?? kind };
}

function grouped<T>(list: readonly T[], keyOf: (item: T) => string): ReadonlyMap<string, readonly T[]> {
  const groups = new Map<string, T[]>();
  for (const item of list) {
    const key = keyOf(item);
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return groups;
}

function holeOn(deck: Deck, cutout: LaidCutout): Hole {
  if (cutout.deck === deck) return { cutout, outline: cutout.outline, box: cutout.box };
  const outline = outlineToOwn(deck.frame, outlineToRoom(cutout.deck.frame, cutout.outline));
  return { cutout, outline, box: boundingBox(outline) };
}
