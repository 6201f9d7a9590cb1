import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Icon } from './Icon';
import type { IconName } from './icon-shapes';
import { Progress } from './Progress';
import { Text } from './Text';
import { color, radius, space, type ColorName } from './tokens';

export interface StateCardProps {
  readonly icon: IconName;
  readonly tone?: ColorName;
  readonly title: string;
  /** One or two sentences; a Fraction may stand in them. */
  readonly body?: ReactNode;
  /** Buttons. */
  readonly actions?: ReactNode;
  /** Something between title and body: a progress bar. */
  readonly middle?: ReactNode;
  /** alert: read out at once; status: when there is time. */
  readonly announce?: 'alert' | 'status';
}

/** A card that says how things stand and what can be done. */
export function StateCard({ icon, tone = 'ink', title, body, actions, middle, announce }: StateCardProps) {
  return (
    <View style={styles.card} role={announce}>
      <Icon name={icon} tone={tone} size={28} />
      <Text kind="rowTitle" size={21} level={2}>
        {title}
      </Text>
      {middle}
      {body && <Text kind="second">{body}</Text>}
      {actions && (
        <>
          <View style={styles.spring} />
          <View style={styles.actions}>{actions}</View>
        </>
      )}
    </View>
  );
}

interface Said {
  readonly title: string;
  readonly body?: ReactNode;
  readonly actions?: ReactNode;
}

/** Nothing here yet: says the next act and offers it. */
export const EmptyState = (props: Said & { readonly icon: IconName }) => <StateCard {...props} />;

/** Names the piece and the limit, then the fix, or says what happened and what is kept. */
export const ErrorState = (props: Said & { readonly icon?: IconName }) => (
  <StateCard icon="warn" tone="red" announce="alert" {...props} />
);

export interface LoadingStateProps {
  /** What is being done: "Trying plans". */
  readonly title: string;
  readonly icon?: IconName;
  /** "12 of 26 tried. Best so far $1,101." */
  readonly body?: ReactNode;
  /** 0 to 1; unknown when left out. */
  readonly done?: number;
  /** Stop, where it can be stopped. */
  readonly actions?: ReactNode;
}

/** Work that takes over a second: what is being done, how far it is, and Stop. */
export const LoadingState = ({ title, icon = 'clock', body, done, actions }: LoadingStateProps) => (
  <StateCard
    icon={icon}
    title={title}
    body={body}
    actions={actions}
    announce="status"
    middle={<Progress label={title} done={done} />}
  />
);

/** No signal is normal: says what is kept here and what waits to be sent. */
export const OfflineState = ({ title = 'No signal', ...props }: Partial<Said>) => (
  <StateCard icon="cloudoff" announce="status" title={title} {...props} />
);

/** The person's role may not do this: says who may. */
export const NoPermissionState = ({ title = 'Not yours to open', ...props }: Partial<Said>) => (
  <StateCard icon="person" title={title} {...props} />
);

const styles = StyleSheet.create({
  card: {
    gap: space.s,
    padding: space.l,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
    backgroundColor: color.card,
    minWidth: 0,
  },
  spring: { flexGrow: 1 },
  actions: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s, marginTop: space.s },
});
