/** A place in the plane, inches, x to the right, y up. */
export type Point = readonly [number, number];

/** A closed outline, counter-clockwise unless said otherwise; the last point joins the first by itself. */
export type Polygon = readonly Point[];
