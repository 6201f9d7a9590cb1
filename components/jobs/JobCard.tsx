import { StyleSheet, View } from 'react-native';

import type { JobListItem } from '@/shared/contracts/jobs';
import { Icon } from '../ui/Icon';
import { Press } from '../ui/Press';
import { StageChip } from '../ui/StageChip';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import { jobNumber, nextDate, people, stageWord, toLookAt } from './job-words';
import { JobThumbnail } from './JobThumbnail';

export interface JobRowProps {
  readonly job: JobListItem;
  readonly href: string;
  readonly onOpen: () => void;
  readonly selected?: boolean;
}

const spoken = (job: JobListItem): string =>
  [job.name, jobNumber(job.number), stageWord(job.stage), nextDate(job), people(job), toLookAt(job)]
    .filter(Boolean)
    .join(', ');

const dashed = (job: JobListItem): boolean => job.stage === 'new' || job.stage === 'measured';

/** A job on a phone. */
export function JobCard({ job, href, onOpen }: JobRowProps) {
  const who = people(job);
  const look = toLookAt(job);
  return (
    <Press href={href} onPress={onOpen} aria-label={spoken(job)} hoverGround={color.chalkT} style={styles.card}>
      <View style={styles.picture}>
        <JobThumbnail thumbnail={job.thumbnail} dashed={dashed(job)} width={88} height={88} />
      </View>
      <View style={styles.words}>
        <Text kind="rowTitle" hidden>
          {job.name}
        </Text>
        <Text kind="second" hidden>
          {nextDate(job) || jobNumber(job.number)}
        </Text>
        <StageChip stage={stageWord(job.stage)} />
        <View style={styles.foot}>
          {who ? (
            <View style={styles.pair}>
              <Icon name="person" size={18} />
              <View style={styles.who}>
                <Text kind="second" tone="ink" hidden>
                  {who}
                </Text>
              </View>
            </View>
          ) : null}
          {look ? (
            <View style={styles.pair}>
              <Icon name="look" tone="red" size={18} />
              <Text kind="label" tone="red" hidden>
                {look}
              </Text>
            </View>
          ) : null}
        </View>
      </View>
    </Press>
  );
}

/** A job in the table of a wide screen. */
export function JobRow({ job, href, onOpen, selected = false }: JobRowProps) {
  const look = toLookAt(job);
  return (
    <Press
      href={href}
      onPress={onOpen}
      aria-label={spoken(job)}
      hoverGround={color.chalkT}
      style={[styles.row, selected && styles.selected]}
    >
      <View style={styles.rowPicture}>
        <JobThumbnail thumbnail={job.thumbnail} dashed={dashed(job)} width={92} height={70} />
      </View>
      <View style={styles.two}>
        <Text kind="rowTitle" hidden>
          {job.name}
        </Text>
        <Text kind="small" hidden>
          {jobNumber(job.number)}
        </Text>
      </View>
      <View style={styles.stage}>
        <StageChip stage={stageWord(job.stage)} />
      </View>
      <View style={styles.one}>
        <Text hidden>{nextDate(job) || 'no date'}</Text>
      </View>
      <View style={styles.one}>
        <Text hidden>{people(job) || 'nobody yet'}</Text>
      </View>
      <View style={styles.one}>
        {look ? (
          <View style={styles.pair}>
            <Icon name="look" tone="red" size={18} />
            <Text kind="label" tone="red" hidden>
              {look}
            </Text>
          </View>
        ) : (
          <Text hidden>none</Text>
        )}
      </View>
      <Icon name="next" />
    </Press>
  );
}

export function JobTableHead() {
  return (
    <View style={[styles.row, styles.head]} aria-hidden>
      <View style={styles.rowPicture}>
        <Text kind="label">Top</Text>
      </View>
      <View style={styles.two}>
        <Text kind="label">Job</Text>
      </View>
      <View style={styles.stage}>
        <Text kind="label">Stage</Text>
      </View>
      {['Next date', 'Who', 'To look at'].map((title) => (
        <View key={title} style={styles.one}>
          <Text kind="label">{title}</Text>
        </View>
      ))}
      <View style={styles.arrow} />
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    flexDirection: 'row',
    gap: space.m,
    padding: space.m,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
  },
  picture: { backgroundColor: color.paper },
  words: { flex: 1, gap: 5, minWidth: 0 },
  foot: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', gap: space.s },
  pair: { flexDirection: 'row', alignItems: 'center', gap: 6, flexShrink: 1, minWidth: 0 },
  who: { flexShrink: 1, minWidth: 0 },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.l,
    minHeight: 98,
    paddingHorizontal: space.m,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
    backgroundColor: color.card,
  },
  selected: { backgroundColor: color.chalkT, borderLeftWidth: 6, borderLeftColor: color.chalk },
  head: { minHeight: 40, borderBottomWidth: 2, borderBottomColor: color.ink },
  rowPicture: { width: 96 },
  two: { flex: 2, minWidth: 0 },
  stage: { flex: 1.6, minWidth: 0 },
  one: { flex: 1.2, minWidth: 0 },
  arrow: { width: 24 },
});
