import { useRouter } from 'expo-router';
import { useEffect, useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { JobListItem } from '@/shared/contracts/jobs';
import { STAGES as STAGE_KEYS } from '@/shared/roles/stages';
import { useJobList, type JobFilter } from '../api/use-jobs';
import { useMay, useSession } from '../api/use-session';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { PageFrame } from '../ui/PageFrame';
import { Chips } from '../ui/Segmented';
import { useSingleKeys } from '../ui/preferences';
import { StageRuler } from '../ui/StageRuler';
import type { Stage } from '../ui/StageChip';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { ImportJobDialog } from './ImportJobDialog';
import { JobCard, JobRow, JobTableHead } from './JobCard';
import { stageWord } from './job-words';
import { JobsState } from './JobsState';
import { NewJobDialog } from './NewJobDialog';
import { useListKeys } from './use-list-keys';

const keyOf = (stage: Stage) => STAGE_KEYS.find((key) => stageWord(key) === stage);

/** All jobs of the shop: search, whose, which stage. */
export function JobsScreen() {
  const router = useRouter();
  const wide = useWide();
  const { me } = useSession();
  const mayCreate = useMay('job.edit');
  const [search, setSearch] = useState('');
  const [whose, setWhose] = useState<'mine' | 'all'>('all');
  const [stage, setStage] = useState<Stage | null>(null);
  const [making, setMaking] = useState(false);
  const [importing, setImporting] = useState(false);
  const filter = useFilter(search, whose === 'mine' ? (me?.personId ?? null) : null, stage);
  const list = useJobList(filter);
  const jobs = useMemo(() => list.data?.pages.flatMap((page) => page.items) ?? [], [list.data]);
  const everything = useJobList({});
  const counts = useCounts(everything.data?.pages.flatMap((page) => page.items));
  const open = (job: JobListItem) =>
    router.navigate(`/jobs/${job.id}/${job.stage === 'new' ? 'room' : 'tops'}` as never);
  const [singleKeys] = useSingleKeys();
  const selected = useListKeys(jobs.length, (index) => open(jobs[index]!), wide && singleKeys);

  const searchField = (
    <Field
      label="Find a job or address"
      labelHidden
      kind="search"
      icon="search"
      placeholder="Find a job or address"
      value={search}
      onChange={setSearch}
    />
  );
  const newJob = (
    <Button
      label="New job"
      look="primary"
      icon="plus"
      wide={!wide}
      height={wide ? 48 : 56}
      onPress={() => setMaking(true)}
    />
  );
  return (
    <PageFrame
      title="Jobs"
      onNavigate={(href) => router.navigate(href as never)}
      actions={
        wide ? (
          <>
            <View style={styles.search}>{searchField}</View>
            {mayCreate && newJob}
          </>
        ) : undefined
      }
      footer={!wide && mayCreate ? <View style={styles.foot}>{newJob}</View> : undefined}
    >
      <View style={styles.filters}>
        {!wide && searchField}
        <Chips
          label="Whose jobs"
          options={[
            { value: 'all', label: 'All crew' },
            { value: 'mine', label: 'Mine' },
          ]}
          value={whose}
          onChange={setWhose}
        />
      </View>
      {wide && <StageRuler counts={counts} chosen={stage} onChoose={setStage} />}
      {jobs.length === 0 ? (
        <JobsState
          loading={list.isPending}
          error={list.error}
          filtered={search !== '' || whose === 'mine' || stage !== null}
          mayCreate={mayCreate}
          onNew={() => setMaking(true)}
          onAgain={() => void list.refetch()}
          onClear={() => {
            setSearch('');
            setWhose('all');
            setStage(null);
          }}
        />
      ) : (
        <View style={wide ? styles.table : styles.cards} role="list" aria-label="Jobs">
          {wide && <JobTableHead />}
          {jobs.map((job, index) => {
            const Item = wide ? JobRow : JobCard;
            return (
              <View key={job.id} role="listitem">
                <Item
                  job={job}
                  href={`/jobs/${job.id}`}
                  onOpen={() => open(job)}
                  selected={wide && index === selected}
                />
              </View>
            );
          })}
          {list.hasNextPage && (
            <Button label="Show more" busy={list.isFetchingNextPage} onPress={() => void list.fetchNextPage()} />
          )}
        </View>
      )}
      {wide && jobs.length > 0 && (
        <Text kind="small">
          {`Showing ${jobs.length}. Dashed outline: not drawn yet. Press J and K to move, Enter to open.`}
        </Text>
      )}
      <NewJobDialog
        open={making}
        onClose={() => setMaking(false)}
        onMade={(job) => router.navigate(`/jobs/${job.id}/room` as never)}
        onFile={() => {
          setMaking(false);
          setImporting(true);
        }}
      />
      {importing && (
        <ImportJobDialog
          onClose={() => setImporting(false)}
          onMade={(job) => router.navigate(`/jobs/${job.id}/tops` as never)}
        />
      )}
    </PageFrame>
  );
}

const SEARCH_REST_MS = 250;

/** The filter sent to the server; typing rests a moment before it asks. */
function useFilter(search: string, person: string | null, stage: Stage | null): JobFilter {
  const [asked, setAsked] = useState(search);
  useEffect(() => {
    const timer = setTimeout(() => setAsked(search.trim()), SEARCH_REST_MS);
    return () => clearTimeout(timer);
  }, [search]);
  const key = stage ? keyOf(stage) : undefined;
  return useMemo(
    () => ({ ...(asked && { search: asked }), ...(person && { person }), ...(key && { stage: key }) }),
    [asked, person, key],
  );
}

function useCounts(jobs: readonly JobListItem[] | undefined): Partial<Record<Stage, number>> {
  return useMemo(() => {
    const counts: Partial<Record<Stage, number>> = {};
    for (const job of jobs ?? []) counts[stageWord(job.stage)] = (counts[stageWord(job.stage)] ?? 0) + 1;
    return counts;
  }, [jobs]);
}

const styles = StyleSheet.create({
  search: { width: 300 },
  filters: { gap: space.m, marginBottom: space.m },
  foot: {
    padding: space.m,
    backgroundColor: color.paper,
  },
  table: {
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
    overflow: 'hidden',
    marginBottom: space.m,
  },
  cards: { gap: space.m },
});
