import { StyleSheet, View } from 'react-native';

import type { Cutout } from '@/geometry/core/layout';
import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { LengthField } from '../measure/LengthField';
import { Button } from '../ui/Button';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';

const positive = (value: number): string | null => (value > 0 ? null : 'It has to be more than nothing.');

/** A cutout's place and size, typed; what the maker's template says comes first. */
export function CutoutPanel({ id }: { readonly id: string }) {
  const { plan, layout, run, mayEdit } = useOpenJob();
  const cutout = layout.cutouts.find((c) => c.id === id);
  const placed = plan.cutouts.find((c) => c.id === id);
  if (!cutout) return null;
  const { step } = layout;
  const change = (fields: Partial<Cutout>, what: string) =>
    run(
      { kind: 'changeItem', section: 'cutouts', item: id, change: fields as Record<string, unknown> },
      `${cutout.kind}, ${what}`,
    );
  return (
    <>
      {placed && (
        <Text kind="second">{`Strips of ${say(placed.frontStrip, step)} in front and ${say(placed.backStrip, step)} behind.`}</Text>
      )}
      {mayEdit && (
        <View style={styles.fields}>
          <LengthField
            label="Centre, from the wall’s left end"
            value={cutout.centre}
            step={step}
            onLength={(centre) => change({ centre }, `centre at ${say(centre, step)}`)}
          />
          <LengthField
            label="From the front edge"
            value={cutout.setback}
            step={step}
            onLength={(setback) => change({ setback }, `${say(setback, step)} from the front`)}
          />
          <LengthField
            label="Width"
            value={cutout.width}
            step={step}
            check={positive}
            onLength={(width) => change({ width }, `${say(width, step)} wide`)}
          />
          <LengthField
            label="Front to back"
            value={cutout.depth}
            step={step}
            check={positive}
            onLength={(depth) => change({ depth }, `${say(depth, step)} front to back`)}
          />
          <LengthField
            label="Corner radius"
            value={cutout.radius}
            step={step}
            onLength={(radius) => change({ radius }, `radius ${say(radius, step)}`)}
          />
          {cutout.kind === 'sink' && (
            <Segmented
              label="Sink is set"
              options={[
                { value: 'drop-in', label: 'From above' },
                { value: 'undermount', label: 'From below' },
              ]}
              value={cutout.mount === 'apron' ? null : (cutout.mount ?? 'drop-in')}
              onChange={(mount) => change({ mount }, mount)}
            />
          )}
          <Text kind="small">
            Cut by the maker’s template where there is one. Gas, water and electricity: licensed trades.
          </Text>
          <Button
            label="Take the cutout away"
            look="danger"
            onPress={() => run({ kind: 'removeItem', section: 'cutouts', item: id }, cutout.kind)}
          />
        </View>
      )}
    </>
  );
}

const styles = StyleSheet.create({ fields: { gap: space.m } });
