import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { color, radius, space } from './tokens';

export interface CardProps {
  readonly children: ReactNode;
  /** ink: the one that is up next; chalk: chosen or in use; red: needs attention. */
  readonly frame?: 'plain' | 'ink' | 'chalk' | 'red';
  /** No padding, for a picture or a table that fills it. */
  readonly flush?: boolean;
}

/** A sheet of card on the paper ground. */
export function Card({ children, frame = 'plain', flush = false }: CardProps) {
  return <View style={[styles.card, styles[frame], !flush && styles.padded]}>{children}</View>;
}

const styles = StyleSheet.create({
  card: {
    borderRadius: radius.card,
    borderWidth: 1,
    borderColor: color.line,
    backgroundColor: color.card,
    minWidth: 0,
  },
  padded: { padding: space.l, gap: space.s },
  plain: {},
  ink: { borderColor: color.ink, boxShadow: `0 0 0 1px ${color.ink}` },
  chalk: { borderColor: color.chalk, boxShadow: `0 0 0 1.5px ${color.chalk}` },
  red: { borderColor: color.red, boxShadow: `0 0 0 1px ${color.red}` },
});
