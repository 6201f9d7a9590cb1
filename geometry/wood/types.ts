/** Moisture contents, percent, and what they move. Lengths inches. */
export interface Movement {
  readonly emc: { readonly make: number; readonly summer: number; readonly winter: number };
  /** Largest change of width across the deepest run between making, summer and winter. */
  readonly acrossPerDepth: number;
  /** Slot length for the rearmost screws. */
  readonly slot: number;
  /** Growth of the deepest run from making to the wettest season; the back gap must cover it. */
  readonly swelling: number;
  /** Shrinkage from making to the driest season. */
  readonly shrinkage: number;
  /** Change coefficient used, per 1 % of moisture, and which. */
  readonly coefficient: number;
  readonly grain: 'mixed' | 'flat' | 'edge';
  /** A moisture content lies outside 6 to 14 %, where the coefficient was measured. */
  readonly extrapolated: boolean;
  /** The wood is not in the table, so the liveliest one that is was reckoned with. */
  readonly assumedSpecies: boolean;
}

/** What wood and hardware add to a joint. Lengths inches. */
export interface JointWood {
  /** Opening at the worst season of a joint that is not glued. */
  readonly seasonal: number;
  /** Swing of the leg's end when the joint is glued. */
  readonly swing: number;
  /** Connector centres from the back point along the joint. */
  readonly connectors: readonly number[];
}

export interface ScrewChoice {
  readonly length: number;
  readonly bite: number;
  readonly left: number;
}

/** One step of the order of work. Hours of work and of waiting after it. */
export interface Step {
  readonly step: string;
  readonly part: 'shop' | 'site';
  readonly after: readonly string[];
  readonly hours: number;
  readonly waitHours: number;
  readonly pieces: readonly string[];
  readonly tools: readonly string[];
  readonly consumables: readonly string[];
  readonly caution?: string;
  /** A glue-up: minutes from the first glue to the last clamp, and hours from then to any load or cut. */
  readonly clock?: { readonly openMinutes: number; readonly cureHours: number };
}
