import { StyleSheet, View } from 'react-native';

import { ApiError } from '../api/api-problem';
import { Button } from '../ui/Button';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';

export interface JobsStateProps {
  readonly loading: boolean;
  readonly error: Error | null;
  readonly filtered: boolean;
  readonly mayCreate: boolean;
  readonly onNew: () => void;
  readonly onAgain: () => void;
  readonly onClear: () => void;
}

/** What stands where jobs would: loading, no answer, nothing found, nothing yet. */
export function JobsState(props: JobsStateProps) {
  if (props.loading && !props.error)
    return (
      <View role="status" aria-label="Loading jobs" style={styles.waiting}>
        {[0, 1, 2].map((n) => (
          <View key={n} style={styles.ghost} />
        ))}
      </View>
    );
  if (props.error) {
    const offline = props.error instanceof ApiError && props.error.problem.kind === 'offline';
    return (
      <Card
        icon={offline ? 'cloudoff' : 'warn'}
        title={offline ? 'No signal' : 'The jobs did not come'}
        text={offline ? 'Jobs opened on this device before can be opened from their own address.' : props.error.message}
      >
        <Button label="Try now" onPress={props.onAgain} wide />
      </Card>
    );
  }
  if (props.filtered)
    return (
      <Card icon="search" title="No job fits" text="No job has these words, this person and this stage together.">
        <Button label="Show all jobs" onPress={props.onClear} wide />
      </Card>
    );
  return (
    <Card
      icon="room"
      title="No jobs yet"
      text={
        props.mayCreate
          ? 'Start with a name; measure when you stand in the kitchen.'
          : 'Jobs show here once somebody opens one.'
      }
    >
      {props.mayCreate && <Button label="New job" look="primary" icon="plus" wide onPress={props.onNew} />}
    </Card>
  );
}

function Card({
  icon,
  title,
  text,
  children,
}: {
  readonly icon: 'cloudoff' | 'warn' | 'search' | 'room';
  readonly title: string;
  readonly text: string;
  readonly children?: React.ReactNode;
}) {
  return (
    <View style={styles.card} role="status">
      <Icon name={icon} size={28} tone={icon === 'warn' ? 'red' : 'ink'} />
      <Text kind="rowTitle" level={2}>
        {title}
      </Text>
      <Text kind="second">{text}</Text>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  waiting: { gap: space.m },
  ghost: {
    height: 96,
    borderRadius: radius.card,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
  },
  card: {
    maxWidth: 420,
    gap: space.m,
    padding: space.l,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
  },
});
