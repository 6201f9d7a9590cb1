import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { TapeBlade } from '../measure/TapeBlade';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { useTopsPad, type PadRequest } from './tops-pad';

export interface BladeFieldProps extends Pick<PadRequest, 'check' | 'onLength'> {
  /** Label beside the blade. */
  readonly label: string;
  /** Title on the pad, where the label alone does not say whose length it is. */
  readonly title?: string;
  readonly inches: number | null;
  /** Under the label, small. */
  readonly note?: ReactNode;
  /** Words where nothing is typed yet. */
  readonly emptyWords?: string;
  /** Worked out or fixed by something else: it cannot be typed. */
  readonly fixed?: boolean;
}

/** A length on a blade: a tap opens the pad. */
export function BladeField({ label, title, inches, note, emptyWords, fixed, check, onLength }: BladeFieldProps) {
  const { layout, mayEdit } = useOpenJob();
  const open = useTopsPad();
  const typed = mayEdit && !fixed;
  return (
    <View style={styles.row}>
      <View style={styles.words}>
        <Text kind="label">{label}</Text>
        {note && <Text kind="small">{note}</Text>}
      </View>
      <TapeBlade
        inches={inches}
        step={layout.step}
        name={title ?? label}
        width={148}
        hook={typed}
        emptyWords={emptyWords ?? (typed ? 'tap to type' : 'not set')}
        onPress={typed ? () => open({ title: title ?? label, now: inches, check, onLength }) : undefined}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 56,
    paddingVertical: space.xs + 1,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
  words: { flex: 1, minWidth: 0 },
});
