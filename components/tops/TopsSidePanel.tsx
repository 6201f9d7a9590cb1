import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { IconButton } from '../ui/IconButton';
import { Tabs } from '../ui/Tabs';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { AddPanel } from './AddPanel';
import { ChoicePanel } from './ChoicePanel';
import { ComparePanel } from './ComparePanel';
import { FindingsList } from './FindingsList';
import { JobPanel } from './JobPanel';
import { PieceList } from './PieceList';
import { choiceTitle, topsOf } from './tops-choice';
import { TopList } from './TopList';
import { TopsPad } from './tops-pad';
import type { TopsView } from './use-tops-view';

const TITLES = { add: 'Add', job: 'Job settings', compare: 'Before and after' } as const;

/** What the side column, or the sheet on a phone, holds: the pad, what is chosen, a panel, or the lists. */
export function TopsSidePanel({ view }: { readonly view: TopsView }) {
  const { plan, layout } = useOpenJob();
  if (view.typing)
    return (
      <View style={styles.padded}>
        <TopsPad request={view.typing} onClose={() => view.type(null)} />
      </View>
    );
  if (view.choice)
    return (
      <View style={styles.padded}>
        <PanelHead title={choiceTitle(view.choice, plan, layout)} onClose={() => view.choose(null)} />
        <ChoicePanel key={view.name} choice={view.choice} onChoose={view.choose} onZoom={view.zoom} />
      </View>
    );
  if (view.side === 'lists') return <TopsLists view={view} />;
  return (
    <View style={styles.padded}>
      <PanelHead title={TITLES[view.side]} onClose={() => view.show('lists')} />
      {view.side === 'add' && <AddPanel onChoose={view.choose} />}
      {view.side === 'job' && <JobPanel />}
      {view.side === 'compare' && <ComparePanel what={view.what} onWhat={view.setWhat} onHold={view.hold} />}
    </View>
  );
}

function PanelHead({ title, onClose }: { readonly title: string; readonly onClose: () => void }) {
  return (
    <View style={styles.title}>
      <View style={styles.grow}>
        <Text kind="sheetTitle" level={2}>
          {title}
        </Text>
      </View>
      <IconButton icon="close" label="Back to the findings" onPress={onClose} />
    </View>
  );
}

function TopsLists({ view }: { readonly view: TopsView }) {
  const { plan, layout } = useOpenJob();
  const [tab, setTab] = useState<'findings' | 'pieces' | 'tops'>('findings');
  return (
    <View>
      <Tabs
        label="Findings, pieces and tops"
        tabs={[
          { value: 'findings', label: 'Findings', count: plan.findings.length },
          { value: 'pieces', label: 'Pieces', count: plan.pieces.length },
          { value: 'tops', label: 'Tops', count: topsOf(layout).length },
        ]}
        value={tab}
        onChange={setTab}
      />
      {tab === 'findings' && (
        <View style={plan.findings.length === 0 && styles.padded}>
          <FindingsList onZoom={view.zoom} />
        </View>
      )}
      {tab === 'pieces' && (
        <View style={styles.padded}>
          <PieceList onSelect={(letter) => view.choose(`piece ${letter}`)} />
        </View>
      )}
      {tab === 'tops' && (
        <View style={styles.padded}>
          <TopList onChoose={view.choose} onAdd={() => view.show('add')} />
        </View>
      )}
      <View style={styles.padded}>
        <Text kind="small">
          Strength and movement figures are advice, not an engineer’s approval. Local codes and makers’ instructions
          come first.
        </Text>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  padded: { padding: space.l, gap: space.m },
  title: { flexDirection: 'row', alignItems: 'center', gap: space.s },
  grow: { flex: 1, minWidth: 0 },
});
