import type { ReactNode } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';

import { color, INSPECTOR_WIDTH, space } from './tokens';

export interface InspectorProps {
  /** What it is about, for screen readers: "Wall B", "Findings". */
  readonly label: string;
  /** Stays at the top: a title, tabs. */
  readonly head?: ReactNode;
  readonly children: ReactNode;
  /** The content reaches from side to side and brings its own gutter: rows of findings. */
  readonly flush?: boolean;
  /** Stays at the foot: the fit report, a held sign-off. */
  readonly foot?: ReactNode;
}

/** The right column of wide screens, 372 to 392 px. */
export function Inspector({ label, head, children, foot, flush = false }: InspectorProps) {
  return (
    <View role="complementary" aria-label={label} style={styles.column}>
      {head}
      <ScrollView style={styles.body} contentContainerStyle={flush ? undefined : styles.content}>
        {children}
      </ScrollView>
      {foot && <View style={styles.foot}>{foot}</View>}
    </View>
  );
}

const styles = StyleSheet.create({
  column: {
    minWidth: INSPECTOR_WIDTH.least,
    maxWidth: INSPECTOR_WIDTH.most,
    flexBasis: '27%',
    flexShrink: 0,
    minHeight: 0,
    backgroundColor: color.card,
    borderLeftWidth: 1,
    borderLeftColor: color.line,
  },
  body: { flex: 1 },
  content: { padding: 20, gap: space.l },
  foot: { padding: 20, paddingTop: space.s },
});
