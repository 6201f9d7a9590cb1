import type { Layout } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import { piecesOf, type BarePiece } from '../top/deck-pieces';
import type { SolvedRoom } from '../top/solved-room';
import { rowsOf } from './deck-rows';
import { divide, fewest, seamPlace, seamPlaces, type Division, type SeamPlace, type Span } from './divide-row';
import { layDecks, planSeams } from './lay-tops';
import type { SeamGround, SeamPlan } from './seam-plan';
import { seamZones, type Row, type Zone } from './seam-zones';

/** One way to seam a top: what the slab search chooses from. */
export interface SeamSet {
  readonly on: string;
  /** Inches along the wall from its left end, rising. */
  readonly at: readonly number[];
  /** Inches of seam that stay on the finished top. */
  readonly visible: number;
  /** Visible inches and penalties: the order of the sets before slabs are priced. */
  readonly score: number;
  /** The pieces that this set gives, left to right; not lettered, since only one set is cut. */
  readonly pieces: readonly BarePiece[];
  /** True for the set that `layTops` takes by itself. */
  readonly best: boolean;
}

/** Sets listed for one top at most: the search multiplies them. */
const MOST_SETS = 8;
/** Sets whose seams all lie this near to those of a better one are the same set, inches. */
const SAME_SET = 1;

/**
 * Ways to seam each top that needs a seam nobody pinned: the best one first, then others that show more of it but may cut
 * cheaper (a piece that just fits a shorter slab, a seam at either end of an allowed stretch). Tops split along the grain
 * and tops without a choice are left out.
 */
export function seamAlternatives(layout: Layout, room: SolvedRoom, settings: ShopSettings): readonly SeamSet[] {
  const { grounds, onDeck } = layDecks(layout, room, settings);
  const plans = planSeams(grounds);
  return grounds.flatMap((ground) => {
    const plan = plans.get(ground.deck.id)!;
    const forced = plan.problems.some(({ code }) => code === 'seam-no-place');
    if (forced || plan.cut.rows.length > 0 || plan.seams.every((seam) => seam.pinned)) return [];
    const row = rowsOf(ground.deck, [])[0]!;
    const zones = seamZones(row, ground.holes, ground.supports, ground.limits);
    return setsOf(ground, row, zones, plan).map((set, i): SeamSet => {
      const xs = set.places.map((place) => place.x);
      const cutouts = onDeck.get(ground.deck.id)!;
      return {
        on: ground.deck.id,
        at: xs.map((x) => ground.deck.sign * x).sort((a, b) => a - b),
        visible: set.places.reduce((sum, place) => sum + place.visible, 0),
        score: set.places.reduce((sum, place) => sum + place.cost, 0),
        pieces: piecesOf(ground.deck, { rows: [], cross: [xs] }, cutouts, layout.material.thickness),
        best: i === 0,
      };
    });
  });
}

function setsOf(ground: SeamGround, row: Row, zones: readonly Zone[], plan: SeamPlan): readonly Division[] {
  const pins = plan.seams.filter((seam) => seam.pinned).map((seam) => seamPlace(row, ground.holes, seam.at));
  const marks = [row.from, ...pins.map((pin) => pin.x), row.to];
  const free = plan.cut.cross[0]!.filter((x) => !pins.some((pin) => pin.x === x));
  let sets: readonly Division[] = [{ places: [], cost: 0 }];
  for (let i = 1; i < marks.length; i++) {
    const span: Span = {
      from: marks[i - 1]!,
      to: marks[i]!,
      longest: plan.longest[0]!,
      shortest: ground.limits.shortestPiece,
    };
    const count = free.filter((x) => x > span.from && x < span.to).length;
    const choices = count === 0 ? [{ places: [], cost: 0 }] : spanSets(ground, row, zones, span, count);
    sets = sets.flatMap((set) => choices.map((choice) => joined(set, choice, pins[i - 1]))).slice(0, MOST_SETS);
  }
  return sets;
}

const joined = (set: Division, choice: Division, pin: SeamPlace | undefined): Division => ({
  places: [...set.places, ...choice.places, ...(pin ? [pin] : [])],
  cost: set.cost + choice.cost + (pin?.cost ?? 0),
});

/** The best division of a span, those with a piece that just fits some slab, then others by cost. */
function spanSets(
  ground: SeamGround,
  row: Row,
  zones: readonly Zone[],
  span: Span,
  count: number,
): readonly Division[] {
  const lengths = [...ground.stock.slabs, ...ground.stock.rack].map((slab) => slab.length);
  const fits = lengths.flatMap((length) => [span.from + length, span.to - length]);
  const places = seamPlaces(row, ground.holes, zones, span, count, fits);
  const best = divide(span, places, count);
  const through = (some: readonly SeamPlace[]) =>
    some.flatMap((place) => forcedThrough(place, span, places, count) ?? []).sort((a, b) => a.cost - b.cost);
  const fitting = through(places.filter(({ x }) => fits.some((fit) => Math.abs(fit - x) < 1e-6)));
  return distinct([...(best ? [best] : []), ...fitting.slice(0, MOST_SETS - 3), ...through(places)]).slice(
    0,
    MOST_SETS,
  );
}

/** Best division with a seam at one place, or null when none has it. */
function forcedThrough(place: SeamPlace, span: Span, places: readonly SeamPlace[], count: number): Division | null {
  const before = fewest({ ...span, to: place.x });
  const left = divided({ ...span, to: place.x }, places, before);
  const right = divided({ ...span, from: place.x }, places, count - 1 - before);
  if (!left || !right) return null;
  return { places: [...left.places, place, ...right.places], cost: left.cost + place.cost + right.cost };
}

/** Leaves out sets that are nearly one listed before them. */
function distinct(sets: readonly Division[]): readonly Division[] {
  const kept: Division[] = [];
  for (const set of sets) {
    const same = (other: Division) => other.places.every((place, i) => Math.abs(place.x - set.places[i]!.x) < SAME_SET);
    if (!kept.some(same)) kept.push(set);
  }
  return kept;
}

function divided(span: Span, places: readonly SeamPlace[], count: number): Division | null {
  if (count < 0 || span.to - span.from < span.shortest - 1e-6) return null;
  if (count > 0)
    return divide(
      span,
      places.filter(({ x }) => x > span.from && x < span.to),
      count,
    );
  return span.to - span.from <= span.longest + 1e-6 ? { places: [], cost: 0 } : null;
}
