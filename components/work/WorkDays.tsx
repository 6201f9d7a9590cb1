import { StyleSheet, View } from 'react-native';

import { USUAL_CALENDAR } from '@/geometry/wood/dated-schedule';
import { useOpenJob } from '../editor/JobProvider';
import { dayWords } from '../jobs/job-words';
import { Card } from '../ui/Card';
import { Checkbox } from '../ui/Checkbox';
import { DateField } from '../ui/Select';
import { Text } from '../ui/Text';
import { TypedField, type TypedValue } from '../ui/TypedField';
import { space } from '../ui/tokens';
import type { WorkSteps } from './use-work-steps';

const DAYS = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'] as const;
/** Monday first, as weeks are planned. */
const WEEK = [1, 2, 3, 4, 5, 6, 0] as const;

/** First day, working days and hours; what they make of the end. */
export function WorkDays({ ends }: Pick<WorkSteps, 'ends'>) {
  const { layout, run, mayEdit } = useOpenJob();
  const {
    start = '',
    workDays = USUAL_CALENDAR.workDays,
    hoursPerDay = USUAL_CALENDAR.hoursPerDay,
  } = layout.work ?? {};
  const toggle = (day: number, on: boolean) => {
    const days = on ? [...workDays, day].sort((a, b) => a - b) : workDays.filter((one) => one !== day);
    if (days.length > 0) run({ kind: 'setWork', value: { workDays: days } }, 'working days');
  };
  return (
    <Card>
      <Text kind="rowTitle" level={2}>
        Days
      </Text>
      <View style={styles.fields}>
        <View style={styles.field}>
          <DateField
            label="First day"
            value={start}
            disabled={!mayEdit}
            onChange={(day) => run({ kind: 'setWork', value: { start: day === '' ? null : day } }, 'first day')}
          />
        </View>
        <View style={styles.field}>
          <TypedField
            label="Hours a day"
            kind="decimal"
            value={hoursPerDay}
            disabled={!mayEdit}
            write={(hours) => String(hours)}
            read={readHours}
            onValue={(hours) => run({ kind: 'setWork', value: { hoursPerDay: hours } }, `${hours} h a day`)}
          />
        </View>
      </View>
      <View role="group" aria-label="Working days" style={styles.days}>
        {WEEK.map((day) => (
          <Checkbox
            key={day}
            label={DAYS[day]}
            checked={workDays.includes(day)}
            disabled={!mayEdit || (workDays.length === 1 && workDays.includes(day))}
            onChange={(on) => toggle(day, on)}
          />
        ))}
      </View>
      <Text kind="second">
        {ends
          ? `The last step is done ${dayWords(ends.work)}; all has cured by ${dayWords(ends.cured)}. Glue and finish wait by night as well.`
          : 'Choose the first day, and every step gets its day.'}
      </Text>
    </Card>
  );
}

function readHours(text: string): TypedValue<number> {
  const hours = Number(text.trim().replace(',', '.'));
  return Number.isFinite(hours) && hours >= 1 && hours <= 16
    ? { ok: true, value: hours }
    : { ok: false, message: 'Type hours from 1 to 16, such as 7.5.' };
}

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  field: { flexGrow: 1, flexBasis: 150, maxWidth: 260 },
  days: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space.l },
});
