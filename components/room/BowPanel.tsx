import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { Circle, Line, Polyline, Svg, Text as SvgText } from 'react-native-svg';

import type { Wall } from '@/geometry/core/layout';
import { formatLength } from '@/geometry/tape/format-length';
import { parseLength } from '@/geometry/tape/parse-length';
import { inches } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Field } from '../ui/Field';
import { IconButton } from '../ui/IconButton';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { color, font, fontStack, space } from '../ui/tokens';
import type { RoomView } from './use-room-view';

type Station = Wall['profile'][number];

/** How a wall bows along a straight-edge or a string: places and gaps, drawn much larger than they are. */
export function BowPanel({ view, wall }: { readonly view: RoomView; readonly wall: Wall }) {
  const { layout, plan, run, mayEdit } = useOpenJob();
  const length = plan.room?.walls.find((w) => w.id === wall.id)?.adjusted ?? 0;
  const stations = [...wall.profile].sort((a, b) => a.at - b.at);
  const worst = stations.reduce<Station | null>(
    (most, s) => (Math.abs(s.off) > Math.abs(most?.off ?? 0) ? s : most),
    null,
  );
  const store = (profile: readonly Station[], label: string) =>
    run({ kind: 'setProfile', wall: wall.id, profile: [...profile].sort((a, b) => a.at - b.at) }, label);
  return (
    <View style={styles.section}>
      <View style={styles.title}>
        <Text kind="rowTitle" level={3}>
          {worst ? (worst.off < 0 ? 'Bow, into the room' : 'Bow, hollow') : 'Bow'}
        </Text>
        <Text kind="second">from a straight-edge</Text>
      </View>
      {stations.length > 0 && length > 0 && <BowPicture stations={stations} length={length} />}
      {stations.map((station) => (
        <View key={station.at} style={styles.row}>
          <View style={styles.grow}>
            <Text>{`${inches(Math.abs(station.off), layout.step)} ${station.off < 0 ? 'bump' : 'hollow'} at ${inches(station.at, layout.step)}`}</Text>
          </View>
          {mayEdit && (
            <IconButton
              icon="bin"
              label={`Take away the gap at ${inches(station.at, layout.step)}`}
              onPress={() =>
                store(
                  stations.filter((s) => s.at !== station.at),
                  'a bow reading',
                )
              }
            />
          )}
        </View>
      ))}
      {stations.length > 0 && (
        <Checkbox label="Draw bows larger than life" checked={view.largeBows} onChange={view.setLargeBows} />
      )}
      {mayEdit && (
        <AddStation
          length={length}
          onAdd={(station) =>
            store(
              [...stations.filter((s) => s.at !== station.at), station],
              `bow, ${inches(Math.abs(station.off), layout.step)}`,
            )
          }
        />
      )}
    </View>
  );
}

function AddStation({ length, onAdd }: { readonly length: number; readonly onAdd: (station: Station) => boolean }) {
  const { layout } = useOpenJob();
  const [open, setOpen] = useState(false);
  const [at, setAt] = useState('');
  const [gap, setGap] = useState('');
  const [way, setWay] = useState<'bump' | 'hollow'>('hollow');
  const [errors, setErrors] = useState<{ at?: string; gap?: string }>({});
  if (!open) return <Button label="Read a gap" icon="bow" wide onPress={() => setOpen(true)} />;
  const store = () => {
    const place = parseLength(at, layout.units);
    const size = gap.trim() === '0' ? ({ ok: true, value: 0 } as const) : parseLength(gap, layout.units);
    const wrong = {
      at: !place.ok
        ? place.message
        : place.value > length + 1 / 32
          ? `The wall is only ${inches(length, layout.step)} long.`
          : undefined,
      gap: !size.ok ? size.message : size.value > 6 ? 'A wall that bows over 6 in is two walls. Split it.' : undefined,
    };
    setErrors(wrong);
    if (!place.ok || !size.ok || wrong.at || wrong.gap) return;
    if (onAdd({ at: place.value, off: way === 'bump' ? -size.value : size.value })) {
      setAt('');
      setGap('');
    }
  };
  return (
    <View style={styles.fields}>
      <Text kind="second">
        Hold a straight-edge or a string from end to end of the wall. Hollow: the gap behind it. Bump: how far the wall
        comes past it.
      </Text>
      <Segmented
        label="At this place the wall is"
        options={[
          { value: 'hollow', label: 'Hollow' },
          { value: 'bump', label: 'Bump' },
        ]}
        value={way}
        onChange={setWay}
      />
      <View style={styles.pair}>
        <View style={styles.grow}>
          <Field label="From the left end" value={at} error={errors.at} autoComplete="off" onChange={setAt} autoFocus />
        </View>
        <View style={styles.grow}>
          <Field label="Gap" value={gap} error={errors.gap} autoComplete="off" onChange={setGap} onSubmit={store} />
        </View>
      </View>
      <View style={styles.pair}>
        <Button label="Keep it" look="primary" onPress={store} />
        <Button label="Done" onPress={() => setOpen(false)} />
      </View>
    </View>
  );
}

const WIDTH = 320;
const HEIGHT = 104;
const BASE = 42;
const DEPTH = 34;

/** The wall from above, its bow drawn so that the worst gap fills the height. */
function BowPicture({ stations, length }: { readonly stations: readonly Station[]; readonly length: number }) {
  const { layout } = useOpenJob();
  const most = Math.max(...stations.map((s) => Math.abs(s.off)), 1 / 32);
  const x = (at: number) => 10 + (at / length) * (WIDTH - 20);
  const y = (off: number) => BASE - (off / most) * DEPTH * (off > 0 ? 0.5 : 1);
  const ends = [0, length].filter((at) => stations.every((s) => Math.abs(s.at - at) > 1)).map((at) => ({ at, off: 0 }));
  const all = [...stations, ...ends].sort((a, b) => a.at - b.at);
  const number = { fontFamily: fontStack(font.label600), fontSize: 13, textAnchor: 'middle' as const };
  return (
    <View aria-hidden>
      <Svg width="100%" height={HEIGHT} viewBox={`0 0 ${WIDTH} ${HEIGHT}`}>
        <Line x1={x(0)} x2={x(length)} y1={BASE} y2={BASE} stroke={color.ink} strokeWidth={2} />
        <Polyline
          points={all.map((s) => `${x(s.at)},${y(s.off)}`).join(' ')}
          fill="none"
          stroke={color.red}
          strokeWidth={2.4}
        />
        {all.map((s) => (
          <Circle key={s.at} cx={x(s.at)} cy={y(s.off)} r={4} fill={color.card} stroke={color.red} strokeWidth={1.6} />
        ))}
        {all.map((s) => (
          <SvgText key={s.at} {...number} x={Math.min(WIDTH - 14, Math.max(14, x(s.at)))} y={14} fill={color.ink2}>
            {formatLength(s.at, layout.step)}
          </SvgText>
        ))}
        {stations
          .filter((s) => s.off !== 0)
          .map((s) => (
            <SvgText key={s.at} {...number} x={x(s.at)} y={Math.max(BASE, y(s.off)) + 20} fill={color.ink}>
              {formatLength(Math.abs(s.off), layout.step)}
            </SvgText>
          ))}
      </Svg>
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: space.s, borderTopWidth: 2, borderTopColor: color.ink, paddingTop: space.m },
  title: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'baseline', gap: space.s },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    minHeight: 44,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
  grow: { flex: 1, minWidth: 0 },
  fields: { gap: space.m, padding: space.m, backgroundColor: color.paper },
  pair: { flexDirection: 'row', gap: space.m },
});
