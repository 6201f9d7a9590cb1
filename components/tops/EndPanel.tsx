import { StyleSheet, View } from 'react-native';

import type { RunEnd } from '@/geometry/core/layout';
import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { Chips, Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { BladeField } from './BladeField';
import { someLength } from './length-checks';
import { topName } from './tops-choice';
import { useItemChange } from './use-item-change';

const KINDS: readonly { readonly value: RunEnd['kind']; readonly label: string }[] = [
  { value: 'wall', label: 'At the wall' },
  { value: 'open', label: 'Open' },
  { value: 'appliance', label: 'At an appliance' },
  { value: 'joint', label: 'Joint' },
  { value: 'waterfall', label: 'Waterfall' },
];

/** Floor to show face: a 34 1/2 in cabinet and the top on it. Common practice. */
const CABINET = 34.5;

/** An end in words: "open, 1 in past, radius 1 in". */
export function endWords(end: RunEnd, step: Parameters<typeof say>[1]): string {
  switch (end.kind) {
    case 'wall':
      return `at the wall, ${say(end.clearance, step)} clear`;
    case 'open':
      return `open, ${say(end.overhang, step)} past, radius ${say(end.radius, step)}`;
    case 'appliance':
      return end.overhang < 0
        ? `at an appliance, ${say(-end.overhang, step)} short of it`
        : `at an appliance, ${say(end.overhang, step)} past`;
    case 'joint':
      return 'joint with the next run';
    case 'waterfall':
      return `waterfall, ${say(end.height, step)} high`;
  }
}

/** How a run ends: its kind, and the lengths that kind has, on blades. */
export function EndPanel({ run: id, side }: { readonly run: string; readonly side: 'left' | 'right' }) {
  const { layout, settings, mayEdit } = useOpenJob();
  const run = layout.runs.find((r) => r.id === id);
  const change = useItemChange('runs', id, `${topName(layout, id)}, ${side} end`);
  if (!run) return null;
  const end = run[side];
  const set = (next: RunEnd) => change({ [side]: next }, endWords(next, layout.step));
  const begin: Readonly<Record<RunEnd['kind'], RunEnd>> = {
    wall: { kind: 'wall', clearance: settings.wallClearance },
    open: { kind: 'open', overhang: settings.openOverhang, radius: settings.openRadius },
    appliance: { kind: 'appliance', overhang: 0 },
    joint: { kind: 'joint' },
    waterfall: { kind: 'waterfall', overhang: settings.openOverhang, height: CABINET + layout.material.thickness },
  };
  return (
    <View style={styles.panel}>
      {mayEdit ? (
        <Chips
          label={`${side} end`}
          options={KINDS}
          value={end.kind}
          onChange={(kind) => kind !== end.kind && set(begin[kind])}
        />
      ) : (
        <Text>{endWords(end, layout.step)}</Text>
      )}
      <EndLengths end={end} side={side} onEnd={set} />
      {end.kind === 'joint' && (
        <Text kind="second">The corner decides the cut. Choose the joint itself on the drawing.</Text>
      )}
      {end.kind === 'waterfall' && (
        <Text kind="second">
          The leg is a piece of its own, its grain running down, mitred to the top at 45 degrees.
        </Text>
      )}
    </View>
  );
}

function EndLengths({
  end,
  side,
  onEnd,
}: {
  readonly end: RunEnd;
  readonly side: 'left' | 'right';
  readonly onEnd: (end: RunEnd) => void;
}) {
  const { mayEdit } = useOpenJob();
  const of = (what: string) => `${side === 'left' ? 'Left' : 'Right'} end, ${what}`;
  if (end.kind === 'wall')
    return (
      <BladeField
        label="Clear of the wall"
        title={of('clear of the wall')}
        inches={end.clearance}
        onLength={(clearance) => onEnd({ ...end, clearance })}
      />
    );
  if (end.kind === 'joint') return null;
  const gap = end.overhang < 0;
  return (
    <>
      {end.kind === 'appliance' && mayEdit && (
        <Segmented
          label="Against the appliance"
          labelHidden
          options={[
            { value: 'past', label: 'Reaches over' },
            { value: 'gap', label: 'Leaves a gap' },
          ]}
          value={gap ? 'gap' : 'past'}
          onChange={(way) =>
            onEnd({
              ...end,
              overhang: way === 'gap' ? -Math.max(Math.abs(end.overhang), 1 / 8) : Math.abs(end.overhang),
            })
          }
        />
      )}
      <BladeField
        label={gap ? 'Gap' : 'Overhang'}
        title={of(gap ? 'gap' : 'overhang')}
        inches={Math.abs(end.overhang)}
        onLength={(overhang) => onEnd({ ...end, overhang: gap ? -overhang : overhang })}
      />
      {end.kind === 'open' && (
        <BladeField
          label="Corner radius"
          title={of('corner radius')}
          inches={end.radius}
          onLength={(radius) => onEnd({ ...end, radius })}
        />
      )}
      {end.kind === 'waterfall' && (
        <BladeField
          label="Floor to show face"
          title={of('floor to show face')}
          inches={end.height}
          check={someLength('The leg')}
          onLength={(height) => onEnd({ ...end, height })}
        />
      )}
    </>
  );
}

const styles = StyleSheet.create({ panel: { gap: space.m } });
