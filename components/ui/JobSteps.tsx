import { StyleSheet, View } from 'react-native';

import { Icon } from './Icon';
import { navWords, type NavItem } from './nav-item';
import { Press } from './Press';
import { Text } from './Text';
import { color } from './tokens';

export interface JobStepsProps {
  /** Room, Tops, Slabs, Sheets and what else the role may open. */
  readonly items: readonly NavItem[];
  readonly onNavigate: (href: string) => void;
}

/** The steps of a job across the top of a wide screen. */
export function JobSteps({ items, onNavigate }: JobStepsProps) {
  return (
    <View role="navigation" aria-label="Steps of this job" style={styles.steps}>
      {items.map((item) => {
        const tone = item.current ? 'ink' : 'ink2';
        return (
          <Press
            key={item.key}
            href={item.href}
            onPress={() => onNavigate(item.href)}
            aria-current={item.current ? 'page' : undefined}
            aria-label={navWords(item)}
            hoverGround={color.chalkT}
            style={styles.step}
          >
            <Icon name={item.icon} tone={tone} size={22} />
            <Text kind="labelLarge" tone={tone} hidden>
              {item.label}
            </Text>
            {item.count ? (
              <View style={styles.count} aria-hidden>
                <Icon name="look" tone="red" size={17} />
                <Text kind="labelLarge" tone="red">
                  {String(item.count)}
                </Text>
              </View>
            ) : null}
            {item.current && <View style={styles.mark} />}
          </Press>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  steps: { flexDirection: 'row', alignItems: 'stretch', gap: 14, alignSelf: 'stretch' },
  step: { flexDirection: 'row', alignItems: 'center', gap: 10, paddingHorizontal: 10, minWidth: 44 },
  count: { flexDirection: 'row', alignItems: 'center', gap: 3 },
  mark: { position: 'absolute', left: 0, right: 0, bottom: -1, height: 5, backgroundColor: color.chalk },
});
