import { useRouter } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { sentenceOf, type ApiProblem } from '../api/api-problem';
import { JobProvider } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';

/** Opens the job of this address for every step below it. */
export function JobLoader({ jobId, children }: { readonly jobId: string; readonly children: ReactNode }) {
  return (
    <JobProvider
      key={jobId}
      jobId={jobId}
      loading={
        <View style={styles.page} role="status">
          <Text kind="second">Opening the job</Text>
        </View>
      }
      failed={(problem, again) => <JobFailed problem={problem} onAgain={again} />}
    >
      {children}
    </JobProvider>
  );
}

const TITLES: Readonly<Record<ApiProblem['kind'], string>> = {
  offline: 'No signal',
  server: 'The job did not come',
  'signed-out': 'Signed out',
  problem: 'This job cannot be opened',
};

function JobFailed({ problem, onAgain }: { readonly problem: ApiProblem; readonly onAgain: () => void }) {
  const router = useRouter();
  return (
    <View style={styles.page}>
      <View style={styles.card} role="alert">
        <Icon
          name={problem.kind === 'offline' ? 'cloudoff' : 'warn'}
          size={28}
          tone={problem.kind === 'offline' ? 'ink' : 'red'}
        />
        <Text kind="rowTitle" level={1}>
          {TITLES[problem.kind]}
        </Text>
        <Text kind="second">{sentenceOf(problem)}</Text>
        <Button label="Try now" wide onPress={onAgain} />
        <Button label="To the jobs" wide href="/jobs" onPress={() => router.navigate('/jobs' as never)} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1, alignItems: 'center', justifyContent: 'center', padding: space.l, backgroundColor: color.paper },
  card: {
    width: '100%',
    maxWidth: 420,
    gap: space.m,
    padding: space.l,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
  },
});
