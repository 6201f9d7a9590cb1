/** One line of the bench table. Only `ratio` says something about the code: both numbers come from the same run. */
export interface BenchRow {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  /** What it is measured against, in the same unit; null for a bare number. */
  readonly against: { readonly name: string; readonly value: number } | null;
  /** value / against; null for a bare number. */
  readonly ratio: number | null;
}
