import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Card } from '../ui/Card';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';

/** Cards side by side where there is room. */
export function Cards({ children }: { readonly children: ReactNode }) {
  return <View style={styles.cards}>{children}</View>;
}

export interface SectionProps {
  readonly title: string;
  readonly children: ReactNode;
  /** Takes the whole width. */
  readonly broad?: boolean;
}

/** A card with a heading. */
export function Section({ title, children, broad }: SectionProps) {
  return (
    <View style={[styles.section, broad && styles.broad]}>
      <Card>
        <Text kind="rowTitle" level={2}>
          {title}
        </Text>
        {children}
      </Card>
    </View>
  );
}

const styles = StyleSheet.create({
  cards: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m, alignItems: 'flex-start' },
  section: { flexGrow: 1, flexShrink: 1, flexBasis: 380, minWidth: 0, maxWidth: '100%' },
  broad: { flexBasis: '100%' },
});
