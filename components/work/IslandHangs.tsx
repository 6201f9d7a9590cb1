import { StyleSheet, View } from 'react-native';

import type { Island, IslandHangs as Hangs } from '@/geometry/core/layout';
import { formatLength } from '@/geometry/tape/format-length';
import { parseLength } from '@/geometry/tape/parse-length';
import { useOpenJob } from '../editor/JobProvider';
import { Text } from '../ui/Text';
import { TypedField, type TypedValue } from '../ui/TypedField';
import { space } from '../ui/tokens';

const SIDES = ['front', 'back', 'left', 'right'] as const;

/** How far an island hangs past its cabinets, side by side: nobody draws what stands below it. */
export function IslandHangs({ island }: { readonly island: Island }) {
  const { layout, run, mayEdit } = useOpenJob();
  const set = (side: keyof Hangs, inches: number) =>
    run(
      {
        kind: 'changeItem',
        section: 'islands',
        item: island.id,
        change: { hangs: { ...island.hangs, [side]: inches } },
      },
      `overhang of island ${island.id}`,
    );
  return (
    <View role="group" aria-label={`Overhangs of island ${island.id}`} style={styles.group}>
      <Text kind="label">{`Island ${island.id} hangs past its cabinets`}</Text>
      <View style={styles.sides}>
        {SIDES.map((side) => (
          <View key={side} style={styles.side}>
            <TypedField
              label={`At the ${side}`}
              value={island.hangs?.[side] ?? 0}
              disabled={!mayEdit}
              write={(inches) => formatLength(inches, layout.step)}
              read={(text) => readHang(text, layout.units)}
              onValue={(inches) => set(side, inches)}
            />
          </View>
        ))}
      </View>
    </View>
  );
}

function readHang(text: string, units: 'in' | 'mm'): TypedValue<number> {
  if (Number(text.trim()) === 0 && text.trim() !== '') return { ok: true, value: 0 };
  return parseLength(text, units);
}

const styles = StyleSheet.create({
  group: { gap: space.s, paddingVertical: space.s },
  sides: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  side: { flexGrow: 1, flexBasis: 130, minWidth: 0 },
});
