import { createWriteStream } from 'node:fs';
import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import { pipeline } from 'node:stream/promises';

import type { Layout } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import { cutSheetPdf } from '../sheets/cut-sheet';

export interface SheetsRequest {
  readonly plan: Plan;
  readonly layout: Layout;
  /** Name of the job. */
  readonly name: string;
  /** Place of the job in its batch. */
  readonly index: number;
}

/** A file has no revision and no day of its own: its sheets are drafts of revision 0, alike on any day. */
const NO_DATE = '2000-01-01';

/**
 * Writes a job's sheets as PDF files.
 *
 * @param folder - made when it is not there
 * @returns paths of the files; none when the pieces are not nested
 */
export async function writeSheets(folder: string, { plan, layout, name, index }: SheetsRequest): Promise<string[]> {
  if (!plan.nest || plan.nest.slabs.length === 0) return [];
  await mkdir(folder, { recursive: true });
  const file = path.join(folder, `${fileName(name, index)}-cut.pdf`);
  const head = {
    jobNumber: String(index + 1).padStart(4, '0'),
    jobName: name,
    revision: 0,
    revisionDate: NO_DATE,
    drawnBy: '',
    signedBy: null,
    draft: true,
  };
  await pipeline(cutSheetPdf({ plan, layout, head, paper: 'letter' }), createWriteStream(file));
  return [file];
}

/** A file name of the job's own letters; jobs of one batch never share one. */
function fileName(name: string, index: number): string {
  const plain = name
    .normalize('NFKD')
    .toLowerCase()
    .replaceAll(/[^a-z0-9]+/g, '-')
    .replaceAll(/^-+|-+$/g, '');
  return [String(index + 1), plain.slice(0, 60)].filter(Boolean).join('-');
}
