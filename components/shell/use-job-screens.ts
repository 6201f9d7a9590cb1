import { latePart } from './late-part';

/** The screens of a job: `fetchJobScreens` starts to load them, `useJobScreens` waits for them under a Suspense. */
export const { fetchPart: fetchJobScreens, usePart: useJobScreens } = latePart(() => import('./job-screens'));
