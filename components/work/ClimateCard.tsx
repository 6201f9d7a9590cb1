import { StyleSheet, View } from 'react-native';

import type { Climate, ClimateYear } from '@/geometry/core/layout';
import { CLIMATE_PRESETS, USUAL_SHOP } from '@/geometry/wood/climate-presets';
import { equilibriumMoisture } from '@/geometry/wood/moisture';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Checkbox } from '../ui/Checkbox';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { TypedField } from '../ui/TypedField';
import { color, space } from '../ui/tokens';
import { percent, readHumidity, readTemperature, sameAir, writeTemperature } from './climate-words';
import { FromLink } from './Fact';
import { Section } from './Part';

type Season = 'make' | 'summer' | 'winter';

const SEASONS: readonly { readonly key: Season; readonly title: string }[] = [
  { key: 'make', title: 'Where it is made' },
  { key: 'summer', title: 'House in summer' },
  { key: 'winter', title: 'House in winter' },
];

/** Air of the shop and of the house: picked from presets or typed, with the moisture the wood settles to. */
export function ClimateCard() {
  const { layout, run, mayEdit } = useOpenJob();
  const { climate } = layout;
  const preset = CLIMATE_PRESETS.find(
    (one) =>
      sameAir(one.summer, climate.summer) && sameAir(one.winter, climate.winter) && one.heated === climate.heated,
  );
  const set = (value: Partial<ClimateYear>, label: string) => run({ kind: 'setClimate', value }, label);
  const pick = (key: string) => {
    const found = CLIMATE_PRESETS.find((one) => one.key === key);
    if (found) set({ summer: found.summer, winter: found.winter, heated: found.heated }, found.name.toLowerCase());
  };
  return (
    <Section title="Climate">
      <Select
        label="Kind of house"
        options={[
          ...CLIMATE_PRESETS.map(({ key, name }) => ({ value: key, label: name })),
          ...(preset ? [] : [{ value: 'typed', label: 'Typed below' }]),
        ]}
        value={preset?.key ?? 'typed'}
        disabled={!mayEdit}
        onChange={pick}
        hint="Round figures to start from. A hygrometer left in the kitchen for a week beats them."
      />
      {preset && <FromLink line={`${preset.name}: summer temperature`} />}
      {SEASONS.map(({ key, title }) => (
        <Air key={key} title={title} air={climate[key]} onAir={(air) => set({ [key]: air }, title.toLowerCase())} />
      ))}
      <Checkbox
        label="The house is heated in winter"
        checked={climate.heated}
        disabled={!mayEdit}
        onChange={(heated) => set({ heated }, heated ? 'heated in winter' : 'unheated in winter')}
      />
      {mayEdit && !sameAir(climate.make, USUAL_SHOP) && (
        <Button label="The shop's usual air" onPress={() => set({ make: USUAL_SHOP }, 'usual air of the shop')} />
      )}
      <FromLink line="Moisture that wood settles to" />
    </Section>
  );
}

interface AirProps {
  readonly title: string;
  readonly air: Climate;
  readonly onAir: (air: Climate) => void;
}

function Air({ title, air, onAir }: AirProps) {
  const { layout, mayEdit } = useOpenJob();
  const metric = layout.units === 'mm';
  return (
    <View role="group" aria-label={title} style={styles.air}>
      <View style={styles.head}>
        <Text kind="label">{title}</Text>
        <Text kind="strong">{`wood at ${percent(equilibriumMoisture(air))}`}</Text>
      </View>
      <View style={styles.fields}>
        <View style={styles.field}>
          <TypedField
            label={`${title}, temperature`}
            labelHidden
            value={air.tempF}
            disabled={!mayEdit}
            write={(value) => writeTemperature(value, metric)}
            read={(text) => readTemperature(text, metric)}
            onValue={(tempF) => onAir({ ...air, tempF })}
          />
        </View>
        <View style={styles.field}>
          <TypedField
            label={`${title}, relative humidity`}
            labelHidden
            value={air.rh}
            disabled={!mayEdit}
            write={(value) => `${Number(value.toFixed(1))} %`}
            read={readHumidity}
            onValue={(rh) => onAir({ ...air, rh })}
          />
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  air: { gap: space.s, paddingVertical: space.s, borderBottomWidth: 1, borderBottomColor: color.line },
  head: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', gap: space.s },
  fields: { flexDirection: 'row', gap: space.m },
  field: { flex: 1, minWidth: 0 },
});
