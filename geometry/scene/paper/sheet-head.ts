/** What every sheet of a job says of itself. */
export interface SheetHead {
  readonly jobNumber: string;
  readonly jobName: string;
  readonly revision: number;
  /** ISO date or date and time, UTC: "2031-05-12" or "2031-05-12T09:20:00Z". */
  readonly revisionDate: string;
  readonly drawnBy: string;
  /** Null while nobody signed it off. */
  readonly signedBy: string | null;
  /** Unsigned work: DRAFT stands across every page. */
  readonly draft: boolean;
  /** The job was changed after this revision. */
  readonly changedSince?: number;
  /** The job's address as a QR code, a text of 0 and 1 for each row from the top; none where there is no address. */
  readonly qr?: readonly string[];
}

export type Paper = 'letter' | 'a4';

/** Landscape pages, inches. */
export const PAPER_SIZE: Readonly<Record<Paper, { readonly width: number; readonly height: number }>> = {
  letter: { width: 11, height: 8.5 },
  a4: { width: 297 / 25.4, height: 210 / 25.4 },
};

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/**
 * "May 12, 2031" from an ISO date, read off its text so that no time zone shifts it.
 *
 * @throws RangeError if the text does not begin with a date
 */
export function dateWords(iso: string): string {
  const [, year, month, day] = /^(\d{4})-(\d{2})-(\d{2})/.exec(iso) ?? [];
  const name = MONTHS[Number(month) - 1];
  if (!year || !day || !name) throw new RangeError(`"${iso}" is not an ISO date`);
  return `${name} ${Number(day)}, ${year}`;
}
