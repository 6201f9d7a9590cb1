import { ScrollView, StyleSheet, View } from 'react-native';

import { Button } from '../ui/Button';
import { Chips } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';

export interface PadStripProps {
  readonly label: string;
  readonly options?: readonly { readonly value: string; readonly label: string }[];
  readonly value?: string;
  readonly onChange?: (value: string) => void;
  /** Passes over what is not taken yet; left out when the walk has nothing else. */
  readonly onSkip?: () => void;
}

/** One line over the pad: how it is read, and Skip. */
export function PadStrip({ label, options = [], value, onChange, onSkip }: PadStripProps) {
  return (
    <View style={styles.strip}>
      {options.length > 0 ? (
        <ScrollView horizontal style={styles.choices} showsHorizontalScrollIndicator={false}>
          <View style={styles.chips}>
            <Chips label={label} options={options} value={value ?? null} onChange={(next) => onChange?.(next)} />
          </View>
        </ScrollView>
      ) : (
        <View style={styles.choices}>
          <Text kind="second">{label}</Text>
        </View>
      )}
      {onSkip && <Button label="Skip" look="ghost" height={44} iconAfter="next" onPress={onSkip} />}
    </View>
  );
}

const styles = StyleSheet.create({
  strip: { flexDirection: 'row', alignItems: 'center', gap: space.s, minHeight: 44 },
  choices: { flex: 1, minWidth: 0 },
  chips: { width: 'auto' },
});
