import { StyleSheet, View } from 'react-native';
import Svg, { Line, Rect } from 'react-native-svg';

import { PieceLetter } from '../ui/PieceLetter';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';

/** How to read the slabs. */
export function SlabLegend() {
  return (
    <View style={styles.legend}>
      <Text kind="rowTitle" level={2}>
        Reading the slabs
      </Text>
      <Row title="Face up" text="Ring. Its show face is on top." picture={<PieceLetter letter="P" />} />
      <Row
        title="Face down"
        text="Dark square. Its show face lies underneath."
        picture={
          <View style={styles.square}>
            <Text kind="label" tone="paper">
              Q
            </Text>
          </View>
        }
      />
      <Row
        title="One cut"
        text="Blue line. Both pieces get their end from one pass."
        picture={
          <Svg width={32} height={32}>
            <Line x1={4} y1={28} x2={28} y2={4} stroke={color.chalk} strokeWidth={5} />
          </Svg>
        }
      />
      <Row
        title="Offcut or waste"
        text="Hatched. A boxed size goes to the rack."
        picture={
          <Svg width={32} height={32}>
            <Rect x={2} y={2} width={28} height={28} fill="none" stroke={color.ink} strokeWidth={1.5} />
            {[8, 16, 24, 32].map((x) => (
              <Line
                key={x}
                x1={x - 4}
                y1={30}
                x2={x + 4 > 30 ? 30 : x + 4}
                y2={x + 4 > 30 ? 22 : 14}
                stroke={color.ink2}
                strokeWidth={1.2}
              />
            ))}
          </Svg>
        }
      />
      <Row
        title="Cutout"
        text="Dashed. Cut after the glue-up."
        picture={
          <Svg width={32} height={32}>
            <Rect
              x={3}
              y={7}
              width={26}
              height={18}
              fill="none"
              stroke={color.ink}
              strokeDasharray="4 3"
              strokeWidth={1.5}
            />
          </Svg>
        }
      />
    </View>
  );
}

function Row({
  title,
  text,
  picture,
}: {
  readonly title: string;
  readonly text: string;
  readonly picture: React.ReactNode;
}) {
  return (
    <View style={styles.row}>
      <View style={styles.picture} aria-hidden>
        {picture}
      </View>
      <View style={styles.grow}>
        <Text kind="strong">{title}</Text>
        <Text kind="second">{text}</Text>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  legend: { gap: space.m },
  row: { flexDirection: 'row', gap: space.m, alignItems: 'center' },
  picture: { width: 36, alignItems: 'center' },
  grow: { flex: 1, minWidth: 0 },
  square: { width: 28, height: 28, alignItems: 'center', justifyContent: 'center', backgroundColor: color.ink },
});
