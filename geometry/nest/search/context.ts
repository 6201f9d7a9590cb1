import type { MixCut } from '../bound/cheapest-mix';
import type { Problem } from '../model/problem';
import type { Pricing } from '../pricing/pricing';
import type { DepthRows } from '../row/depth-rows';
import type { LaneTools } from './pack-sections';
import type { Column, ColumnPool, RealColumn } from './column';

/** What every stage of the search shares. */
export interface SearchContext {
  readonly problem: Problem;
  readonly rowsAt: (depth: number) => DepthRows;
  readonly lanesAt: (depth: number) => LaneTools;
  readonly pricing: Pricing;
  /** Columns for bounds, and those that can be sawn. */
  readonly relaxed: ColumnPool<Column>;
  readonly real: ColumnPool<RealColumn>;
  /** Most copies of each item in any plan. */
  readonly most: readonly number[];
  /** Adds units of work and tells whether the search must end. */
  readonly spend: (units: number) => boolean;
}

/** What a pricing of patterns under some item values proves. */
export interface Proof {
  /** By item, cents. */
  readonly value: readonly number[];
  /** By stock entry: no pattern of the class is worth more. */
  readonly worth: readonly number[];
  /** Penalties of shallow items that the worth rests on. */
  readonly penalties: readonly (readonly number[])[];
}

/** A cut with what proves it; null when areas alone do. */
export interface ProvenCut extends MixCut {
  readonly proof: Proof | null;
}

/** The inequality on what is bought that item values prove: a slab is worth no more than its best pattern. */
export function provenCut(problem: Problem, { value, worth, penalties }: Proof): ProvenCut {
  const need = (needs: readonly number[]): number => needs.reduce((sum, n, i) => sum + n * value[i]!, 0);
  return {
    worth,
    need: need(problem.fixed.need),
    optionNeed: problem.choices.map(({ options }) => options.map((o) => need(o.need))),
    proof: { value, worth, penalties },
  };
}
