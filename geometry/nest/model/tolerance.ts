/**
 * The one owner of the float tolerance of the search, inches: a row may be over its slab by this much. Far under a pencil
 * line, far over the rounding of sums of a dozen lengths. A finer one loses slabs to rounding and makes false proofs.
 */
export const FIT = 1e-4;

/** Two slopes (dx/dy) closer than this make one saw cut: 1e-6 x 40 in of depth is under FIT. */
export const SAME_SLOPE = 1e-6;

/** Two lengths or depths closer than this are the same size. */
export const SAME_SIZE = 1e-6;

/** Least share by which a float bound in cents is lowered before it is rounded up to a price that can occur. */
export const BOUND_MARGIN = 1e-6;
