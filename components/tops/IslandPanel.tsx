import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Island } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { IconButton } from '../ui/IconButton';
import { Chips } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { BladeField } from './BladeField';
import { CutInto } from './CutInto';
import { islandPlace, moveIsland } from './island-place';
import { someLength } from './length-checks';
import { TemplateField } from './TemplateField';
import type { TopPanelProps } from './RunPanel';
import { inSentence, topName } from './tops-choice';
import { useItemChange } from './use-item-change';

/** Inches a press of a move button goes. */
const MOVE = 1;

const SHAPES: readonly { readonly value: NonNullable<Island['shape']>; readonly label: string }[] = [
  { value: 'rectangle', label: 'Rectangle' },
  { value: 'clipped', label: 'Clipped corners' },
  { value: 'rounded', label: 'Round corners' },
  { value: 'free', label: 'Any outline' },
];

/** An island: its outline, where it stands, and what is cut into it. */
export function IslandPanel({ id, onChoose }: TopPanelProps) {
  const { layout, run: apply, mayEdit } = useOpenJob();
  const island = layout.islands.find((i) => i.id === id);
  const name = topName(layout, id);
  const change = useItemChange('islands', id, name);
  if (!island) return null;
  const { step } = layout;
  const shape = island.shape ?? 'rectangle';
  const half = Math.min(island.length, island.depth) / 2;
  const setShape = (next: NonNullable<Island['shape']>) => {
    const word = SHAPES.find((s) => s.value === next)!.label.toLowerCase();
    if (next === 'free') change({ shape: next, outline: island.outline ?? box(island) }, word);
    else change({ shape: next, corner: next === 'rectangle' ? null : (island.corner ?? Math.min(4, half / 2)) }, word);
  };
  return (
    <View style={styles.panel}>
      {mayEdit && (
        <Chips label="Outline" options={SHAPES} value={shape} onChange={(next) => next !== shape && setShape(next)} />
      )}
      {shape === 'free' ? (
        mayEdit && (
          <TemplateField
            label="Corners"
            hint="A corner a line, in order round the top: along the grain, then back from the front, such as 72, 0."
            outline={island.outline}
            onOutline={(outline, what) => outline && change({ outline }, what)}
          />
        )
      ) : (
        <View>
          <BladeField
            label="Length"
            title={`${name}, length`}
            note="along the grain"
            inches={island.length}
            check={someLength('An island’s length')}
            onLength={(length) => change({ length }, `${say(length, step)} long`)}
          />
          <BladeField
            label="Depth"
            title={`${name}, depth`}
            inches={island.depth}
            check={someLength('An island’s depth')}
            onLength={(depth) => change({ depth }, `${say(depth, step)} deep`)}
          />
          {shape !== 'rectangle' && (
            <BladeField
              label={shape === 'clipped' ? 'Clipped by' : 'Corner radius'}
              title={`${name}, ${shape === 'clipped' ? 'clipped by' : 'corner radius'}`}
              inches={island.corner ?? 0}
              check={(corner) =>
                corner > half || (shape === 'clipped' && corner === half)
                  ? `Its shorter side leaves ${say(half, step)} for a corner.`
                  : null
              }
              onLength={(corner) => change({ corner }, `corners ${say(corner, step)}`)}
            />
          )}
        </View>
      )}
      {mayEdit && <IslandPlace island={island} />}
      <CutInto on={id} onChoose={onChoose} />
      {mayEdit && (
        <Button
          label="Take this island away"
          look="danger"
          icon="bin"
          onPress={() => {
            if (apply({ kind: 'removeItem', section: 'islands', item: id }, inSentence(name))) onChoose(null);
          }}
        />
      )}
    </View>
  );
}

const box = ({ length, depth }: Island): readonly Point[] => [[0, 0], [length, 0], [length, depth], [0, depth]]; // prettier-ignore

/** Where it stands and how it is turned, without dragging. */
function IslandPlace({ island }: { readonly island: Island }) {
  const { layout, plan, turn, run } = useOpenJob();
  const name = topName(layout, island.id);
  const change = useItemChange('islands', island.id, name);
  const [text, setText] = useState<string | null>(null);
  const [error, setError] = useState<string | undefined>();
  const bearing = island.bearing ?? 0;
  const store = () => {
    if (text === null) return;
    const angle = Number(text.replace('°', '').replace(',', '.'));
    if (text.trim() === '' || !Number.isFinite(angle)) return setError('Type degrees, such as 90 or -45.');
    setError(undefined);
    setText(null);
    if (angle !== bearing) change({ bearing: angle }, `turned to ${angle} degrees`);
  };
  const move = (by: Point) => {
    const moved = moveIsland(layout, plan, turn, island.id, by);
    if (moved) run(moved.edit, moved.label);
  };
  if (!islandPlace(layout, plan, island.id)) return null;
  return (
    <View style={styles.section}>
      <Text kind="label">Where it stands</Text>
      <Text kind="small">Drag it on the drawing, or move it an inch at a time.</Text>
      <View style={styles.moves} role="group" aria-label="Move the island an inch">
        <IconButton icon="back" label="One inch to the left" framed onPress={() => move([-MOVE, 0])} />
        <IconButton icon="up" label="One inch up" framed onPress={() => move([0, MOVE])} />
        <IconButton icon="down" label="One inch down" framed onPress={() => move([0, -MOVE])} />
        <IconButton icon="next" label="One inch to the right" framed onPress={() => move([MOVE, 0])} />
        <Button
          label="Turn 90°"
          onPress={() => change({ bearing: ((bearing + 270) % 360) - 180 }, 'turned a quarter')}
        />
      </View>
      <Field
        label="Turned by, degrees from wall A"
        kind="decimal"
        autoComplete="off"
        value={text ?? String(bearing)}
        onChange={setText}
        onBlur={store}
        onSubmit={store}
        error={error}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.m },
  section: { gap: space.s },
  moves: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
});
