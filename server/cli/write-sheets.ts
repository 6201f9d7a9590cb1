import { createWriteStream } from 'node:fs';
import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import { pipeline } from 'node:stream/promises';

import type { Layout } from '@/geometry/core/layout';
import type { Plan } from '@/geometry/plan/types';
import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { sheetEntry, SHEET_KINDS, type SheetKind } from '@/geometry/scene/sheet-kinds';
import { sheetPdf } from '../sheets/sheet-pdf';

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
 * Writes a job's sheets as PDF files, one for each kind that has something to say.
 *
 * @param folder - made when it is not there
 * @returns paths of the files; none when there are no pieces
 */
export async function writeSheets(folder: string, { plan, layout, name, index }: SheetsRequest): Promise<string[]> {
  if (plan.pieces.length === 0) return [];
  await mkdir(folder, { recursive: true });
  const head = {
    jobNumber: String(index + 1).padStart(4, '0'),
    jobName: name,
    revision: 0,
    revisionDate: NO_DATE,
    drawnBy: '',
    signedBy: null,
    draft: true,
  };
  const request = { plan, layout, settings: DEFAULT_SETTINGS, head, paper: 'letter', prices: true } as const;
  const nested = (plan.nest?.slabs.length ?? 0) > 0;
  const has = (kind: SheetKind) =>
    (nested || !sheetEntry(kind).needsSlabs) && sheetEntry(kind).pages(request).length > 0;
  const files: string[] = [];
  for (const kind of SHEET_KINDS.filter(has)) {
    const file = path.join(folder, `${fileName(name, index)}-${kind}.pdf`);
    await pipeline(sheetPdf({ ...request, kinds: [kind] }), createWriteStream(file));
    files.push(file);
  }
  return files;
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
