import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Icon } from './Icon';
import type { IconName } from './icon-shapes';
import { Text } from './Text';
import { color, radius, space } from './tokens';

export interface BannerProps {
  /** attention: red, something to act on; plain: good to know. */
  readonly look?: 'attention' | 'plain';
  readonly icon?: IconName;
  /** Bold fact. */
  readonly fact: ReactNode;
  /** What to do. */
  readonly act?: ReactNode;
  readonly actions?: ReactNode;
}

/** A bar across the page: "Revision 1 was printed. Bin it before cutting." */
export function Banner({ look = 'plain', icon, fact, act, actions }: BannerProps) {
  const attention = look === 'attention';
  return (
    <View role={attention ? 'alert' : 'status'} style={[styles.bar, attention ? styles.attention : styles.plain]}>
      <Icon name={icon ?? (attention ? 'warn' : 'note')} tone={attention ? 'red' : 'ink2'} />
      <View style={styles.words}>
        <Text kind="body">
          <Text kind="strong">{fact}</Text>
          {act && ' '}
          {act}
        </Text>
      </View>
      {actions}
    </View>
  );
}

/** A short note in a frame: "Taped twice", "Held for job 0142", "Saved here, 3 to send". */
export function Tag({
  icon,
  label,
  tone = 'ink',
}: {
  readonly icon?: IconName;
  readonly label: string;
  readonly tone?: 'ink' | 'chalk' | 'red';
}) {
  return (
    <View style={[styles.tag, tone !== 'ink' && { borderColor: color[tone] }]}>
      {icon && <Icon name={icon} tone={tone} size={18} />}
      <Text kind="labelSmall" tone={tone}>
        {label}
      </Text>
    </View>
  );
}

/** A key of the keyboard, as a hint. */
export function KeyHint({ name }: { readonly name: string }) {
  return (
    <View style={styles.key} aria-hidden>
      <Text kind="labelSmall" tone="ink2" size={14}>
        {name}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space.m,
    padding: space.m,
    paddingLeft: space.l,
  },
  attention: { borderLeftWidth: 6, borderLeftColor: color.red, backgroundColor: color.redT },
  plain: { borderLeftWidth: 6, borderLeftColor: color.edge, backgroundColor: color.card },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 180, minWidth: 0 },
  tag: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: 8,
    minHeight: 32,
    paddingHorizontal: 10,
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: radius.control,
    backgroundColor: color.card,
    alignSelf: 'flex-start',
  },
  key: {
    minWidth: 22,
    alignItems: 'center',
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: 3,
    paddingHorizontal: 5,
  },
});
