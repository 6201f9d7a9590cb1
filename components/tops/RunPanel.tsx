import { StyleSheet, View } from 'react-native';

import type { Cutout, Run, RunEnd } from '@/geometry/core/layout';
import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { LengthField } from '../measure/LengthField';
import { Button } from '../ui/Button';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { topName } from './tops-targets';

type EndKind = 'wall' | 'open' | 'appliance' | 'joint';

const END_NAMES: Readonly<Record<EndKind, string>> = {
  wall: 'At the wall',
  open: 'Open, past the cabinet',
  appliance: 'At an appliance',
  joint: 'Joint with the next run',
};

/** A run's depth, gap and ends, and what is cut into it. */
export function RunPanel({ id }: { readonly id: string }) {
  const { layout, settings, run: apply, mayEdit, plan } = useOpenJob();
  const run = layout.runs.find((r) => r.id === id);
  if (!run) return null;
  const name = topName(layout, id);
  const change = (fields: Partial<Run>, what: string) =>
    apply(
      { kind: 'changeItem', section: 'runs', item: id, change: fields as Record<string, unknown> },
      `${name}, ${what}`,
    );
  const { step } = layout;
  const wall = plan.room?.walls.find((w) => w.id === run.wall)?.adjusted ?? 60;
  const addSink = () => {
    const to = run.to === 'end' ? wall : run.to;
    const sink: Cutout = {
      id: freshId(layout.cutouts),
      on: id,
      kind: 'sink',
      mount: 'drop-in',
      centre: Math.round((run.from + to) * 8) / 16,
      setback: 3,
      width: 30,
      depth: Math.max(6, Math.min(18, run.depth - 5)),
      radius: 0.75,
    };
    apply({ kind: 'addItem', section: 'cutouts', item: sink }, 'sink cutout');
  };
  if (!mayEdit) return <Text kind="second">{`${name}, ${say(run.depth, step)} deep.`}</Text>;
  return (
    <View style={styles.panel}>
      <Text kind="rowTitle" level={3}>
        {name}
      </Text>
      <LengthField
        label="Depth, back to front"
        value={run.depth}
        step={step}
        check={(depth) => (depth > 0 ? null : 'A top has to have some depth.')}
        onLength={(depth) => change({ depth }, `${say(depth, step)} deep`)}
      />
      <LengthField
        label="Gap to the wall behind"
        value={run.backGap}
        step={step}
        onLength={(backGap) => change({ backGap }, `gap ${say(backGap, step)}`)}
      />
      <EndFields
        title="Left end"
        end={run.left}
        defaults={settings}
        onEnd={(left) => change({ left }, `left end ${left.kind}`)}
      />
      <EndFields
        title="Right end"
        end={run.right}
        defaults={settings}
        onEnd={(right) => change({ right }, `right end ${right.kind}`)}
      />
      <Button label="Cut a sink in it" icon="sink" onPress={addSink} />
      <Button
        label="Take this run away"
        look="danger"
        onPress={() => apply({ kind: 'removeItem', section: 'runs', item: id }, name.toLowerCase())}
      />
    </View>
  );
}

const freshId = (items: readonly { readonly id: string }[]): string => {
  let n = items.length + 1;
  while (items.some((item) => item.id === `c${n}`)) n++;
  return `c${n}`;
};

function EndFields({
  title,
  end,
  defaults,
  onEnd,
}: {
  readonly title: string;
  readonly end: RunEnd;
  readonly defaults: {
    readonly wallClearance: number;
    readonly openOverhang: number;
    readonly openRadius: number;
  };
  readonly onEnd: (end: RunEnd) => void;
}) {
  const { layout } = useOpenJob();
  const { step } = layout;
  const begin: Readonly<Record<EndKind, RunEnd>> = {
    wall: { kind: 'wall', clearance: defaults.wallClearance },
    open: { kind: 'open', overhang: defaults.openOverhang, radius: defaults.openRadius },
    appliance: { kind: 'appliance', overhang: 0 },
    joint: { kind: 'joint' },
  };
  return (
    <View style={styles.end}>
      <Select
        label={title}
        options={(Object.keys(END_NAMES) as EndKind[]).map((value) => ({ value, label: END_NAMES[value] }))}
        value={end.kind === 'waterfall' ? null : end.kind}
        placeholder="Waterfall"
        onChange={(kind) => onEnd(begin[kind])}
      />
      {end.kind === 'wall' && (
        <LengthField
          label={`${title}: clearance`}
          value={end.clearance}
          step={step}
          onLength={(clearance) => onEnd({ ...end, clearance })}
        />
      )}
      {(end.kind === 'open' || end.kind === 'appliance') && (
        <LengthField
          label={`${title}: overhang${end.kind === 'appliance' ? ' (minus for a gap)' : ''}`}
          value={end.overhang}
          step={step}
          signed
          onLength={(overhang) => onEnd({ ...end, overhang })}
        />
      )}
      {end.kind === 'open' && (
        <LengthField
          label={`${title}: corner radius`}
          value={end.radius}
          step={step}
          onLength={(radius) => onEnd({ ...end, radius })}
        />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.m },
  end: { gap: space.s, paddingTop: space.s, borderTopWidth: 1, borderTopColor: color.line },
});
