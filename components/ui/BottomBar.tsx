import { StyleSheet, View } from 'react-native';

import { CountDisc } from './CountDisc';
import { Icon } from './Icon';
import { navWords, type NavItem } from './nav-item';
import { Press } from './Press';
import { Text } from './Text';
import { color } from './tokens';
import { webStyle } from './web-style';

export interface BottomBarProps {
  readonly items: readonly NavItem[];
  /** "Steps of this job", "Sections". */
  readonly label: string;
  readonly onNavigate: (href: string) => void;
}

/** The bar at the foot of a phone. */
export function BottomBar({ items, label, onNavigate }: BottomBarProps) {
  return (
    <View role="navigation" aria-label={label} style={[styles.bar, styles.safe]}>
      {items.map((item) => {
        const tone = item.current ? 'chalk' : 'ink2';
        return (
          <Press
            key={item.key}
            href={item.href}
            onPress={() => onNavigate(item.href)}
            aria-current={item.current ? 'page' : undefined}
            aria-label={navWords(item)}
            style={styles.item}
          >
            {item.current && <View style={styles.mark} />}
            <View>
              <Icon name={item.icon} tone={tone} />
              {item.count ? (
                <View style={styles.disc}>
                  <CountDisc count={item.count} />
                </View>
              ) : null}
            </View>
            <Text kind="labelSmall" tone={tone} hidden lines={1}>
              {item.label}
            </Text>
          </Press>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    flexShrink: 0,
    backgroundColor: color.card,
    borderTopWidth: 1,
    borderTopColor: color.line,
    paddingHorizontal: 8,
  },
  safe: webStyle({ paddingBottom: 'max(8px, env(safe-area-inset-bottom))' }),
  item: { flex: 1, minWidth: 44, minHeight: 64, alignItems: 'center', justifyContent: 'center', gap: 5, paddingTop: 4 },
  mark: { position: 'absolute', top: -1, height: 4, width: 66, maxWidth: '90%', backgroundColor: color.chalk },
  disc: { position: 'absolute', top: -8, left: 17 },
});
