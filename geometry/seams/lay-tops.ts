import type { Base, Layout, PinnedSeam } from '../core/layout';
import type { Point } from '../core/point';
import { boundingBox } from '../core/polygon';
import type { ShopSettings } from '../core/settings';
import { toDegrees, toRadians } from '../core/angle';
import { extent, outlineToOwn, outlineToRoom, toRoom, type Deck } from '../top/deck';
import { legsOf, piecesOf, type BarePiece } from '../top/deck-pieces';
import { islandDecks } from '../top/island-decks';
import { layCutouts, type LaidCutout } from '../top/lay-cutouts';
import { layRuns, type LaidJoint } from '../top/lay-runs';
import { assignLetters } from '../top/letters';
import type { SolvedRoom } from '../top/solved-room';
import { stripPieces } from '../top/strip-pieces';
import type { LayProblem, Piece, PlacedCutout, TopJoint, TopSeam, Tops } from '../top/types';
import { longestCarried, longStock, longestPiece, WholePieces } from './long-stock';
import { placeSeams, type PlannedSeam, type SeamGround, type SeamPlan } from './place-seams';
import { spanAt } from '../top/deck-span';
import type { Hole } from './seam-zones';

/**
 * Lays everything that lies in the room: runs, islands, strips, their joints, seams and cutouts, and the pieces they are
 * cut into.
 *
 * @param room - the solved room
 * @returns all that could be laid, and a sentence about each thing that could not
 */
export function layTops(layout: Layout, room: SolvedRoom, settings: ShopSettings): Tops {
  const laid = layRuns(layout, room);
  const islands = islandDecks(layout, room);
  const decks = [...laid.decks, ...islands.decks];
  const byId = new Map(decks.map((deck) => [deck.id, deck]));
  const { cutouts, problems: cutoutProblems } = layCutouts(layout, byId);
  const problems: LayProblem[] = [...laid.problems, ...islands.problems, ...cutoutProblems];
  const onDeck = cutoutsByDeck(decks, cutouts, laid.joints);
  const grounds = seamGrounds(layout, settings, decks, onDeck);
  const plans = planAll(grounds);
  const bare: BarePiece[] = [];
  const seams: (Omit<TopSeam, 'letters'> & { readonly keys: readonly [string, string] })[] = [];
  const runs = new Map(layout.runs.map((run) => [run.id, run]));
  const { thickness } = layout.material;
  const piecesByDeck = new Map<string, readonly BarePiece[]>();
  for (const deck of decks) {
    const plan = plans.get(deck.id)!;
    problems.push(...plan.problems);
    const pieces = piecesOf(deck, plan.cut, onDeck.get(deck.id) ?? [], thickness);
    piecesByDeck.set(deck.id, pieces);
    bare.push(...pieces);
    for (const seam of plan.seams) seams.push(topSeam(deck, seam, pieces));
    const run = runs.get(deck.id);
    if (run) bare.push(...legsOf(run, deck, thickness));
  }
  const strips = layStrips(layout, room);
  bare.push(...strips.pieces);
  seams.push(...strips.seams);
  const letters = assignLetters(
    bare.map((piece) => piece.key),
    layout.letters,
  );
  const letterOf = (key: string) => letters.get(key) ?? '';
  const pieces = bare.map(({ row: _row, ...piece }): Piece => ({ ...piece, letter: letterOf(piece.key) }));
  return {
    runs: laid.runs,
    pieces,
    joints: laid.joints.map((joint) => topJoint(joint, piecesByDeck, letterOf)),
    seams: seams.map(({ keys, ...seam }): TopSeam => ({ ...seam, letters: [letterOf(keys[0]), letterOf(keys[1])] })),
    cutouts: placeLetters(cutouts, pieces),
    problems,
  };
}

/** Cutouts that may touch each deck: its own, and those of the runs it is joined to. */
function cutoutsByDeck(
  decks: readonly Deck[],
  cutouts: readonly LaidCutout[],
  joints: readonly LaidJoint[],
): ReadonlyMap<string, readonly LaidCutout[]> {
  const touching = new Map<string, LaidCutout[]>(decks.map((deck) => [deck.id, []]));
  for (const cutout of cutouts) touching.get(cutout.deck.id)!.push(cutout);
  const own = new Map([...touching].map(([id, list]) => [id, [...list]]));
  for (const { between } of joints) {
    const [a, b] = between;
    touching.get(a)!.push(...own.get(b)!);
    touching.get(b)!.push(...own.get(a)!);
  }
  return touching;
}

/** What decides about the seams of each deck. */
export function seamGrounds(
  layout: Layout,
  settings: ShopSettings,
  decks: readonly Deck[],
  onDeck: ReadonlyMap<string, readonly LaidCutout[]>,
): readonly SeamGround[] {
  const stock = longStock(layout);
  const whole = new WholePieces(stock);
  const carried = longestCarried(layout.access, layout.material.thickness);
  const bases = grouped(layout.bases, (base: Base) => base.wall);
  const pins = grouped(layout.seams, (pin: PinnedSeam) => pin.on);
  const wallOf = new Map(layout.runs.map((run) => [run.id, run.side === 'back' ? null : run.wall]));
  return decks.map((deck) => ({
    deck,
    holes: (onDeck.get(deck.id) ?? []).map((cutout) => holeOn(deck, cutout)),
    bases: bases.get(wallOf.get(deck.id) ?? '') ?? [],
    pins: (pins.get(deck.id) ?? []).map((pin) => pin.at),
    limits: settings.seams,
    stock,
    whole,
    carried,
    step: layout.step,
  }));
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

/** Longest decks first: they have the first claim on long rack pieces. */
function planAll(grounds: readonly SeamGround[]): ReadonlyMap<string, SeamPlan> {
  const lengthOf = ({ deck }: SeamGround) => {
    const [min, max] = extent(deck);
    return max - min;
  };
  const order = [...grounds].sort((a, b) => lengthOf(b) - lengthOf(a));
  return new Map(order.map((ground) => [ground.deck.id, placeSeams(ground)]));
}

function topSeam(
  deck: Deck,
  seam: PlannedSeam,
  pieces: readonly BarePiece[],
): Omit<TopSeam, 'letters'> & { readonly keys: readonly [string, string] } {
  const place = (p: Point) => toRoom(deck.frame, p);
  const common = { on: deck.id, visible: seam.visible, inCutout: seam.inCutout?.id ?? null, pinned: seam.pinned };
  if (seam.kind === 'edge') {
    const [from, to] = extent(deck);
    const front = pieces.find((piece) => piece.row === seam.row - 1);
    const back = pieces.find((piece) => piece.row === seam.row);
    return {
      ...common,
      at: seam.at,
      from: place([from, seam.at]),
      to: place([to, seam.at]),
      keys: [front?.key ?? '', back?.key ?? ''],
      edge: true,
    };
  }
  const inRow = pieces.filter((piece) => piece.row === seam.row);
  const start = ([x, y]: Point) =>
    (x - deck.frame.origin[0]) * deck.frame.x[0] + (y - deck.frame.origin[1]) * deck.frame.x[1];
  const mid = (piece: BarePiece) => start(piece.origin) + boundingBox(piece.shape).maxX / 2;
  const before = inRow.filter((piece) => mid(piece) < seam.at);
  const after = inRow.filter((piece) => mid(piece) >= seam.at);
  const ends = deck.sign === 1 ? [before[before.length - 1], after[0]] : [after[after.length - 1], before[0]];
  const span = spanAt(deck.outline, seam.at) ?? [0, deck.depth];
  return {
    ...common,
    at: deck.sign * seam.at,
    from: place([seam.at, span[1]]),
    to: place([seam.at, span[0]]),
    keys: [ends[0]?.key ?? '', ends[1]?.key ?? ''],
  };
}

function topJoint(
  joint: LaidJoint,
  pieces: ReadonlyMap<string, readonly BarePiece[]>,
  letterOf: (key: string) => string,
): TopJoint {
  const [left, right] = joint.between;
  const front = (id: string) => (pieces.get(id) ?? []).filter((piece) => piece.row === 0);
  const leftRow = front(left);
  const { kind, length, from, to, assembled, through } = joint;
  return {
    between: joint.between,
    kind,
    letters: [letterOf(leftRow[leftRow.length - 1]?.key ?? ''), letterOf(front(right)[0]?.key ?? '')],
    from,
    to,
    length,
    corner: toDegrees(joint.corner),
    cornerSd: joint.cornerSd,
    angles: [toDegrees(joint.angles[0]), toDegrees(joint.angles[1])],
    openingPerSd: length * toRadians(joint.cornerSd),
    assembled,
    ...(through !== undefined && { through }),
  };
}

function placeLetters(cutouts: readonly LaidCutout[], pieces: readonly Piece[]): readonly PlacedCutout[] {
  const letters = new Map<string, string[]>();
  for (const piece of pieces) {
    for (const { id } of piece.cutouts) {
      const list = letters.get(id) ?? [];
      if (!list.includes(piece.letter)) list.push(piece.letter);
      letters.set(id, list);
    }
  }
  return cutouts.map(({ id, placed }) => ({ ...placed, letters: letters.get(id) ?? [] }));
}

/** Clear floor between the room and the strips drawn below it, and between strips, inches. */
const BELOW_ROOM = 24;
const BETWEEN_STRIPS = 6;

/** Strips one below the other under the room, each cut evenly where it is longer than a slab of the job's thickness or than what can be carried in. */
function layStrips(layout: Layout, room: SolvedRoom) {
  const stock = longStock(layout);
  const box = boundingBox(room.points);
  const x = Number.isFinite(box.minX) ? box.minX : 0;
  let y = (Number.isFinite(box.minY) ? box.minY : 0) - BELOW_ROOM;
  const pieces: BarePiece[] = [];
  const seams: (Omit<TopSeam, 'letters'> & { readonly keys: readonly [string, string] })[] = [];
  for (const strip of layout.strips) {
    if (!(strip.length > 0 && strip.width > 0)) continue;
    y -= strip.width;
    const sameStock = strip.thickness === layout.material.thickness;
    const longest = Math.min(
      sameStock ? longestPiece(stock, strip.width) : Infinity,
      longestCarried(layout.access, strip.thickness),
    );
    const count = Math.max(0, Math.ceil((strip.length - 1e-6) / longest) - 1);
    const marks = Array.from({ length: count }, (_, i) => (strip.length * (i + 1)) / (count + 1));
    const cut = stripPieces(strip, marks, [x, y]);
    pieces.push(...cut);
    marks.forEach((at, i) =>
      seams.push({
        on: strip.id,
        at,
        from: [x + at, y + strip.width],
        to: [x + at, y],
        visible: strip.width,
        inCutout: null,
        pinned: false,
        keys: [cut[i]!.key, cut[i + 1]!.key],
      }),
    );
    y -= BETWEEN_STRIPS;
  }
  return { pieces, seams };
}
