import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Layout, Mark } from '@/geometry/core/layout';
import { wallLabel } from '@/geometry/core/layout';
import { parseLength } from '@/geometry/tape/parse-length';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { markName } from './tape-walk';
import type { RoomView } from './use-room-view';

interface Choice {
  /** `wall|0`, `wall|end` or `wall|at`: the last with a length typed beside it. */
  readonly value: string;
  readonly text: string;
}

const EMPTY: Choice = { value: '', text: '' };

/** Any two marks for a cross, chosen from lists: what two taps on the drawing do. */
export function CrossPanel(props: {
  readonly view: RoomView;
  readonly from: Mark | null;
  readonly onClose: () => void;
}) {
  const { layout } = useOpenJob();
  const [first, setFirst] = useState<Choice>(EMPTY);
  const [second, setSecond] = useState<Choice>(EMPTY);
  const [error, setError] = useState<string | undefined>();
  const given = props.from;
  const go = () => {
    const from = given ?? markOf(first, layout);
    const to = markOf(second, layout);
    if (typeof from === 'string') return setError(from);
    if (typeof to === 'string') return setError(to);
    if (from.wall === to.wall) return setError('Both marks are on one wall. A cross goes to another wall.');
    setError(undefined);
    props.onClose();
    props.view.open({ kind: 'tie', id: null, from, to });
  };
  return (
    <View style={styles.panel}>
      <Text kind="sheetTitle" level={2}>
        A cross
      </Text>
      <Text kind="second">
        {given
          ? `First mark: ${markName(layout, given)}. Tap the second, or choose it here.`
          : 'Tap two marks on the drawing, or choose them here: corners, or places you marked on a wall.'}
      </Text>
      {!given && <MarkChoice label="First mark" choice={first} onChange={setFirst} />}
      <MarkChoice label="Second mark" choice={second} onChange={setSecond} />
      <View aria-live="assertive">
        {error && (
          <Text kind="second" tone="red">
            {error}
          </Text>
        )}
      </View>
      <Button label="Tape it" look="primary" icon="tape" wide height={56} onPress={go} />
      <Button label="Leave it" wide onPress={props.onClose} />
    </View>
  );
}

function MarkChoice(props: {
  readonly label: string;
  readonly choice: Choice;
  readonly onChange: (next: Choice) => void;
}) {
  const { layout } = useOpenJob();
  const { label, choice, onChange } = props;
  return (
    <View style={styles.mark}>
      <Select
        label={label}
        placeholder="Choose a mark"
        options={marksOf(layout)}
        value={choice.value === '' ? null : choice.value}
        onChange={(value) => onChange({ ...choice, value })}
      />
      {choice.value.endsWith('|at') && (
        <Field
          label="From the wall’s left end"
          value={choice.text}
          autoComplete="off"
          onChange={(text) => onChange({ ...choice, text })}
        />
      )}
    </View>
  );
}

function marksOf(layout: Layout): { value: string; label: string }[] {
  const { walls, closed } = layout.room;
  const corners = walls.map((wall) => ({ value: `${wall.id}|0`, label: words(markName(layout, { wall: wall.id, at: 0 })) })); // prettier-ignore
  const last = walls.at(-1);
  const end = last && !closed ? [{ value: `${last.id}|end`, label: words(markName(layout, { wall: last.id, at: 'end' })) }] : []; // prettier-ignore
  const places = walls.map((wall, i) => ({ value: `${wall.id}|at`, label: `A mark on wall ${wallLabel(i)}` }));
  return [...corners, ...end, ...places];
}

const words = (name: string): string => (name.includes(' end') ? `Wall ${name}` : `Corner ${name}`);

function markOf({ value, text }: Choice, layout: Layout): Mark | string {
  const [wall, at] = value.split('|');
  if (!wall) return 'Choose both marks first.';
  if (at === '0') return { wall, at: 0 };
  if (at === 'end') return { wall, at: 'end' };
  const parsed = parseLength(text, layout.units);
  return parsed.ok ? { wall, at: parsed.value } : parsed.message;
}

const styles = StyleSheet.create({
  panel: { gap: space.m },
  mark: { gap: space.s },
});
