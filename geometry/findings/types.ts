export type Severity = 'stop' | 'warn' | 'note';

export interface FindingPlace {
  readonly pieces?: readonly string[];
  readonly run?: string;
  readonly joint?: readonly [string, string];
  readonly seam?: { readonly on: string; readonly at: number };
  readonly cutout?: string;
  readonly wall?: string;
  readonly corner?: readonly [string, string];
  readonly slab?: string;
  readonly base?: string;
  /** Tells two facts of one rule at one place apart, such as a side or a reading. */
  readonly detail?: string;
}

/** Something a person has to fix ('stop'), look at ('warn') or know ('note'). */
export interface Finding {
  /** Same fact, same key across edits: code and place. */
  readonly key: string;
  readonly code: string;
  readonly severity: Severity;
  /** The fact, one sentence with the number and the limit in it. */
  readonly text: string;
  /** What to do, one sentence. */
  readonly action: string;
  readonly at: FindingPlace;
  /** Published source, or 'common practice', or 'from memory'. */
  readonly source: string;
}
