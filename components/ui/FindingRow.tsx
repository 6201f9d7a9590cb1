import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Severity } from '@/geometry/findings/types';

import { Icon } from './Icon';
import type { IconName } from './icon-shapes';
import { PieceLetter } from './PieceLetter';
import { Press } from './Press';
import { Text } from './Text';
import { color, space, type ColorName } from './tokens';

/** stop holds the sign-off, warn wants somebody to look, note is good to know. */
export const severityLooks: Readonly<
  Record<Severity, { readonly icon: IconName; readonly word: string; readonly tone: ColorName }>
> = {
  stop: { icon: 'warn', word: 'Must fix', tone: 'red' },
  warn: { icon: 'look', word: 'Look at', tone: 'red' },
  note: { icon: 'note', word: 'Note', tone: 'ink2' },
};

export interface FindingRowProps {
  readonly severity: Severity;
  /** The fact, bold. A Fraction may stand in it. */
  readonly fact: ReactNode;
  /** What to do, or what it means. */
  readonly act?: ReactNode;
  /** Letters of the pieces it is about. */
  readonly pieces?: readonly string[];
  /** Somebody accepted it and said why; it stays listed. */
  readonly accepted?: { readonly by: string; readonly reason: string };
  /** Where its limit is from: a document, or 'common practice'. */
  readonly source?: string;
  /** It was accepted with another number, and is open again. */
  readonly before?: { readonly by: string; readonly reason: string };
  /** Zooms to it and lights the pieces. */
  readonly onPress?: () => void;
  /** Buttons under it: "Accept", "Move the seam". */
  readonly actions?: ReactNode;
}

/** One finding: shape, word and pieces, the fact, and what to do. */
export function FindingRow(props: FindingRowProps) {
  const { severity, fact, act, pieces = [], accepted, before, source, onPress, actions } = props;
  const look = severityLooks[severity];
  const body = (
    <>
      <View style={styles.sign}>
        <Icon name={look.icon} tone={accepted ? 'ink2' : look.tone} />
      </View>
      <View style={styles.words}>
        <View style={styles.head}>
          <Text kind="labelSmall" tone={accepted ? 'ink2' : look.tone}>
            {accepted ? `${look.word}, accepted` : look.word}
          </Text>
          <View style={styles.letters}>
            {pieces.map((letter) => (
              <PieceLetter key={letter} letter={letter} />
            ))}
          </View>
        </View>
        <Text kind="strong">{fact}</Text>
        {act && <Text kind="second">{act}</Text>}
        {accepted && <Text kind="second">{`${accepted.by}: ${accepted.reason}`}</Text>}
        {before && (
          <Text kind="second">{`Open again: the number has changed since ${before.by} accepted it (${before.reason}).`}</Text>
        )}
        {source && <Text kind="small">{`By: ${source}`}</Text>}
      </View>
    </>
  );
  return (
    <View style={styles.row}>
      {onPress ? (
        <Press onPress={onPress} hoverGround={color.chalkT} style={styles.press}>
          {body}
        </Press>
      ) : (
        <View style={styles.press}>{body}</View>
      )}
      {actions && <View style={styles.actions}>{actions}</View>}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { borderBottomWidth: 1, borderBottomColor: color.line },
  press: {
    flexDirection: 'row',
    gap: space.m,
    paddingVertical: space.m,
    paddingHorizontal: space.l,
    outlineOffset: -3,
  },
  sign: { paddingTop: 2 },
  words: { flex: 1, minWidth: 0 },
  head: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', gap: space.s, minHeight: 24 },
  letters: { flexDirection: 'row', gap: space.xs },
  actions: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: space.s,
    paddingLeft: 52,
    paddingRight: space.l,
    paddingBottom: space.m,
  },
});
