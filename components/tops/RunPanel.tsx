import { StyleSheet, View } from 'react-native';

import type { Along } from '@/geometry/core/layout';
import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { BladeField } from './BladeField';
import { CutInto } from './CutInto';
import { endWords } from './EndPanel';
import { LinkRow } from './LinkRow';
import { runPlaceProblem, someLength, wallLength } from './length-checks';
import { ScribePanel } from './ScribePanel';
import { inSentence, topName } from './tops-choice';
import { useItemChange } from './use-item-change';

export interface TopPanelProps {
  readonly id: string;
  /** Chooses something else on the drawing, by its name. */
  readonly onChoose: (name: string | null) => void;
}

/** A run: depth, place along its wall, ends, and what is cut into it. */
export function RunPanel({ id, onChoose }: TopPanelProps) {
  const { layout, run: apply, mayEdit } = useOpenJob();
  const run = layout.runs.find((r) => r.id === id);
  const name = topName(layout, id);
  const change = useItemChange('runs', id, name);
  if (!run) return null;
  const { step } = layout;
  return (
    <View style={styles.panel}>
      <View>
        <BladeField
          label="Depth"
          title={`${name}, depth`}
          note="back edge to front edge"
          inches={run.depth}
          check={someLength('A top’s depth')}
          onLength={(depth) => change({ depth }, `${say(depth, step)} deep`)}
        />
        <BladeField
          label="Gap behind"
          title={`${name}, gap behind`}
          note="to the wall, for movement"
          inches={run.backGap}
          onLength={(backGap) => change({ backGap }, `gap ${say(backGap, step)}`)}
        />
        <RunPlace id={id} />
        <LinkRow title="Left end" value={endWords(run.left, step)} onPress={() => onChoose(`end ${id} left`)} />
        <LinkRow title="Right end" value={endWords(run.right, step)} onPress={() => onChoose(`end ${id} right`)} />
      </View>
      {mayEdit && (
        <Segmented
          label="Lies on"
          options={[
            { value: 'front', label: 'Room side' },
            { value: 'back', label: 'Far side' },
          ]}
          value={run.side ?? 'front'}
          onChange={(side) => change({ side }, side === 'back' ? 'on the far side' : 'on the room side')}
          hint="Far side is the other side of a peninsula or a half wall."
        />
      )}
      <ScribePanel run={id} />
      <CutInto on={id} onChoose={onChoose} />
      {mayEdit && (
        <Button
          label="Take this run away"
          look="danger"
          icon="bin"
          onPress={() => {
            if (apply({ kind: 'removeItem', section: 'runs', item: id }, inSentence(name))) onChoose(null);
          }}
        />
      )}
    </View>
  );
}

/** Where along its wall a run begins and ends; a wall or a joint decides that by itself. */
function RunPlace({ id }: { readonly id: string }) {
  const { layout, plan, mayEdit } = useOpenJob();
  const run = layout.runs.find((r) => r.id === id);
  const name = topName(layout, id);
  const change = useItemChange('runs', id, name);
  if (!run) return null;
  const { step } = layout;
  const length = wallLength(plan, run.wall);
  const decided = (kind: string) => kind === 'wall' || kind === 'joint';
  const setTo = (to: Along) => change({ to }, to === 'end' ? 'to the end of its wall' : `to ${say(to, step)}`);
  if (decided(run.left.kind) && decided(run.right.kind))
    return <Text kind="small">It goes from one corner of its wall to the other.</Text>;
  return (
    <>
      {!decided(run.left.kind) && (
        <BladeField
          label="Begins at"
          title={`${name}, begins at`}
          note="from the wall’s left end"
          inches={run.from}
          check={(from) => runPlaceProblem(run, { from }, plan, layout)}
          onLength={(from) => change({ from }, `from ${say(from, step)}`)}
        />
      )}
      {!decided(run.right.kind) && (
        <>
          <BladeField
            label="Ends at"
            title={`${name}, ends at`}
            note="from the wall’s left end"
            inches={run.to === 'end' ? length : run.to}
            check={(to) => runPlaceProblem(run, { to }, plan, layout)}
            onLength={setTo}
          />
          {mayEdit && length !== null && (
            <Checkbox
              label="To the end of the wall"
              checked={run.to === 'end'}
              onChange={(whole) => setTo(whole ? 'end' : Math.floor(length * 16) / 16)}
            />
          )}
        </>
      )}
    </>
  );
}

const styles = StyleSheet.create({ panel: { gap: space.m } });
