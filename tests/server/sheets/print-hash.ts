import { createHash } from 'node:crypto';

import { DEFAULT_SETTINGS } from '@/geometry/core/settings';
import { sheetPdf } from '@/server/sheets/sheet-pdf';

import { alderJob, HEAD } from '../../geometry/scene/alder-job';
import { readAll } from './pdf-reading';

/** Prints the SHA-256 of the demo's cut sheets; run in a process of its own by cut-sheet.test.ts. */
void readAll(sheetPdf({ kinds: ['cut'], settings: DEFAULT_SETTINGS, ...alderJob(), head: HEAD, paper: 'letter' })).then(
  (pdf) => {
    process.stdout.write(createHash('sha256').update(pdf).digest('hex'));
  },
);
