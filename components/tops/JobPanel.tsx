import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { EdgeProfile, Finish, Layout } from '@/geometry/core/layout';
import { inches as say } from '@/geometry/top/sentence';
import type { EditDraft } from '@/shared/layout/apply-edit';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Field } from '../ui/Field';
import { Chips, Segmented, type ChipsProps } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { BladeField } from './BladeField';
import { someLength } from './length-checks';
import { WoodLinks } from './WoodLinks';

const PROFILES: readonly { readonly value: EdgeProfile['profile']; readonly label: string }[] = [
  { value: 'square', label: 'Square' },
  { value: 'roundover', label: 'Roundover' },
  { value: 'chamfer', label: 'Chamfer' },
  { value: 'bevel', label: 'Bevel' },
];

const FINISHES: readonly { readonly value: Finish['kind']; readonly label: string }[] = [
  { value: 'oil', label: 'Oil' },
  { value: 'hard wax', label: 'Hard wax' },
  { value: 'film', label: 'Film' },
  { value: 'none', label: 'None' },
];

type Setter = (edit: EditDraft, label: string) => void;

/** What holds for the whole job: wood, edge, finish, fixing, and the way into the house. */
export function JobPanel() {
  const { layout, run } = useOpenJob();
  const set: Setter = (edit, label) => void run(edit, label);
  return (
    <View style={styles.panel}>
      <WoodFields layout={layout} set={set} />
      <EdgeFields layout={layout} set={set} />
      <FixingFields layout={layout} set={set} />
      <AccessFields layout={layout} set={set} />
      <WoodLinks />
    </View>
  );
}

interface FieldsProps {
  readonly layout: Layout;
  readonly set: Setter;
}

function WoodFields({ layout, set }: FieldsProps) {
  const { material, step } = layout;
  const { mayEdit } = useOpenJob();
  return (
    <View style={styles.section}>
      <Text kind="rowTitle" level={3}>
        Wood
      </Text>
      <View>
        <BladeField
          label="Thickness"
          inches={material.thickness}
          check={someLength('A slab’s thickness')}
          onLength={(thickness) => set({ kind: 'setMaterial', value: { thickness } }, `${say(thickness, step)} thick`)}
        />
        <BladeField
          label="Slabs are this deep"
          note="depth of a new run"
          inches={material.slabDepth}
          check={someLength('A slab’s depth')}
          onLength={(slabDepth) =>
            set({ kind: 'setMaterial', value: { slabDepth } }, `slabs ${say(slabDepth, step)} deep`)
          }
        />
        <BladeField
          label="Width of a stave"
          inches={material.stave}
          check={someLength('A stave’s width')}
          onLength={(stave) => set({ kind: 'setMaterial', value: { stave } }, `staves ${say(stave, step)} wide`)}
        />
      </View>
      {mayEdit && (
        <>
          <Segmented
            label="Good faces"
            options={[
              { value: 'both', label: 'Both' },
              { value: 'one', label: 'One' },
            ]}
            value={material.faces}
            onChange={(faces) =>
              set({ kind: 'setMaterial', value: { faces } }, `${faces === 'both' ? 'both faces' : 'one face'} good`)
            }
          />
          <Segmented
            label="Growth rings in the staves"
            options={[
              { value: 'mixed', label: 'Mixed' },
              { value: 'flat', label: 'Flat' },
              { value: 'edge', label: 'Edge' },
            ]}
            value={material.grain}
            onChange={(grain) => set({ kind: 'setMaterial', value: { grain } }, `${grain} grain`)}
          />
        </>
      )}
    </View>
  );
}

function EdgeFields({ layout, set }: FieldsProps) {
  const { edges, finish, step } = layout;
  const { mayEdit } = useOpenJob();
  return (
    <View style={styles.section}>
      <Text kind="rowTitle" level={3}>
        Edge and finish
      </Text>
      {mayEdit ? (
        <LabelledChips
          label="Edge profile"
          options={PROFILES}
          value={edges.profile}
          onChange={(profile) => set({ kind: 'setEdges', value: { profile } }, `edge ${profile}`)}
        />
      ) : (
        <Text>{`Edge: ${edges.profile}`}</Text>
      )}
      {edges.profile !== 'square' && (
        <BladeField
          label={edges.profile === 'roundover' ? 'Radius of the edge' : 'Size of the edge'}
          inches={edges.size}
          check={(size) =>
            size <= layout.material.thickness ? null : `The wood is ${say(layout.material.thickness, step)} thick.`
          }
          onLength={(size) => set({ kind: 'setEdges', value: { size } }, `edge ${say(size, step)}`)}
        />
      )}
      {mayEdit ? (
        <LabelledChips
          label="Finish"
          options={FINISHES}
          value={finish.kind}
          onChange={(kind) => set({ kind: 'setFinish', value: { kind } }, `finish ${kind}`)}
        />
      ) : (
        <Text>{`Finish: ${finish.kind}`}</Text>
      )}
      <Checkbox
        label="Food is prepared straight on it"
        checked={finish.foodPrep ?? false}
        disabled={!mayEdit}
        onChange={(foodPrep) => set({ kind: 'setFinish', value: { foodPrep } }, foodPrep ? 'for food' : 'not for food')}
      />
    </View>
  );
}

function FixingFields({ layout, set }: FieldsProps) {
  const { fixing, step } = layout;
  return (
    <View style={styles.section}>
      <Text kind="rowTitle" level={3}>
        Fixing
      </Text>
      <View>
        <BladeField
          label="Rail the screws pass"
          note="rail or corner block of the cabinets"
          inches={fixing.rail}
          onLength={(rail) => set({ kind: 'setFixing', value: { rail } }, `rail ${say(rail, step)}`)}
        />
        <BladeField
          label="Backsplash"
          note="its thickness covers the gap; 0 for none"
          inches={fixing.backsplash}
          onLength={(backsplash) =>
            set({ kind: 'setFixing', value: { backsplash } }, `backsplash ${say(backsplash, step)}`)
          }
        />
      </View>
    </View>
  );
}

function AccessFields({ layout, set }: FieldsProps) {
  const { access, step } = layout;
  const { mayEdit } = useOpenJob();
  const [corridor, clear] = [access.corridor, access.clearLength];
  return (
    <View style={styles.section}>
      <Text kind="rowTitle" level={3}>
        Getting it in
      </Text>
      <View>
        <BladeField
          label="Door, clear width"
          inches={access.doorWidth}
          check={someLength('A door')}
          onLength={(doorWidth) =>
            set({ kind: 'setAccess', value: { doorWidth } }, `door ${say(doorWidth, step)} wide`)
          }
        />
        <BladeField
          label="Door, clear height"
          inches={access.doorHeight}
          check={someLength('A door')}
          onLength={(doorHeight) =>
            set({ kind: 'setAccess', value: { doorHeight } }, `door ${say(doorHeight, step)} high`)
          }
        />
        <BladeField
          label="Corridor before its corner"
          inches={corridor?.[0] ?? null}
          emptyWords="no corner"
          check={someLength('A corridor')}
          onLength={(a) =>
            set({ kind: 'setAccess', value: { corridor: [a, corridor?.[1] ?? a] } }, `corridor ${say(a, step)} wide`)
          }
        />
        {corridor && (
          <BladeField
            label="Corridor past its corner"
            inches={corridor[1]}
            check={someLength('A corridor')}
            onLength={(b) =>
              set({ kind: 'setAccess', value: { corridor: [corridor[0], b] } }, `corridor ${say(b, step)} wide`)
            }
          />
        )}
        <BladeField
          label="Longest that stairs let through"
          inches={clear}
          emptyWords="no limit"
          check={someLength('A length')}
          onLength={(clearLength) =>
            set({ kind: 'setAccess', value: { clearLength } }, `clear length ${say(clearLength, step)}`)
          }
        />
      </View>
      {mayEdit && (corridor || clear !== null) && (
        <View style={styles.buttons}>
          {corridor && (
            <Button
              label="No corridor corner"
              onPress={() => set({ kind: 'setAccess', value: { corridor: null } }, 'no corridor corner')}
            />
          )}
          {clear !== null && (
            <Button
              label="No stair limit"
              onPress={() => set({ kind: 'setAccess', value: { clearLength: null } }, 'no stair limit')}
            />
          )}
        </View>
      )}
      <CrewField crew={access.crew} set={set} />
      <Text kind="small">Lift with the hands the fit sheet names. Long pieces on edge, never flat over one hand.</Text>
    </View>
  );
}

function LabelledChips<T extends string>(props: ChipsProps<T>) {
  return (
    <View style={styles.labelled}>
      <Text kind="label" hidden>
        {props.label}
      </Text>
      <Chips {...props} />
    </View>
  );
}

function CrewField({ crew, set }: { readonly crew: number; readonly set: Setter }) {
  const { mayEdit } = useOpenJob();
  const [text, setText] = useState<string | null>(null);
  const [error, setError] = useState<string | undefined>();
  const store = () => {
    if (text === null) return;
    const typed = Number(text);
    if (!Number.isInteger(typed) || typed < 1 || typed > 12) return setError('Type a whole number from 1 to 12.');
    setError(undefined);
    setText(null);
    if (typed !== crew) set({ kind: 'setAccess', value: { crew: typed } }, `crew of ${typed}`);
  };
  return (
    <Field
      label="People who carry"
      kind="number"
      autoComplete="off"
      value={text ?? String(crew)}
      disabled={!mayEdit}
      onChange={setText}
      onBlur={store}
      onSubmit={store}
      error={error}
    />
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.xl },
  section: { gap: space.m },
  labelled: { gap: 6 },
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s },
});
