import type { Polygon } from '../core/point';

/**
 * Words of the `nest` format. All lengths are inches; x runs along a slab's length (the grain) from its left end,
 * y from its front edge; angles are degrees; money is whole cents.
 */

/** A zone of a slab that no part may touch. */
export interface NestDefect {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
}

/** A slab that can be bought or lies on the rack. */
export interface NestSlab {
  readonly id: string;
  readonly length: number;
  readonly depth: number;
  /** Whole cents for one. */
  readonly price: number;
  /** How many there are; null (or left out) for as many as wanted. */
  readonly count?: number | null;
  /** Cut off at each factory end, kerf included; the instance's `trim` when left out. A rack piece has 0. */
  readonly trim?: number;
  readonly defects?: readonly NestDefect[];
}

/** A part to cut: convex outline, good face up, counter-clockwise, front edge at y = 0. */
export interface NestPart {
  readonly id: string;
  /** How many alike; 1 when left out. */
  readonly count?: number;
  readonly outline: Polygon;
  /** May lie end for end (180 degrees); true when left out. */
  readonly turn?: boolean;
  /** May lie face down; true when left out. */
  readonly turnOver?: boolean;
}

/** Exactly one option is cut, and all of it. Parts named in a choice are cut only through it. */
export interface NestChoice {
  readonly id: string;
  readonly options: readonly (readonly string[])[];
}

/** Parts that lie on one slab next to each other in this order (all reversed if all are turned), none turned over. */
export interface NestGroup {
  readonly id: string;
  readonly parts: readonly string[];
}

export interface NestInstance {
  readonly id: string;
  /** Width of the saw cut, measured square to the cut. */
  readonly kerf: number;
  /** Cut off at each factory end of a slab that brings no `trim` of its own. */
  readonly trim: number;
  /** Shortest full-depth offcut worth keeping. */
  readonly reuseMin: number;
  readonly stock: readonly NestSlab[];
  readonly parts: readonly NestPart[];
  readonly choices?: readonly NestChoice[];
  readonly groups?: readonly NestGroup[];
}

/**
 * Where one part lies: mirror the outline in y if `turnedOver`, then turn it by 180 degrees if `turned`, then move it so
 * that its smallest x and smallest y are (x, y).
 */
export interface NestPlacement {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  readonly turned: boolean;
  readonly turnedOver: boolean;
}

interface CutBase {
  /** 1, 2, 3 … within the slab, in the order of sawing. */
  readonly n: number;
  /** Ids of the parts that get an edge from this cut, left (front) one first. Empty for a cut that only trims or parts waste. */
  readonly pieces: readonly string[];
  /** Index into the slab's `parts` of the part whose end lies on the near side of the kerf (left; front for a rip), or null. */
  readonly left: number | null;
  /** The same for the far side (right; back for a rip). */
  readonly right: number | null;
  /** True when this one cut makes an edge of a part on both sides. */
  readonly shared: boolean;
  /**
   * Where the kerf lies seen from the line to keep to. 'right': keep to `front`/`back` (or `across`). 'left': keep to
   * `frontFar`/`backFar` (or `acrossFar`). For a rip, 'right' means towards the back edge. With `shared` both lines count.
   */
  readonly kerfSide: 'left' | 'right';
}

/**
 * A cut across the grain, square or angled, through the whole depth of what lies on the bench. Marks are inches from the
 * slab's left end. The wood taken by the saw lies between the line `front`-`back` (the side of the kerf nearer to the left
 * end) and the parallel line `frontFar`-`backFar`; square to the cut the two are one kerf apart. `front` marks stand at
 * `yFront`, `back` marks at `yBack`: 0 and the slab's depth until the slab has been ripped, then the lane's own edges.
 */
export interface NestCrosscut extends CutBase {
  readonly kind: 'crosscut';
  readonly front: number;
  readonly back: number;
  readonly frontFar: number;
  readonly backFar: number;
  readonly yFront: number;
  readonly yBack: number;
  /** Degrees between the slab's front edge (towards +x) and the cut, counter-clockwise: 90 is square, under 90 leans right towards the back. */
  readonly angle: number;
}

/** A cut along the grain through a section between two crosscuts: wood is taken from y = `across` to y = `acrossFar`, from x = `from` to x = `to`. */
export interface NestRip extends CutBase {
  readonly kind: 'rip';
  readonly across: number;
  readonly acrossFar: number;
  readonly from: number;
  readonly to: number;
  readonly angle: 0;
}

export type NestCut = NestCrosscut | NestRip;

/** What is left of a slab. `length` x `depth` is the largest square-ended piece in it, front left corner at (x, y). */
export interface NestOffcut {
  readonly x: number;
  readonly y: number;
  readonly length: number;
  readonly depth: number;
  /** True when it has the slab's full depth and at least `reuseMin` of length. */
  readonly keep: boolean;
  /** Its true outline in slab axes, angled ends included. */
  readonly outline: Polygon;
}

export interface NestPlanSlab {
  /** Id of the stock entry it is cut from. */
  readonly stock: string;
  readonly parts: readonly NestPlacement[];
  readonly cuts: readonly NestCut[];
  readonly offcuts: readonly NestOffcut[];
}

/** Which option of a choice is cut. */
export interface NestChosen {
  readonly id: string;
  readonly option: number;
}

/** What one part costs in slabs, cents, by the dual prices of the bound: its price tag. */
export interface NestPriceTag {
  readonly id: string;
  readonly cents: number;
}

/** A value in cents for one copy of a part, or for the parts of a group that are cut together. */
export interface NestValue {
  readonly parts: readonly string[];
  readonly cents: number;
}

/**
 * Values of all parts. A slab can hold no more than its best pattern is worth, so the slabs bought must be worth all parts
 * together. In a ripped section a part may lie in one lane only: each list of `penalties` says what a part loses for every
 * lane it lies in and brings back once for each copy; under any of them the best lanes side by side are a bound for the section.
 */
export interface NestValuation {
  readonly values: readonly NestValue[];
  readonly penalties: readonly (readonly NestValue[])[];
}

/** Slabs that cannot hold the parts: no choice of rows, each short of the best by no more than these values leave, covers them. */
export interface NestSmallMix extends NestValuation {
  readonly slabs: readonly { readonly stock: string; readonly count: number }[];
  readonly choices: readonly NestChosen[];
}

/**
 * All that is needed to work `lowerBound` out again without trusting the search: the cheapest whole slabs that are worth all
 * parts under every valuation and by area, and are none of the mixes that are too small.
 */
export interface NestEvidence {
  readonly valuations: readonly NestValuation[];
  readonly tooSmall: readonly NestSmallMix[];
}

/**
 * What `lowerBound` rests on. 'area': the areas of parts and slabs alone. 'duals': values in cents for one of each part (a
 * group's members share theirs equally), and, when asked for, the whole evidence.
 */
export type NestCertificate =
  | { readonly kind: 'area' }
  | { readonly kind: 'duals'; readonly values: readonly NestPriceTag[]; readonly evidence?: NestEvidence };

export interface NestPlan {
  readonly instance: string;
  readonly slabs: readonly NestPlanSlab[];
  readonly choices: readonly NestChosen[];
  /** Whole cents. */
  readonly cost: number;
  /** No plan of the scope costs less, whole cents. */
  readonly lowerBound: number;
  /** (cost - lowerBound) / lowerBound; 0 when both are 0. */
  readonly gap: number;
  /** Cost equals the lower bound. */
  readonly proved: boolean;
  /** What the bound speaks of: 'class' = rows of full-depth parts with at most one ripped section a slab; 'any' = every plan there is. */
  readonly provedScope: 'class' | 'any';
  readonly certificate: NestCertificate;
  readonly priceTags: readonly NestPriceTag[];
  /** Units of work spent; the same instance and work limit give the same plan. */
  readonly work: number;
}

export type NestProblemCode =
  | 'no_stock'
  | 'bad_stock'
  | 'bad_part'
  | 'bad_choice'
  | 'bad_group'
  | 'bad_setting'
  | 'part_fits_no_slab'
  | 'not_enough_stock';

/** Why no plan can be made, in a sentence for the person who typed it; `path` names the place in the instance. */
export interface NestError {
  readonly error: {
    readonly code: NestProblemCode;
    readonly message: string;
    readonly path: readonly (string | number)[];
  };
}

/** How far a search has come. */
export interface NestProgress {
  /** Layouts of slabs weighed so far: units of counted work. */
  readonly tried: number;
  /** Cents of the best plan so far; null before the first. */
  readonly cost: number | null;
  /** No plan of the class costs less, cents. */
  readonly lowerBound: number;
}

export interface NestOptions {
  /** Asked now and then; true ends the search with the best plan so far. */
  readonly stop?: () => boolean;
  /** Most units of counted work; the search ends the same way on every machine. */
  readonly workLimit?: number;
  /** Puts the whole evidence for the bound into the plan's certificate. */
  readonly evidence?: boolean;
  /** Told of every better plan as it is found, with the lower bound known then. */
  readonly onBetter?: (plan: NestPlan, lowerBound: number) => void;
  /** Told of every better cost and bound, and now and then in between; cheap to call, so throttle what is costly to show. */
  readonly onProgress?: (progress: NestProgress) => void;
}
