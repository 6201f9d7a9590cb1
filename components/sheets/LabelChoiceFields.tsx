import { StyleSheet, View } from 'react-native';

import { labelGrid, LABEL_GRID_KEYS, type LabelChoice } from '@/geometry/scene/labels/label-grids';
import type { Paper } from '@/geometry/scene/paper/sheet-head';
import { Select } from '../ui/Select';
import { space } from '../ui/tokens';
import { TypedField, type TypedValue } from '../ui/TypedField';

export interface LabelChoiceFieldsProps {
  readonly paper: Paper;
  readonly value: LabelChoice;
  readonly onChange: (next: LabelChoice) => void;
}

/** Which label sheet lies in the printer, and which label on it is the first free one. */
export function LabelChoiceFields({ paper, value, onChange }: LabelChoiceFieldsProps) {
  const { columns, rows } = labelGrid(value.grid);
  const most = columns * rows;
  const read = (text: string): TypedValue<number> => {
    const start = Number(text);
    return Number.isInteger(start) && start >= 1 && start <= most
      ? { ok: true, value: start }
      : { ok: false, message: `A number from 1 to ${most}, counted along the rows.` };
  };
  return (
    <View style={styles.fields}>
      <View style={styles.field}>
        <Select
          label="Labels in the printer"
          options={LABEL_GRID_KEYS.filter((key) => labelGrid(key).paper === paper).map((key) => ({
            value: key,
            label: labelGrid(key).name,
          }))}
          value={value.grid}
          onChange={(grid) => onChange({ grid, start: 1 })}
        />
      </View>
      <View style={styles.field}>
        <TypedField
          label="First free label"
          hint="Begun sheets stay usable."
          kind="number"
          value={value.start}
          write={String}
          read={read}
          onValue={(start) => onChange({ ...value, start })}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  field: { flexGrow: 1, flexBasis: 220, maxWidth: 360 },
});
