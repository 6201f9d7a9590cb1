import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Cutout } from '@/geometry/core/layout';
import { boundingBox } from '@/geometry/core/polygon';
import { inches as say } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { LengthField } from '../measure/LengthField';
import { Button } from '../ui/Button';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { BladeField } from './BladeField';
import { cutoutPlaceProblem, someLength } from './length-checks';
import { TemplateField } from './TemplateField';
import { cutoutTitle, inSentence, topName, wallName } from './tops-choice';
import { useItemChange } from './use-item-change';

type From = 'centre' | 'left' | 'right';

const MOUNTS: Readonly<Record<NonNullable<Cutout['mount']>, string>> = {
  'drop-in': 'From above',
  undermount: 'From below',
  apron: 'Apron front',
};

/** A cutout's place and size on blades; what the maker's template says comes first. */
export function CutoutPanel({ id, onGone }: { readonly id: string; readonly onGone: () => void }) {
  const { plan, layout, run, mayEdit } = useOpenJob();
  const cutout = layout.cutouts.find((c) => c.id === id);
  const placed = plan.cutouts.find((c) => c.id === id);
  const name = cutout ? cutoutTitle(cutout) : 'Cutout';
  const change = useItemChange('cutouts', id, inSentence(name));
  if (!cutout) return null;
  const { step } = layout;
  return (
    <View style={styles.panel}>
      {placed && (
        <Text kind="second">{`${topName(layout, cutout.on)}. Strips of ${say(placed.frontStrip, step)} in front and ${say(placed.backStrip, step)} behind${placed.endGrain ? `; seal ${say(placed.endGrain, step)} of end grain` : ''}.`}</Text>
      )}
      {cutout.kind === 'sink' && mayEdit && (
        <Segmented
          label="Sink is set"
          options={(Object.keys(MOUNTS) as (keyof typeof MOUNTS)[]).map((value) => ({ value, label: MOUNTS[value] }))}
          value={cutout.mount ?? 'drop-in'}
          onChange={(mount) =>
            change(mount === 'apron' ? { mount, setback: 0 } : { mount }, `set ${MOUNTS[mount].toLowerCase()}`)
          }
        />
      )}
      <CutoutPlace cutout={cutout} title={name} />
      <CutoutSize cutout={cutout} title={name} />
      {mayEdit && (
        <TemplateField
          label="Maker’s template"
          hint="A corner a line: along, then back from the front side, such as 15, 0. Along counts from the middle."
          outline={cutout.outline}
          onOutline={(outline, what) => change({ outline }, what)}
          template
        />
      )}
      <Text kind="small">
        Cut by the maker’s template where there is one. Clearances of a cooktop by its maker’s instructions; gas, water
        and electricity by licensed trades.
      </Text>
      {mayEdit && (
        <Button
          label="Take the cutout away"
          look="danger"
          icon="bin"
          onPress={() => {
            if (run({ kind: 'removeItem', section: 'cutouts', item: id }, inSentence(name))) onGone();
          }}
        />
      )}
    </View>
  );
}

/** Along the top by the centre or by an edge, and how far from the front. */
function CutoutPlace({ cutout, title }: { readonly cutout: Cutout; readonly title: string }) {
  const { layout, mayEdit } = useOpenJob();
  const [from, setFrom] = useState<From>('centre');
  const change = useItemChange('cutouts', cutout.id, inSentence(title));
  const { step } = layout;
  const box = cutout.outline ? boundingBox(cutout.outline) : null;
  const reach = { centre: 0, left: box ? box.minX : -cutout.width / 2, right: box ? box.maxX : cutout.width / 2 }[from];
  const wall = layout.runs.find((r) => r.id === cutout.on)?.wall;
  const origin =
    wall === undefined ? 'from the island’s left end' : `from the left end of wall ${wallName(layout, wall)}`;
  const words = { centre: 'Centre', left: 'Left edge', right: 'Right edge' }[from];
  const depthNow = box ? box.maxY - box.minY : cutout.depth;
  const checkSetback = (setback: number) =>
    cutoutPlaceProblem(layout, cutout.on, { ...cutout, setback, depth: depthNow });
  return (
    <View>
      {mayEdit && (
        <Segmented
          label="Measured to"
          options={[
            { value: 'left', label: 'Left edge' },
            { value: 'centre', label: 'Centre' },
            { value: 'right', label: 'Right edge' },
          ]}
          value={from}
          onChange={setFrom}
        />
      )}
      <BladeField
        label={words}
        title={`${title}, ${words.toLowerCase()}`}
        note={origin}
        inches={cutout.centre + reach}
        onLength={(at) => change({ centre: at - reach }, `${words.toLowerCase()} at ${say(at, step)}`)}
      />
      {cutout.setback < 0 ? (
        <LengthField
          label="From the front edge, minus in front of it"
          value={cutout.setback}
          step={step}
          signed
          disabled={!mayEdit}
          onLength={(setback) => change({ setback }, `${say(setback, step)} from the front`)}
        />
      ) : (
        <BladeField
          label="From the front"
          title={`${title}, from the front`}
          note="front edge of the top to the cutout"
          inches={cutout.setback}
          check={checkSetback}
          fixed={cutout.mount === 'apron'}
          onLength={(setback) => change({ setback }, `${say(setback, step)} from the front`)}
        />
      )}
    </View>
  );
}

function CutoutSize({ cutout, title }: { readonly cutout: Cutout; readonly title: string }) {
  const { layout } = useOpenJob();
  const change = useItemChange('cutouts', cutout.id, inSentence(title));
  const { step } = layout;
  const box = cutout.outline ? boundingBox(cutout.outline) : null;
  const fixed = box !== null;
  if (cutout.kind === 'tap' && !fixed)
    return (
      <BladeField
        label="Hole across"
        title={`${title}, across`}
        inches={cutout.width}
        check={someLength('A hole')}
        onLength={(width) => change({ width, depth: width }, `${say(width, step)} across`)}
      />
    );
  return (
    <View>
      <BladeField
        label="Width"
        title={`${title}, width`}
        note={fixed ? 'by the template' : undefined}
        inches={box ? box.maxX - box.minX : cutout.width}
        fixed={fixed}
        check={someLength('A cutout’s width')}
        onLength={(width) => change({ width }, `${say(width, step)} wide`)}
      />
      <BladeField
        label="Front to back"
        title={`${title}, front to back`}
        note={fixed ? 'by the template' : undefined}
        inches={box ? box.maxY - box.minY : cutout.depth}
        fixed={fixed}
        check={(depth) =>
          someLength('A cutout’s depth')(depth) ?? cutoutPlaceProblem(layout, cutout.on, { ...cutout, depth })
        }
        onLength={(depth) => change({ depth }, `${say(depth, step)} front to back`)}
      />
      <BladeField
        label="Corner radius"
        title={`${title}, corner radius`}
        inches={cutout.radius}
        onLength={(radius) => change({ radius }, `radius ${say(radius, step)}`)}
      />
    </View>
  );
}

const styles = StyleSheet.create({ panel: { gap: space.m } });
