import { StyleSheet, View } from 'react-native';

import type { CutoutKind } from '@/geometry/core/layout';
import { formatLength } from '@/geometry/tape/format-length';
import { useOpenJob } from '../editor/JobProvider';
import { Icon } from '../ui/Icon';
import type { IconName } from '../ui/icon-shapes';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import { LinkRow } from './LinkRow';
import { newCutout } from './new-items';
import { cutoutTitle, inSentence } from './tops-choice';

const KINDS: readonly { readonly kind: CutoutKind; readonly label: string; readonly icon: IconName }[] = [
  { kind: 'sink', label: 'Sink', icon: 'sink' },
  { kind: 'cooktop', label: 'Cooktop', icon: 'range' },
  { kind: 'tap', label: 'Tap hole', icon: 'plus' },
  { kind: 'notch', label: 'Notch', icon: 'corner' },
  { kind: 'free', label: 'Any shape', icon: 'pencil' },
];

/** What is cut into one top, and buttons to cut more. */
export function CutInto({ on, onChoose }: { readonly on: string; readonly onChoose: (name: string) => void }) {
  const { layout, plan, run, mayEdit } = useOpenJob();
  const cut = layout.cutouts.filter((cutout) => cutout.on === on);
  const add = (kind: CutoutKind) => {
    const item = newCutout(layout, plan, on, kind);
    if (run({ kind: 'addItem', section: 'cutouts', item }, inSentence(cutoutTitle(item))))
      onChoose(`cutout ${item.id}`);
  };
  if (!mayEdit && cut.length === 0) return null;
  return (
    <View style={styles.section}>
      <Text kind="rowTitle" level={3}>
        Cut into it
      </Text>
      {cut.map((cutout) => (
        <LinkRow
          key={cutout.id}
          title={cutoutTitle(cutout)}
          value={`${formatLength(cutout.width, layout.step)} × ${formatLength(cutout.depth, layout.step)}, centre at ${formatLength(cutout.centre, layout.step)}`}
          onPress={() => onChoose(`cutout ${cutout.id}`)}
        />
      ))}
      {mayEdit && (
        <View style={styles.kinds} role="group" aria-label="Cut another">
          {KINDS.map(({ kind, label, icon }) => (
            <Tile key={kind} label={label} spoken={`Cut ${inSentence(label)}`} icon={icon} onPress={() => add(kind)} />
          ))}
        </View>
      )}
    </View>
  );
}

export interface TileProps {
  readonly label: string;
  readonly spoken: string;
  readonly icon: IconName;
  readonly onPress: () => void;
}

/** A square button with a sign over a word. */
export function Tile({ label, spoken, icon, onPress }: TileProps) {
  return (
    <Press style={styles.tile} hoverGround={color.chalkT} aria-label={spoken} onPress={onPress}>
      <Icon name={icon} />
      <Text kind="labelSmall" hidden align="center">
        {label}
      </Text>
    </Press>
  );
}

const styles = StyleSheet.create({
  section: { gap: space.s },
  kinds: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s, marginTop: space.xs },
  tile: {
    width: 84,
    minHeight: 64,
    alignItems: 'center',
    justifyContent: 'center',
    gap: 2,
    paddingHorizontal: 2,
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: radius.control,
    backgroundColor: color.card,
  },
});
