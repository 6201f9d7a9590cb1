import { StyleSheet, View } from 'react-native';

import type { Base, BaseKind } from '@/geometry/core/layout';
import { formatLength } from '@/geometry/tape/format-length';
import { inches } from '@/geometry/top/sentence';
import { useOpenJob } from '../editor/JobProvider';
import { LengthField } from '../measure/LengthField';
import { Button } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Icon } from '../ui/Icon';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import { useToast } from '../ui/ToastProvider';
import { placeBase } from '../editor/tools/place-tool';
import { BASE_KINDS, BASE_LOOK, baseEnd, basePlaceProblem, freePlace, onFloor } from './base-words';
import type { RoomView } from './use-room-view';

/** What stands along a wall: add, type where, take away. */
export function WallBases({ view, wall }: { readonly view: RoomView; readonly wall: string }) {
  const { layout, plan, run, mayEdit } = useOpenJob();
  const toast = useToast();
  const { base: open, openBase: setOpen } = view;
  const length = plan.room?.walls.find((w) => w.id === wall)?.adjusted ?? 0;
  const standing = layout.bases.filter((base) => base.wall === wall).sort((a, b) => a.from - b.from);

  const add = (kind: BaseKind) => {
    const free = freePlace(layout.bases, wall, length, Math.min(BASE_LOOK[kind].width, length));
    const at = kind === 'window' ? length / 2 : (free ?? 0) + BASE_LOOK[kind].width / 2;
    const result = placeBase(layout, kind, { wall, at, length });
    if ('refusal' in result) toast({ tone: 'failure', text: result.refusal });
    else if (run(result.edit.edit, result.edit.label)) setOpen(result.id);
  };

  return (
    <View style={styles.section}>
      <Text kind="rowTitle" level={3}>
        On this wall
      </Text>
      {standing.map((base) => (
        <View key={base.id}>
          <Press
            style={styles.row}
            hoverGround={color.chalkT}
            aria-expanded={open === base.id}
            aria-label={`${BASE_LOOK[base.kind].name}, ${inches(baseEnd(base, length) - base.from, layout.step)} wide, at ${inches(base.from, layout.step)}`}
            onPress={() => setOpen(open === base.id ? null : base.id)}
          >
            <Icon
              name={base.access === 'none' ? 'lock' : BASE_LOOK[base.kind].icon}
              tone={base.access === 'none' ? 'red' : 'ink'}
            />
            <View style={styles.grow}>
              <Text
                hidden
              >{`${BASE_LOOK[base.kind].name} ${formatLength(baseEnd(base, length) - base.from, layout.step)}${base.access === 'none' ? ', no access from below' : ''}`}</Text>
            </View>
            <Text kind="second" hidden>{`at ${formatLength(base.from, layout.step)}`}</Text>
          </Press>
          {open === base.id && mayEdit && <BaseFields base={base} length={length} />}
        </View>
      ))}
      {standing.length === 0 && <Text kind="second">Nothing yet. Tops go along the whole wall.</Text>}
      {mayEdit && (
        <View style={styles.kinds} role="group" aria-label="Add to this wall">
          {BASE_KINDS.map((kind) => (
            <Press
              key={kind}
              style={styles.kind}
              hoverGround={color.chalkT}
              aria-label={`Add ${BASE_LOOK[kind].name.toLowerCase()}`}
              onPress={() => add(kind)}
            >
              <Icon name={BASE_LOOK[kind].icon} />
              <Text kind="labelSmall" hidden>
                {BASE_LOOK[kind].name}
              </Text>
            </Press>
          ))}
        </View>
      )}
    </View>
  );
}

function BaseFields({ base, length }: { readonly base: Base; readonly length: number }) {
  const { layout, run } = useOpenJob();
  const say = (value: number) => inches(value, layout.step);
  const name = BASE_LOOK[base.kind].name.toLowerCase();
  const width = baseEnd(base, length) - base.from;
  const check = (change: Partial<Base>) => basePlaceProblem({ ...base, ...change }, layout.bases, length, say);
  const change = (fields: Partial<Base>, what: string) =>
    run(
      { kind: 'changeItem', section: 'bases', item: base.id, change: fields as Record<string, unknown> },
      `${name}, ${what}`,
    );
  return (
    <View style={styles.fields}>
      <LengthField
        label="From the left end"
        value={base.from}
        step={layout.step}
        check={(from) => check({ from, to: from + width })}
        onLength={(from) => change({ from, to: from + width }, `at ${say(from)}`)}
      />
      <LengthField
        label="Width"
        value={width}
        step={layout.step}
        check={(next) => check({ to: base.from + next })}
        onLength={(next) => change({ to: base.from + next }, `${say(next)} wide`)}
      />
      {base.kind === 'window' ? (
        <LengthField
          label="Sill over the cabinets"
          value={base.sill ?? null}
          step={layout.step}
          onLength={(sill) => change({ sill }, `sill at ${say(sill)}`)}
        />
      ) : (
        <LengthField
          label="Depth"
          value={base.depth}
          step={layout.step}
          onLength={(depth) => change({ depth }, `${say(depth)} deep`)}
        />
      )}
      {onFloor(base) && base.kind !== 'pipe' && base.kind !== 'opening' && (
        <LengthField
          label="Shim under it, to come level"
          value={base.shim ?? null}
          step={layout.step}
          hint="Leave it empty where none is needed."
          check={(shim) => (shim > 6 ? 'Over 6 in is a plinth, not a shim.' : null)}
          onLength={(shim) => change({ shim }, `shim ${say(shim)}`)}
        />
      )}
      <Checkbox
        label="A hand gets in from below"
        checked={base.access === 'open'}
        onChange={(open) =>
          change({ access: open ? 'open' : 'none' }, open ? 'access from below' : 'no access from below')
        }
      />
      <Button
        label={`Take the ${name} away`}
        look="danger"
        onPress={() => run({ kind: 'removeItem', section: 'bases', item: base.id }, name)}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: space.s },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 48,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
  grow: { flex: 1, minWidth: 0 },
  fields: { gap: space.m, padding: space.m, backgroundColor: color.paper },
  kinds: { flexDirection: 'row', flexWrap: 'wrap', gap: space.s, marginTop: space.s },
  kind: {
    width: 88,
    minHeight: 60,
    alignItems: 'center',
    justifyContent: 'center',
    gap: 2,
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: radius.control,
    backgroundColor: color.card,
  },
});
