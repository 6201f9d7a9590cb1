import { toDegrees, toRadians } from '../core/angle';
import type { Layout } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import { extent, type Deck } from '../top/deck';
import { legsOf, piecesOf, type BarePiece } from '../top/deck-pieces';
import { islandDecks } from '../top/island-decks';
import { checkCutouts, checkDecks } from '../top/lay-checks';
import { layCutouts, type LaidCutout } from '../top/lay-cutouts';
import type { LaidJoint } from '../top/lay-joints';
import { layRuns, type LaidRuns } from '../top/lay-runs';
import { assignLetters } from '../top/letters';
import type { SolvedRoom } from '../top/solved-room';
import type { LayProblem, Piece, PlacedCutout, TopJoint, TopSeam, Tops } from '../top/types';
import { laidSeam, type LaidSeam } from './laid-seams';
import { layStrips } from './lay-strips';
import { placeSeams } from './place-seams';
import type { SeamGround, SeamPlan } from './seam-plan';
import { cutoutsByDeck, seamGrounds } from './seam-grounds';

/** Runs, islands and cutouts as they lie, before any is cut into pieces. */
export interface LaidDecks {
  readonly laid: LaidRuns;
  readonly decks: readonly Deck[];
  readonly cutouts: readonly LaidCutout[];
  readonly onDeck: ReadonlyMap<string, readonly LaidCutout[]>;
  readonly grounds: readonly SeamGround[];
  readonly problems: readonly LayProblem[];
}

/**
 * Lays everything that lies in the room: runs, islands, strips, their joints, seams and cutouts, and the pieces they are
 * cut into.
 *
 * @returns all that could be laid, and a sentence about each thing that could not; nothing is dropped in silence
 */
export function layTops(layout: Layout, room: SolvedRoom, settings: ShopSettings): Tops {
  const { laid, decks, cutouts, onDeck, grounds, problems: deckProblems } = layDecks(layout, room, settings);
  const plans = planSeams(grounds);
  const problems: LayProblem[] = [...deckProblems];
  const runs = new Map(layout.runs.map((run) => [run.id, run]));
  const bare: BarePiece[] = [];
  const seams: LaidSeam[] = [];
  const byDeck = new Map<string, readonly BarePiece[]>();
  for (const deck of decks) {
    const plan = plans.get(deck.id)!;
    const pieces = piecesOf(deck, plan.cut, onDeck.get(deck.id)!, layout.material.thickness);
    byDeck.set(deck.id, pieces);
    bare.push(...pieces);
    problems.push(...plan.problems);
    for (const seam of plan.seams) seams.push(laidSeam(deck, seam, pieces));
    const run = runs.get(deck.id);
    if (run) bare.push(...legsOf(run, deck, layout.material.thickness));
  }
  const strips = layStrips(layout, room);
  problems.push(...checkDecks(laid, decks, layout.step), ...checkCutouts(cutouts, bare, layout), ...strips.problems);
  const all = [...bare, ...strips.pieces];
  const letters = assignLetters(
    all.map((piece) => piece.key),
    layout.letters,
  );
  const letterOf = (key: string | undefined) => (key === undefined ? '' : (letters.get(key) ?? ''));
  const pieces = all.map(({ row: _row, ...piece }): Piece => ({ ...piece, letter: letterOf(piece.key) }));
  return {
    runs: laid.runs,
    pieces,
    joints: laid.joints.map((joint) => topJoint(joint, byDeck, letterOf)),
    seams: [...seams, ...strips.seams].map(({ keys: [left, right], ...seam }): TopSeam => ({
      ...seam,
      letters: [letterOf(left), letterOf(right)],
    })),
    cutouts: placeLetters(cutouts, pieces),
    problems,
  };
}

/** The first half of `layTops`, for whoever wants to know what the seams have to choose from. */
export function layDecks(layout: Layout, room: SolvedRoom, settings: ShopSettings): LaidDecks {
  const laid = layRuns(layout, room);
  const islands = islandDecks(layout, room);
  const decks = [...laid.decks, ...islands.decks];
  const byId = new Map(decks.map((deck) => [deck.id, deck]));
  const { cutouts, problems } = layCutouts(layout, byId);
  const onDeck = cutoutsByDeck(decks, cutouts, laid.joints);
  return {
    laid,
    decks,
    cutouts,
    onDeck,
    grounds: seamGrounds(layout, settings, decks, onDeck, laid.walls),
    problems: [...laid.problems, ...islands.problems, ...problems, ...lostPins(layout, byId)],
  };
}

function lostPins(layout: Layout, decks: ReadonlyMap<string, Deck>): readonly LayProblem[] {
  const strips = new Set(layout.strips.map((strip) => strip.id));
  return layout.seams
    .filter(({ on }) => !decks.has(on) && !strips.has(on))
    .map(({ on }) => ({
      code: 'pin-no-top',
      message: `A seam is pinned on top ${on}, which is not laid.`,
      at: { run: on },
    }));
}

/** Seams of every deck, longest deck first: it has the first claim on a long rack piece. */
export function planSeams(grounds: readonly SeamGround[]): ReadonlyMap<string, SeamPlan> {
  const lengthOf = ({ deck }: SeamGround) => {
    const [min, max] = extent(deck);
    return max - min;
  };
  const order = [...grounds].sort((a, b) => lengthOf(b) - lengthOf(a));
  return new Map(order.map((ground) => [ground.deck.id, placeSeams(ground)]));
}

function topJoint(
  joint: LaidJoint,
  pieces: ReadonlyMap<string, readonly BarePiece[]>,
  letterOf: (key: string | undefined) => string,
): TopJoint {
  const { between, kind, length, from, to, assembled, through, cornerSd } = joint;
  const front = (id: string) => (pieces.get(id) ?? []).filter((piece) => piece.row === 0);
  return {
    between,
    kind,
    letters: [letterOf(front(between[0]).at(-1)?.key), letterOf(front(between[1])[0]?.key)],
    from,
    to,
    length,
    corner: toDegrees(joint.corner),
    cornerSd,
    angles: [toDegrees(joint.angles[0]), toDegrees(joint.angles[1])],
    openingPerSd: length * toRadians(cornerSd),
    assembled,
    ...(through !== undefined && { through }),
  };
}

function placeLetters(cutouts: readonly LaidCutout[], pieces: readonly Piece[]): readonly PlacedCutout[] {
  const letters = new Map<string, Set<string>>(cutouts.map(({ id }) => [id, new Set()]));
  for (const piece of pieces) for (const { id } of piece.cutouts) letters.get(id)!.add(piece.letter);
  return cutouts.map(({ id, placed }) => ({ ...placed, letters: [...letters.get(id)!] }));
}
