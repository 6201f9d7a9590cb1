import { StyleSheet, View } from 'react-native';

import { Press } from './Press';
import { Text } from './Text';
import { color, space } from './tokens';
import { useRadioKeys } from './use-radio-keys';

export interface TabsProps<T extends string> {
  readonly label: string;
  readonly tabs: readonly { readonly value: T; readonly label: string; readonly count?: number }[];
  readonly value: T;
  readonly onChange: (next: T) => void;
}

/** Tabs at the head of an inspector: "Findings 5", "Pieces 5". The chosen one carries a chalk line. */
export function Tabs<T extends string>({ label, tabs, value, onChange }: TabsProps<T>) {
  const chosen = tabs.findIndex((tab) => tab.value === value);
  const keys = useRadioKeys(tabs.length, chosen, (index) => onChange(tabs[index]!.value));
  return (
    <View role="tablist" aria-label={label} {...keys.group} style={styles.tabs}>
      {tabs.map((tab, index) => {
        const on = index === chosen;
        return (
          <Press
            key={tab.value}
            role="tab"
            aria-selected={on}
            tabIndex={keys.tabIndex(index)}
            onPress={() => onChange(tab.value)}
            style={styles.tab}
          >
            <Text kind="label" tone={on ? 'ink' : 'ink2'}>
              {tab.count === undefined ? tab.label : `${tab.label} ${tab.count}`}
            </Text>
            {on && <View style={styles.mark} />}
          </Press>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  tabs: {
    flexDirection: 'row',
    gap: space.l,
    paddingHorizontal: space.m,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
    flexShrink: 0,
  },
  tab: { minHeight: 52, minWidth: 44, justifyContent: 'center', paddingHorizontal: space.s, outlineOffset: -3 },
  mark: { position: 'absolute', left: 0, right: 0, bottom: -1, height: 5, backgroundColor: color.chalk },
});
