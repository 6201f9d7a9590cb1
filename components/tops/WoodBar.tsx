import { StyleSheet, View } from 'react-native';

import { SPECIES } from '@/geometry/wood/species';
import { WoodSwatch } from '../canvas/WoodSwatch';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { planTotals } from '../slabs/slab-words';
import { Press } from '../ui/Press';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import { useRadioKeys } from '../ui/use-radio-keys';

/** Woods with a figure of their own on screen; all others stand in the list. */
const SWATCHES = ['hard maple', 'black walnut', 'cherry', 'white oak', 'beech'] as const;

const named = (species: string): string => `${species.charAt(0).toUpperCase()}${species.slice(1)}`;

/** The wood of the tops: five swatches, and every other wood the tables know in a list. */
export function WoodBar() {
  const { layout, run, mayEdit } = useOpenJob();
  const { species } = layout.material;
  const choose = (name: string) => {
    if (name !== species) run({ kind: 'setMaterial', value: { species: name } }, `wood ${name}`);
  };
  const chosen = SWATCHES.findIndex((name) => name === species);
  const keys = useRadioKeys(
    SWATCHES.length,
    chosen,
    (i) => choose(SWATCHES[i]!),
    () => !mayEdit,
  );
  const others = [...new Set([...SPECIES.map((s) => s.key), species])].filter(
    (name) => !SWATCHES.some((s) => s === name),
  );
  return (
    <View style={styles.bar}>
      <Text kind="label">Wood</Text>
      <View role="radiogroup" aria-label="Wood" {...keys.group} style={styles.swatches}>
        {SWATCHES.map((name, i) => (
          <Press
            key={name}
            role="radio"
            aria-checked={i === chosen}
            aria-label={named(name)}
            tabIndex={keys.tabIndex(i)}
            disabled={!mayEdit}
            onPress={() => choose(name)}
            style={styles.press}
          >
            <View style={[styles.swatch, i === chosen && styles.chosen]}>
              <WoodSwatch species={name} />
            </View>
          </Press>
        ))}
      </View>
      <View style={styles.others}>
        <Select
          label="Another wood"
          labelHidden
          options={others.map((name) => ({ value: name, label: named(name) }))}
          value={chosen >= 0 ? null : species}
          placeholder={chosen >= 0 ? named(species) : 'Another wood'}
          disabled={!mayEdit}
          onChange={choose}
        />
      </View>
    </View>
  );
}

/** What all joints and seams show together. */
export function VisibleSeam() {
  const { layout, plan } = useOpenJob();
  return (
    <View style={styles.bar}>
      <Text kind="label">Visible seam, all</Text>
      <Fraction inches={planTotals(plan, layout).visibleSeam} step={layout.step} bold size={20} />
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    alignContent: 'center',
    columnGap: space.m,
    rowGap: space.xs,
    minHeight: 56,
    paddingHorizontal: space.m,
    paddingVertical: space.xs,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
  },
  swatches: { flexDirection: 'row', flexWrap: 'wrap' },
  press: { minWidth: 58, minHeight: 44, alignItems: 'center', justifyContent: 'center' },
  swatch: { borderWidth: 3, borderColor: 'transparent', padding: 1 },
  chosen: { borderColor: color.chalk },
  others: { width: 168 },
});
