import { StyleSheet, View } from 'react-native';

import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { LengthField } from '../measure/LengthField';
import { TapeBlade } from '../measure/TapeBlade';
import { Button } from '../ui/Button';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { topName } from './tops-targets';
import { seamEdit } from './use-tops-drag';

const NUDGE = 1 / 16;

/** Where a seam is, how much of it shows, and how to move it without dragging. */
export function SeamPanel({ letters }: { readonly letters: readonly [string, string] }) {
  const { plan, layout, run, mayEdit } = useOpenJob();
  const seam = plan.seams.find((s) => s.letters.join() === letters.join());
  if (!seam) return null;
  const pin = layout.seams.find((p) => p.on === seam.on && Math.abs(p.at - seam.at) < 1 / 64);
  const sink = layout.cutouts.find((cutout) => cutout.on === seam.on && cutout.kind === 'sink');
  const move = (at: number) => {
    const { edit, label } = seamEdit(pin?.at ?? null, seam.on, at, say(at, layout.step));
    run(edit, label);
  };
  const hidden = seam.inCutout ? 'The rest falls in the cutout.' : 'All of it shows.';
  return (
    <>
      <TapeBlade inches={seam.visible} step={layout.step} name="Visible seam" height={56} hook={false} />
      <Text kind="second">{`${say(seam.visible, layout.step)} shows. ${hidden} ${topName(layout, seam.on)}.`}</Text>
      {mayEdit && !seam.edge && (
        <>
          <View style={styles.nudges}>
            <Button label="− 1/16" spoken="One sixteenth to the left" onPress={() => move(seam.at - NUDGE)} />
            <View style={styles.grow}>
              <LengthField label="From the wall’s left end" value={seam.at} step={layout.step} onLength={move} />
            </View>
            <Button label="+ 1/16" spoken="One sixteenth to the right" onPress={() => move(seam.at + NUDGE)} />
          </View>
          {sink && <Button label="To the sink’s centre" icon="sink" wide onPress={() => move(sink.centre)} />}
          {pin ? (
            <Button
              label="Let the seam find its own place"
              wide
              onPress={() => run({ kind: 'unpinSeam', on: pin.on, at: pin.at }, 'seam let go')}
            />
          ) : (
            <Text kind="small">This place was worked out. Moving it pins it.</Text>
          )}
        </>
      )}
    </>
  );
}

const styles = StyleSheet.create({
  nudges: { flexDirection: 'row', alignItems: 'flex-end', gap: space.s },
  grow: { flex: 1, minWidth: 0 },
});
