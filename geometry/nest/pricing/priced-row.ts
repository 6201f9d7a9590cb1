import type { Stock } from '../model/problem';
import type { RowCandidate } from './search-rows';

/** A row with the slab it was priced on. */
export interface PricedRow extends RowCandidate {
  readonly stock: Stock;
}
