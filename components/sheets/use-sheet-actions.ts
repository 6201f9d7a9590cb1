import { useState } from 'react';

import type { Job } from '@/shared/contracts/jobs';
import { ApiError } from '../api/api-problem';
import { fetchSheets } from '../api/use-sheets';
import { KEEP_MS, saveAs } from './save-file';

export interface SheetActions {
  readonly busy: 'download' | 'print' | null;
  readonly error: string | null;
  readonly download: () => void;
  readonly print: () => void;
}

/** Fetches the PDF of a revision or the draft, and saves or prints it. */
export function useSheetActions(choice: {
  readonly job: Job;
  readonly revision: number | 'draft';
  readonly paper: 'letter' | 'a4';
}): SheetActions {
  const [busy, setBusy] = useState<SheetActions['busy']>(null);
  const [error, setError] = useState<string | null>(null);
  const { job, revision, paper } = choice;
  const act = async (what: 'download' | 'print', deliver: (address: string) => void) => {
    setBusy(what);
    setError(null);
    try {
      const address = URL.createObjectURL(await fetchSheets({ jobId: job.id, kind: 'cut', revision, paper }));
      deliver(address);
      setTimeout(() => URL.revokeObjectURL(address), KEEP_MS);
    } catch (failure) {
      setError(failure instanceof ApiError ? failure.message : 'The file could not be opened. Try again.');
    } finally {
      setBusy(null);
    }
  };
  const name = `${String(job.number).padStart(4, '0')}-cut-${revision === 'draft' ? 'draft' : `revision-${revision}`}.pdf`;
  return {
    busy,
    error,
    download: () => void act('download', (address) => saveAs(address, name)),
    print: () => void act('print', printFile),
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
