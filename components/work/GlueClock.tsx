import { View } from 'react-native';

import type { WorkStep } from '@/geometry/wood/arrange-work';
import type { WorkMark } from '@/shared/work/work-marks';
import { Banner } from '../ui/Banner';
import { useNow } from './use-now';
import { whenWords } from './work-words';

const SECOND_MS = 1000;
const MINUTE_MS = 60 * SECOND_MS;
const HOUR_MS = 60 * MINUTE_MS;

export interface GlueClockProps {
  readonly clock: NonNullable<WorkStep['clock']>;
  readonly mark: WorkMark;
}

/** While glue is open: minutes left to the last clamp. After that: clamps off, and cured until. */
export function GlueClock({ clock, mark }: GlueClockProps) {
  const now = useNow(SECOND_MS);
  if (mark.doneAt === null) {
    if (mark.startedAt === null) return null;
    const left = Date.parse(mark.startedAt) + clock.openMinutes * MINUTE_MS - now;
    return left > 0 ? (
      <Banner icon="clock" fact={`Glue is open: ${countdown(left)} left.`} act="All clamps on by then." />
    ) : (
      <Banner
        look="attention"
        fact={`The ${clock.openMinutes} minutes are over since ${countdown(-left)}.`}
        act="If the joint is not closed, wipe it clean and begin again."
      />
    );
  }
  const cured = Date.parse(mark.doneAt) + clock.cureHours * HOUR_MS;
  return (
    <View>
      {mark.readyAt && Date.parse(mark.readyAt) > now ? (
        <Banner icon="clock" fact={`Clamps stay on until ${whenWords(mark.readyAt)}.`} />
      ) : null}
      <Banner
        icon={cured > now ? 'clock' : 'check'}
        fact={
          cured > now
            ? `Cures until ${whenWords(new Date(cured).toISOString())}.`
            : `Cured since ${whenWords(new Date(cured).toISOString())}.`
        }
        act={cured > now ? 'No load, no cut before that.' : undefined}
      />
    </View>
  );
}

/** "9:05" */
function countdown(ms: number): string {
  const seconds = Math.floor(ms / SECOND_MS);
  return `${Math.floor(seconds / 60)}:${String(seconds % 60).padStart(2, '0')}`;
}
