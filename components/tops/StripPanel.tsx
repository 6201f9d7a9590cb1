import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { BladeField } from './BladeField';
import { someLength } from './length-checks';
import type { TopPanelProps } from './RunPanel';
import { inSentence, topName } from './tops-choice';
import { useItemChange } from './use-item-change';

/** A strip with the grain along it: what it is for, its sizes, and how many. */
export function StripPanel({ id, onChoose }: TopPanelProps) {
  const { layout, run: apply, mayEdit } = useOpenJob();
  const strip = layout.strips.find((s) => s.id === id);
  const name = topName(layout, id);
  const change = useItemChange('strips', id, name);
  const [label, setLabel] = useState<string | null>(null);
  const [count, setCount] = useState<string | null>(null);
  const [error, setError] = useState<string | undefined>();
  if (!strip) return null;
  const { step } = layout;
  const storeCount = () => {
    if (count === null) return;
    const typed = Number(count);
    if (!Number.isInteger(typed) || typed < 1 || typed > 200) return setError('Type a whole number from 1 to 200.');
    setError(undefined);
    setCount(null);
    if (typed !== strip.count) change({ count: typed }, `${typed} of them`);
  };
  return (
    <View style={styles.panel}>
      <Text kind="second">Grain along it. It is cut from the slabs like any other piece.</Text>
      <Field
        label="What it is"
        value={label ?? strip.label}
        disabled={!mayEdit}
        autoComplete="off"
        maxLength={80}
        onChange={setLabel}
        onBlur={() => {
          if (label !== null && label !== strip.label) change({ label }, `called ${label}`);
          setLabel(null);
        }}
      />
      <View>
        <BladeField
          label="Length"
          title={`${name}, length`}
          note="along the grain"
          inches={strip.length}
          check={someLength('A strip’s length')}
          onLength={(length) => change({ length }, `${say(length, step)} long`)}
        />
        <BladeField
          label="Width"
          title={`${name}, width`}
          inches={strip.width}
          check={someLength('A strip’s width')}
          onLength={(width) => change({ width }, `${say(width, step)} wide`)}
        />
        <BladeField
          label="Thickness"
          title={`${name}, thickness`}
          inches={strip.thickness}
          check={someLength('A strip’s thickness')}
          onLength={(thickness) => change({ thickness }, `${say(thickness, step)} thick`)}
        />
      </View>
      <Field
        label="How many"
        kind="number"
        autoComplete="off"
        value={count ?? String(strip.count)}
        disabled={!mayEdit}
        onChange={setCount}
        onBlur={storeCount}
        onSubmit={storeCount}
        error={error}
      />
      {mayEdit && (
        <Button
          label="Take this strip away"
          look="danger"
          icon="bin"
          onPress={() => {
            if (apply({ kind: 'removeItem', section: 'strips', item: id }, inSentence(name))) onChoose(null);
          }}
        />
      )}
    </View>
  );
}

const styles = StyleSheet.create({ panel: { gap: space.m } });
