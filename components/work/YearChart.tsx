import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { Svg } from 'react-native-svg';

import { yearScene } from '@/geometry/scene/year/year-scene';
import type { MonthWidth } from '@/geometry/wood/year-of-width';
import { PaintSvg } from '../canvas/paint-svg';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { Segmented } from '../ui/Segmented';
import { Table } from '../ui/Table';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { percent } from './climate-words';

const HEIGHT = 220;

export interface YearChartProps {
  readonly months: readonly MonthWidth[];
  /** Back gap of the deepest run, inches. */
  readonly gap: number;
}

/** The year as a curve, and the same as a table. */
export function YearChart({ months, gap }: YearChartProps) {
  const { layout } = useOpenJob();
  const [width, setWidth] = useState(0);
  const [look, setLook] = useState<'chart' | 'table'>('chart');
  const scene = useMemo(
    () => yearScene(months, gap, layout.step, { width, height: HEIGHT }),
    [months, gap, layout.step, width],
  );
  return (
    <View style={styles.box} onLayout={(event) => setWidth(event.nativeEvent.layout.width)}>
      <Segmented
        label="The year as"
        labelHidden
        options={[
          { value: 'chart', label: 'Chart' },
          { value: 'table', label: 'Table' },
        ]}
        value={look}
        onChange={setLook}
      />
      {look === 'chart' && width > 0 && (
        <View role="img" aria-label={scene.alt}>
          <Svg width={width} height={HEIGHT} viewBox={`0 0 ${width} ${HEIGHT}`} aria-hidden>
            <PaintSvg scene={scene} pxPerInch={1} />
          </Svg>
        </View>
      )}
      {look === 'table' && <YearTable months={months} />}
      <Text kind="small">
        Plus is wider than at making; the red dashed line is the gap at the wall. A finished top follows the air some
        weeks behind and less far.
      </Text>
    </View>
  );
}

function YearTable({ months }: Pick<YearChartProps, 'months'>) {
  const { layout } = useOpenJob();
  const fine = layout.step.endsWith('mm') ? '0.5 mm' : '1/32';
  return (
    <Table
      label="Width over the year"
      rows={months}
      rowKey={(row) => row.month}
      rowLabel={(row) => row.month}
      rowHeight={44}
      columns={[
        { key: 'month', title: 'Month', width: 84, cell: (row) => <Text>{row.month}</Text> },
        { key: 'moisture', title: 'Wood', cell: (row) => <Text tabular>{percent(row.moisture)}</Text> },
        { key: 'change', title: 'Change', align: 'right', cell: (row) => <Fraction inches={row.change} step={fine} /> },
      ]}
    />
  );
}

const styles = StyleSheet.create({ box: { gap: space.m } });
