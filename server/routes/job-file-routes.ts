import { Router } from 'express';

import { exportJob, importJob } from '@/shared/contracts/job-files';
import { route } from '../http/route';
import type { JobFileService } from '../services/job-file-service';

export function jobFileRoutes(files: JobFileService): Router {
  const router = Router();
  route(router, exportJob, 200, async ({ actor, params, res }) => {
    const { name, file } = await files.export(actor, params.jobId);
    res.attachment(`${fileNameOf(name)}.json`);
    return file;
  });
  route(router, importJob, 201, ({ actor, body }) => files.import(actor, body));
  return router;
}

/** A name that every file system takes. */
function fileNameOf(name: string): string {
  const plain = name
    .normalize('NFKD')
    .replaceAll(/[^\w -]/g, '')
    .trim()
    .replaceAll(/\s+/g, '-')
    .toLowerCase();
  return plain.slice(0, 80) || 'job';
}
