import { HARBOUR_BAKERY_COUNTER } from './harbour-bakery-counter';
import { KILN_LANE_GALLEY } from './kiln-lane-galley';
import { LANTERN_ROW_ISLAND } from './lantern-row-island';
import { QUAY_STREET_SCULLERY } from './quay-street-scullery';

/** The demo shop's jobs as job files, by the names of the files in seeds/demo. */
export const DEMO_JOBS = {
  'quay-street-scullery': QUAY_STREET_SCULLERY,
  'harbour-bakery-counter': HARBOUR_BAKERY_COUNTER,
  'kiln-lane-galley': KILN_LANE_GALLEY,
  'lantern-row-island': LANTERN_ROW_ISLAND,
} as const;

export type DemoJob = keyof typeof DEMO_JOBS;
