import { use } from 'react';

/** Milliseconds for which a failure is remembered: long enough to be shown, over before a person presses "Try again". */
const FAILURE_KEPT = 500;

export interface LatePart<Part> {
  /** Loads the part, once for all callers; some time after a failure the next call tries again. */
  readonly fetchPart: () => Promise<Part>;
  /** The part; suspends until it is there, and throws to the error boundary when it does not come. */
  readonly usePart: () => Part;
}

/** A part of the app whose code comes later than the first screen. */
export function latePart<Part>(load: () => Promise<Part>): LatePart<Part> {
  let arriving: Promise<Part> | null = null;
  const fetchPart = () => {
    if (arriving === null) {
      arriving = load();
      arriving.catch(() => setTimeout(() => (arriving = null), FAILURE_KEPT));
    }
    return arriving;
  };
  const usePart = () => use(fetchPart());
  return { fetchPart, usePart };
}
