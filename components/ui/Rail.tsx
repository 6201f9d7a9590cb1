import { StyleSheet, View } from 'react-native';

import { Icon } from './Icon';
import { Logo } from './Logo';
import { navWords, type NavItem } from './nav-item';
import { Press } from './Press';
import { Text } from './Text';
import { color } from './tokens';

export interface RailProps {
  /** Jobs, Rack, Stock, Crew: what the person's role may open. */
  readonly items: readonly NavItem[];
  /** At the foot: settings, account. */
  readonly foot?: readonly NavItem[];
  /** Where the logo goes. */
  readonly home: string;
  readonly onNavigate: (href: string) => void;
}

export const RAIL_WIDTH = 88;

/** The dark rail of wide screens. Yellow marks the current place. */
export function Rail({ items, foot = [], home, onNavigate }: RailProps) {
  return (
    <View role="navigation" aria-label="Sections" style={styles.rail}>
      <Press href={home} onPress={() => onNavigate(home)} aria-label="Offsquare, to the jobs" style={styles.logo}>
        <Logo size={36} onDark />
      </Press>
      {items.map((item) => (
        <RailLink key={item.key} item={item} onNavigate={onNavigate} />
      ))}
      <View style={styles.gap} />
      {foot.map((item) => (
        <RailLink key={item.key} item={item} onNavigate={onNavigate} />
      ))}
    </View>
  );
}

function RailLink({ item, onNavigate }: { readonly item: NavItem; readonly onNavigate: (href: string) => void }) {
  const tone = item.current ? 'tapeInk' : 'railText';
  return (
    <Press
      href={item.href}
      onPress={() => onNavigate(item.href)}
      aria-current={item.current ? 'page' : undefined}
      aria-label={navWords(item)}
      hoverGround={item.current ? undefined : 'rgba(255, 255, 255, 0.1)'}
      style={[styles.item, item.current && styles.current]}
    >
      <Icon name={item.icon} tone={tone} />
      <Text kind="labelSmall" tone={tone} hidden>
        {item.label}
      </Text>
    </Press>
  );
}

const styles = StyleSheet.create({
  rail: { width: RAIL_WIDTH, backgroundColor: color.rail, flexShrink: 0, borderRightWidth: 0 },
  logo: { height: 80, alignItems: 'center', justifyContent: 'center' },
  item: { minHeight: 66, alignItems: 'center', justifyContent: 'center', gap: 4, marginBottom: 6 },
  current: { backgroundColor: color.tape },
  gap: { flexGrow: 1 },
});
