import { parentPort, workerData } from 'node:worker_threads';

import { nest } from '@/geometry/nest/nest';
import type { NestInstance } from '@/geometry/nest/types';

const { instance, limitMs } = workerData as { readonly instance: NestInstance; readonly limitMs: number };
const end = performance.now() + limitMs;

parentPort?.postMessage(nest(instance, { stop: () => performance.now() > end }));
