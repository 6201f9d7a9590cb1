import { StyleSheet, View } from 'react-native';

import type { Finding } from '@/geometry/findings/types';
import { useOpenJob } from '../editor/JobProvider';
import { BladeField } from './BladeField';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { CutoutPanel } from './CutoutPanel';
import { EndPanel } from './EndPanel';
import { findingsAt } from './finding-places';
import { FindingsList } from './FindingsList';
import { IslandPanel } from './IslandPanel';
import { JointPanel } from './JointPanel';
import { LinkRow } from './LinkRow';
import { RunPanel } from './RunPanel';
import { SeamPanel } from './SeamPanel';
import { StripPanel } from './StripPanel';
import { topName, type TopsChoice } from './tops-choice';

export interface ChoicePanelProps {
  readonly choice: TopsChoice;
  readonly onChoose: (name: string | null) => void;
  readonly onZoom: (finding: Finding) => void;
}

/** What is chosen on the drawing, with everything that can be changed about it, and what was found there. */
export function ChoicePanel({ choice, onChoose, onZoom }: ChoicePanelProps) {
  const { plan, layout } = useOpenJob();
  const findings = findingsAt(choice, plan);
  return (
    <View style={styles.panel}>
      {choice.kind === 'piece' && <PiecePanel letter={choice.letter} onChoose={onChoose} />}
      {choice.kind === 'joint' && <JointPanel key={choice.between.join()} between={choice.between} />}
      {choice.kind === 'seam' && <SeamPanel letters={choice.letters} />}
      {choice.kind === 'cutout' && <CutoutPanel key={choice.id} id={choice.id} onGone={() => onChoose(null)} />}
      {choice.kind === 'end' && <EndPanel run={choice.run} side={choice.side} />}
      {choice.kind === 'end' && (
        <LinkRow
          title={topName(layout, choice.run)}
          value="all of the run"
          onPress={() => onChoose(`top ${choice.run}`)}
        />
      )}
      {choice.kind === 'top' && <TopPanel id={choice.id} onChoose={onChoose} />}
      {findings.length > 0 && (
        <View style={styles.findings}>
          <Text kind="sheetTitle" level={3}>
            Findings
          </Text>
          <View style={styles.flush}>
            <FindingsList findings={findings} onZoom={onZoom} />
          </View>
        </View>
      )}
    </View>
  );
}

/** A run, an island or a strip by its id; what is wrong with it when it could not be laid. */
function TopPanel({ id, onChoose }: { readonly id: string; readonly onChoose: (name: string | null) => void }) {
  const { layout, plan } = useOpenJob();
  const laid = plan.pieces.some((piece) => piece.on === id);
  const problems = laid ? [] : plan.tops.problems.filter((p) => p.at.run === id);
  return (
    <>
      {problems.map((problem) => (
        <Text key={problem.message} kind="strong" tone="red">
          {problem.message}
        </Text>
      ))}
      {layout.runs.some((run) => run.id === id) && <RunPanel id={id} onChoose={onChoose} />}
      {layout.islands.some((island) => island.id === id) && <IslandPanel id={id} onChoose={onChoose} />}
      {layout.strips.some((strip) => strip.id === id) && <StripPanel id={id} onChoose={onChoose} />}
    </>
  );
}

const END_WORDS = {
  wall: 'at the wall',
  open: 'open',
  appliance: 'at an appliance',
  joint: 'at the joint',
  waterfall: 'waterfall',
  seam: 'at the seam',
  edge: 'edge',
} as const;

function PiecePanel({
  letter,
  onChoose,
}: {
  readonly letter: string;
  readonly onChoose: (name: string | null) => void;
}) {
  const { plan, layout } = useOpenJob();
  const piece = plan.pieces.find((p) => p.letter === letter);
  if (!piece) return null;
  const longAt = piece.back >= piece.front ? 'back' : 'front';
  const points = (edge: 'back' | 'front') => (edge === longAt ? 'long points' : 'short points');
  const none = () => undefined;
  const mitred = Math.abs(piece.back - piece.front) > 1 / 32;
  return (
    <>
      <View role="group" aria-label={`Sizes of piece ${letter}`}>
        <BladeField
          label="Back edge"
          note={mitred ? points('back') : undefined}
          inches={piece.back}
          fixed
          onLength={none}
        />
        <BladeField
          label="Front edge"
          note={mitred ? points('front') : undefined}
          inches={piece.front}
          fixed
          onLength={none}
        />
        <Line title="Left end" value={`${piece.left.angle.toFixed(2)}°, ${END_WORDS[piece.left.kind]}`} />
        <Line title="Right end" value={`${piece.right.angle.toFixed(2)}°, ${END_WORDS[piece.right.kind]}`} />
        <Line title="Finished edges" value={piece.finishedEdges.length > 0 ? piece.finishedEdges.join(', ') : 'none'} />
        <Line title="Weight" value={`${Math.round(piece.weight)} lb`} />
      </View>
      <Text kind="rowTitle" level={3}>
        {topName(layout, piece.on)}
      </Text>
      <TopPanel id={piece.on} onChoose={onChoose} />
    </>
  );
}

function Line({ title, value }: { readonly title: string; readonly value: string }) {
  return (
    <View style={styles.row}>
      <View style={styles.grow}>
        <Text kind="label">{title}</Text>
      </View>
      <Text>{value}</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.l },
  grow: { flex: 1, minWidth: 0 },
  findings: { gap: space.s, paddingTop: space.l, borderTopWidth: 2, borderTopColor: color.ink },
  flush: { marginHorizontal: -space.l },
  row: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space.m,
    minHeight: 44,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
});
