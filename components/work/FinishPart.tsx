import { StyleSheet, View } from 'react-native';

import { CAUTIONS } from '@/geometry/wood/cautions';
import { fastenersOfTops } from '@/geometry/wood/fasteners';
import { careText, FINISHES, finishSetting, type FinishFact } from '@/geometry/wood/finish';
import { materialsList } from '@/geometry/wood/materials-list';
import { sandingGrits } from '@/geometry/wood/sanding';
import { sourceText } from '@/geometry/wood/sourced';
import { useOpenJob } from '../editor/JobProvider';
import { Banner } from '../ui/Banner';
import { Checkbox } from '../ui/Checkbox';
import { RadioCards } from '../ui/RadioCard';
import { Text } from '../ui/Text';
import { TypedField, type TypedValue } from '../ui/TypedField';
import { space } from '../ui/tokens';
import { Fact } from './Fact';
import { Cards, Section } from './Part';
import { useWalls } from './use-walls';
import { hoursWords } from './work-words';

/** The finish as a choice, what it takes, and what the customer is told. */
export function FinishPart() {
  const { layout, run, mayEdit } = useOpenJob();
  const { finish } = layout;
  const care = careText(finish, layout.material.species);
  return (
    <Cards>
      <Section title="Finish" broad>
        <RadioCards
          label="Finish"
          across
          value={finish.kind}
          onChange={(kind) => {
            if (mayEdit && kind !== finish.kind) run({ kind: 'setFinish', value: { kind } }, `finish ${kind}`);
          }}
          options={Object.values(FINISHES).map((choice) => ({
            value: choice.kind,
            title: choice.name,
            disabled: !mayEdit,
            spoken: choice.foodContact.text,
            body: (
              <View style={styles.facts}>
                <Note title="Food" fact={choice.foodContact} />
                <Note title="Upkeep" fact={choice.upkeep} />
                <Note title="Repair" fact={choice.repair} />
                <Note title="Moisture" fact={choice.moisture} />
              </View>
            ),
          }))}
        />
        <Checkbox
          label="Food is prepared straight on it"
          checked={finish.foodPrep ?? false}
          disabled={!mayEdit}
          onChange={(foodPrep) =>
            run({ kind: 'setFinish', value: { foodPrep } }, foodPrep ? 'for food' : 'not for food')
          }
        />
        {finish.foodPrep && !FINISHES[finish.kind].foodPrep && (
          <Banner
            look="attention"
            fact="A film is cut by knives."
            act="Take oil or hard wax oil where food is prepared on the top."
          />
        )}
        {FINISHES[finish.kind].oilyRags && <Banner icon="look" fact="Oily rags." act={CAUTIONS.rags.text} />}
      </Section>
      <Quantities />
      <Section title="Care, for the customer">
        {care.map((line) => (
          <Text key={line}>{line}</Text>
        ))}
      </Section>
    </Cards>
  );
}

function Note({ title, fact }: { readonly title: string; readonly fact: FinishFact }) {
  return (
    <Text kind="small">
      <Text kind="small" tone="ink">
        {`${title}: ${fact.text} `}
      </Text>
      {`(${sourceText({ ...fact, value: 0 })})`}
    </Text>
  );
}

/** Coats, quarts, grits and times; the shop's settings decide the times. */
function Quantities() {
  const { layout, plan, settings, run, mayEdit } = useOpenJob();
  const walls = useWalls();
  const setting = finishSetting(layout.finish, settings);
  const holes = fastenersOfTops(plan.tops, layout.bases, walls, settings.screws, plan.movement.slot);
  const list = materialsList(layout, plan.tops, plan.joints, holes, settings);
  const kind = layout.finish.kind;
  return (
    <Section title="Quantities and times">
      <Fact label="Faces and edges to seal" value={`${Math.round(list.sealedSqFt)} sq ft`} />
      {setting && kind !== 'none' && (
        <>
          <TypedField
            label="Coats"
            kind="number"
            value={setting.coats}
            disabled={!mayEdit}
            write={String}
            read={readCoats}
            onValue={(coats) => run({ kind: 'setFinish', value: { coats } }, `${coats} coats`)}
            hint="The first on every face and edge, the later ones on the upper face."
          />
          <Fact
            label="Finish to buy"
            value={`${list.finishQuarts.toFixed(1)} qt`}
            note="a tenth to spare"
            from={`Spread of ${kind}, one coat`}
          />
          <Fact label="Between coats" value={hoursWords(setting.recoatHours)} from={`Recoat time of ${kind}`} />
          <Fact
            label="Cured after"
            value={hoursWords(setting.cureHours)}
            note="light use only before"
            from={`Cure time of ${kind}`}
          />
        </>
      )}
      <Fact
        label="Sanding, once and last, along the grain"
        value={sandingGrits(layout.finish).join(', ')}
        from="First sanding grit"
      />
      <Fact label="Glue" value={`${list.glueOunces.toFixed(1)} fl oz`} from="Spread of glue, one face" />
      <Text kind="second">Recoat and cure times are settings of the shop. The tin’s own word comes first.</Text>
    </Section>
  );
}

function readCoats(text: string): TypedValue<number> {
  const coats = Number(text.trim());
  return Number.isInteger(coats) && coats >= 1 && coats <= 12
    ? { ok: true, value: coats }
    : { ok: false, message: 'Type a whole number from 1 to 12.' };
}

const styles = StyleSheet.create({ facts: { gap: space.s } });
