import { StyleSheet, View } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { planTotals } from '../slabs/slab-words';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';

/** The wood of the tops; only species that slabs or rack pieces are listed in can be cut. */
export function WoodBar() {
  const { layout, run, mayEdit, plan } = useOpenJob();
  const listed = [...layout.stock.slabs, ...layout.stock.rack].flatMap((slab) => (slab.species ? [slab.species] : []));
  const species = [...new Set([layout.material.species, ...listed])];
  return (
    <View style={styles.bar}>
      <View style={styles.wood}>
        <Select
          label="Wood"
          labelHidden
          options={species.map((name) => ({ value: name, label: name[0]!.toUpperCase() + name.slice(1) }))}
          value={layout.material.species}
          disabled={!mayEdit}
          onChange={(name) => run({ kind: 'setMaterial', value: { species: name } }, `wood ${name}`)}
        />
      </View>
      <Text kind="label">Visible seam, all</Text>
      <Fraction inches={planTotals(plan, layout).visibleSeam} step={layout.step} bold size={18} />
    </View>
  );
}

const styles = StyleSheet.create({
  bar: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space.m,
    paddingHorizontal: space.m,
    paddingVertical: 6,
    backgroundColor: color.card,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
  },
  wood: { width: 180 },
});
