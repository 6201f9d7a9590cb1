import { useMemo } from 'react';

import { arrangeWork, stepsToDate, type WorkStep } from '@/geometry/wood/arrange-work';
import { datedSchedule, USUAL_CALENDAR, type DatedStep } from '@/geometry/wood/dated-schedule';
import { useOpenJob } from '../editor/JobProvider';

export interface WorkSteps {
  readonly steps: readonly WorkStep[];
  /** By key; empty while no first day is chosen. */
  readonly dated: ReadonlyMap<string, DatedStep>;
  /** Day on which the last step is over and on which all is cured. */
  readonly ends: { readonly work: string; readonly cured: string } | null;
}

/** The order of work of the open job as its crew has it, with dates when a first day is chosen. */
export function useWorkSteps(): WorkSteps {
  const { plan, layout } = useOpenJob();
  const { work } = layout;
  return useMemo(() => {
    const steps = arrangeWork(plan.schedule, work);
    if (!work?.start) return { steps, dated: new Map(), ends: null };
    const calendar = {
      ...USUAL_CALENDAR,
      workDays: work.workDays ?? USUAL_CALENDAR.workDays,
      hoursPerDay: work.hoursPerDay ?? USUAL_CALENDAR.hoursPerDay,
    };
    const all = datedSchedule(stepsToDate(steps), work.start, calendar);
    const last = all.at(-1);
    const cured = all.reduce((latest, one) => (one.ready > latest ? one.ready : latest), '');
    return {
      steps,
      dated: new Map(all.map((one) => [one.step, one])),
      ends: last ? { work: last.ends, cured } : null,
    };
  }, [plan.schedule, work]);
}
