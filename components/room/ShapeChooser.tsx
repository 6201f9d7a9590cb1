import { StyleSheet, View } from 'react-native';
import Svg, { Polygon, Polyline } from 'react-native-svg';

import { boundingBox } from '@/geometry/core/polygon';
import { SHAPE_NAMES, STARTING_SHAPES, startingShape, type StartingShape } from '@/shared/layout/starting-shapes';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Press } from '../ui/Press';
import { NoPermissionState } from '../ui/StateCard';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';

const PICTURE = 72;

/** Rooms to begin with, one tap each. */
export function ShapeChooser(props: { readonly onChosen: () => void; readonly onDraw: () => void }) {
  const { run, mayEdit } = useOpenJob();
  if (!mayEdit)
    return (
      <View style={styles.chooser}>
        <NoPermissionState
          title="No walls yet"
          body="Whoever measures the kitchen draws them: an installer, a designer or the owner. You may look."
        />
      </View>
    );
  return (
    <View style={styles.chooser}>
      <Text kind="sheetTitle" level={2}>
        What shape is the room?
      </Text>
      <Text kind="second">
        Roughly is enough: the tape finds the true shape. Walls go from left to right as you face them.
      </Text>
      <View style={styles.shapes} role="group" aria-label="Shapes">
        {STARTING_SHAPES.map((shape) => (
          <Press
            key={shape}
            aria-label={SHAPE_NAMES[shape]}
            hoverGround={color.chalkT}
            testID={`shape-${shape}`}
            style={styles.shape}
            onPress={() => {
              if (run(startingShape(shape), `shape ${SHAPE_NAMES[shape]}`)) props.onChosen();
            }}
          >
            <Picture shape={shape} />
            <Text kind="label" hidden>
              {SHAPE_NAMES[shape]}
            </Text>
          </Press>
        ))}
      </View>
      <Button label="Draw it yourself" icon="pencil" height={56} onPress={props.onDraw} />
    </View>
  );
}

function Picture({ shape }: { readonly shape: StartingShape }) {
  const { points, closed } = startingShape(shape);
  const box = boundingBox(points);
  const scale = (PICTURE - 16) / Math.max(box.maxX - box.minX, box.maxY - box.minY);
  const left = (PICTURE - (box.maxX - box.minX) * scale) / 2;
  const top = (PICTURE - (box.maxY - box.minY) * scale) / 2;
  const path = points.map(([x, y]) => `${left + (x - box.minX) * scale},${top + (box.maxY - y) * scale}`).join(' ');
  const stroke = { fill: 'none', stroke: color.ink, strokeWidth: 4, strokeLinejoin: 'miter' as const };
  return (
    <View aria-hidden>
      <Svg width={PICTURE} height={PICTURE}>
        {closed ? <Polygon points={path} {...stroke} /> : <Polyline points={path} {...stroke} />}
      </Svg>
    </View>
  );
}

const styles = StyleSheet.create({
  chooser: { gap: space.m, padding: space.l, maxWidth: 560, width: '100%', alignSelf: 'center' },
  shapes: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  shape: {
    width: 104,
    minHeight: 116,
    alignItems: 'center',
    justifyContent: 'center',
    gap: space.xs,
    backgroundColor: color.card,
    borderWidth: 1.5,
    borderColor: color.edge,
    borderRadius: radius.control,
  },
});
