import * as auth from './auth';
import type { Contract } from './contract';
import * as crew from './crew';
import * as health from './health';
import * as jobFiles from './job-files';
import * as jobs from './jobs';
import * as layouts from './layouts';
import * as nest from './nest';
import * as rack from './rack';
import * as revisions from './revisions';
import * as shop from './shop';
import * as sheetActs from './sheet-acts';
import * as stock from './stock';
import * as work from './work';

export interface NamedContract {
  /** As exported: `signIn`, `postEdits` … */
  readonly name: string;
  /** `auth`, `jobs` … */
  readonly resource: string;
  readonly contract: Contract;
}

const RESOURCES = { health, auth, crew, shop, jobs, layouts, jobFiles, nest, revisions, stock, rack, sheetActs, work };

/** Every contract there is, for the API document and for tests that go through all of them. */
export const ALL_CONTRACTS: readonly NamedContract[] = Object.entries(RESOURCES).flatMap(([resource, exported]) =>
  Object.entries(exported as Record<string, unknown>).flatMap(([name, value]) =>
    isContract(value) ? [{ name, resource, contract: value }] : [],
  ),
);

function isContract(value: unknown): value is Contract {
  return typeof value === 'object' && value !== null && 'method' in value && 'path' in value && 'may' in value;
}
