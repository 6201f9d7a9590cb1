import { StyleSheet, View } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { IconButton } from '../ui/IconButton';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { CutoutPanel } from './CutoutPanel';
import { JointPanel } from './JointPanel';
import { RunPanel } from './RunPanel';
import { SeamPanel } from './SeamPanel';
import { jointWord, topName, type TopsChoice } from './tops-targets';

/** What is chosen on the drawing, with everything that can be changed about it. */
export function ChoicePanel({ choice, onClose }: { readonly choice: TopsChoice; readonly onClose: () => void }) {
  const { plan } = useOpenJob();
  return (
    <View style={styles.panel}>
      <View style={styles.title}>
        <View style={styles.grow}>
          <Text kind="sheetTitle" level={2}>
            {titleOf(choice, plan)}
          </Text>
        </View>
        <IconButton icon="close" label="Back to the findings" onPress={onClose} />
      </View>
      {choice.kind === 'piece' && <PiecePanel letter={choice.letter} />}
      {choice.kind === 'joint' && <JointPanel between={choice.between} />}
      {choice.kind === 'seam' && <SeamPanel letters={choice.letters} />}
      {choice.kind === 'cutout' && <CutoutPanel id={choice.id} />}
    </View>
  );
}

function titleOf(choice: TopsChoice, plan: ReturnType<typeof useOpenJob>['plan']): string {
  switch (choice.kind) {
    case 'piece':
      return `Piece ${choice.letter}`;
    case 'joint': {
      const joint = plan.joints.find((j) => j.between.join() === choice.between.join());
      return joint ? `${jointWord(joint.kind)} ${joint.letters.join(' to ')}` : 'Joint';
    }
    case 'seam':
      return `Seam ${choice.letters.join(' to ')}`;
    case 'cutout':
      return plan.cutouts.find((c) => c.id === choice.id)?.label ?? 'Cutout';
  }
}

function PiecePanel({ letter }: { readonly letter: string }) {
  const { plan, layout } = useOpenJob();
  const piece = plan.pieces.find((p) => p.letter === letter);
  if (!piece) return null;
  const longAt = piece.back >= piece.front ? 'back' : 'front';
  return (
    <>
      <View role="table" aria-label={`Sizes of piece ${letter}`}>
        <Size title={`Back edge${longAt === 'back' ? ', long points' : ', short points'}`} inches={piece.back} />
        <Size title={`Front edge${longAt === 'front' ? ', long points' : ', short points'}`} inches={piece.front} />
        <Size title="Depth" inches={piece.depth} />
        <Line title="Left end" value={`${piece.left.angle.toFixed(2)}°, ${END_WORDS[piece.left.kind]}`} />
        <Line title="Right end" value={`${piece.right.angle.toFixed(2)}°, ${END_WORDS[piece.right.kind]}`} />
        <Line title="Weight" value={`${Math.round(piece.weight)} lb`} />
      </View>
      {layout.runs.some((run) => run.id === piece.on) ? (
        <RunPanel id={piece.on} />
      ) : (
        <Text kind="second">{topName(layout, piece.on)}</Text>
      )}
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

function Size({ title, inches }: { readonly title: string; readonly inches: number }) {
  const { layout } = useOpenJob();
  return (
    <View style={styles.row} role="row">
      <View style={styles.grow}>
        <Text kind="label">{title}</Text>
      </View>
      <Fraction inches={inches} step={layout.step} bold />
    </View>
  );
}

function Line({ title, value }: { readonly title: string; readonly value: string }) {
  return (
    <View style={styles.row} role="row">
      <View style={styles.grow}>
        <Text kind="label">{title}</Text>
      </View>
      <Text>{value}</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.m },
  title: { flexDirection: 'row', alignItems: 'center', gap: space.s },
  grow: { flex: 1, minWidth: 0 },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 44,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
});
