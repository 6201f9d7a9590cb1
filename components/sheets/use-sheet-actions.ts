import { useState } from 'react';

import type { LabelChoice } from '@/geometry/scene/labels/label-grids';
import type { Job } from '@/shared/contracts/jobs';
import type { SheetChoice } from '@/shared/contracts/sheets';
import { ApiError } from '../api/api-problem';
import { fetchBundle, useAfterPrint } from '../api/use-sheet-acts';
import { fetchSheets } from '../api/use-sheets';
import { KEEP_MS, saveAs } from './save-file';

export interface SheetActions {
  readonly busy: 'download' | 'print' | 'bundle' | null;
  readonly error: string | null;
  /** `pages` such as "1-3,5"; all when left out. */
  readonly download: (kind: SheetChoice, pages?: string) => void;
  readonly print: (kind: SheetChoice, pages?: string) => void;
  /** Everything in one archive. */
  readonly bundle: () => void;
}

/** Fetches files of a revision or the draft, and saves or prints them. */
export function useSheetActions(choice: {
  readonly job: Job;
  readonly revision: number | 'draft';
  readonly paper: 'letter' | 'a4';
  readonly labels: LabelChoice;
}): SheetActions {
  const [busy, setBusy] = useState<SheetActions['busy']>(null);
  const [error, setError] = useState<string | null>(null);
  const { job, revision, paper, labels } = choice;
  const printed = useAfterPrint(job.id);
  const act = async (what: NonNullable<typeof busy>, file: Promise<Blob>, deliver: (address: string) => void) => {
    setBusy(what);
    setError(null);
    try {
      const address = URL.createObjectURL(await file);
      deliver(address);
      setTimeout(() => URL.revokeObjectURL(address), KEEP_MS);
      printed();
    } catch (failure) {
      setError(failure instanceof ApiError ? failure.message : 'The file could not be opened. Try again.');
    } finally {
      setBusy(null);
    }
  };
  const version = revision === 'draft' ? 'draft' : `revision-${revision}`;
  const name = (what: string) => `${String(job.number).padStart(4, '0')}-${what}-${version}`;
  const sheets = (kind: SheetChoice, pages?: string) =>
    fetchSheets({ jobId: job.id, kind, revision, paper, labels, ...(pages && { pages }) });
  return {
    busy,
    error,
    download: (kind, pages) =>
      void act('download', sheets(kind, pages), (address) => saveAs(address, `${name(kind)}.pdf`)),
    print: (kind, pages) => void act('print', sheets(kind, pages), printFile),
    bundle: () =>
      void act('bundle', fetchBundle(job.id, revision, paper), (address) => saveAs(address, `${name('all')}.zip`)),
  };
}

/** Prints from a hidden frame; where the browser has no viewer in frames, the file opens in a tab of its own. */
function printFile(address: string): void {
  const frame = document.createElement('iframe');
  frame.style.position = 'fixed';
  frame.style.width = '0';
  frame.style.height = '0';
  frame.style.border = '0';
  frame.title = 'Sheets to print';
  frame.src = address;
  frame.onload = () => {
    try {
      frame.contentWindow?.focus();
      frame.contentWindow?.print();
    } catch {
      window.open(address, '_blank');
    }
  };
  document.body.append(frame);
  setTimeout(() => frame.remove(), KEEP_MS);
}
