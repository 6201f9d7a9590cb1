import { StyleSheet, View } from 'react-native';

import { useMay } from '../api/use-session';
import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { Card } from '../ui/Card';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { money, planTotals, proofWords } from './slab-words';

/** The plan in figures, with how good it is. */
export function PlanSummary() {
  const { plan, layout } = useOpenJob();
  const seesPrices = useMay('price.see');
  const totals = planTotals(plan, layout);
  return (
    <Card frame="chalk">
      <View style={styles.card} testID="plan-summary">
        <Text kind="rowTitle" level={2}>
          Cheapest plan
        </Text>
        <View style={styles.figures}>
          {seesPrices && plan.cost && (
            <Figure title="Cost">
              <Text kind="strong" size={20}>
                {money(plan.cost.slabs)}
              </Text>
            </Figure>
          )}
          <Figure title="Visible seam">
            <Fraction inches={totals.visibleSeam} step={layout.step} size={20} bold />
          </Figure>
          <Figure title="Waste">
            <Text kind="strong" size={20}>
              {`${Math.round(totals.waste * 100)}%`}
            </Text>
          </Figure>
          <Figure title="Saw cuts">
            <Text kind="strong" size={20}>
              {String(totals.cuts)}
            </Text>
          </Figure>
        </View>
        <Text kind="second">{proofLine(seesPrices, proofWords(plan))}</Text>
        <Text kind="second">{`${turnWords(totals.faceDown)} ${rackWords(totals.fromRack)}`}</Text>
      </View>
    </Card>
  );
}

/** Whoever may not see prices is still told whether the plan is proved. */
const proofLine = (seesPrices: boolean, words: string): string =>
  seesPrices || words.startsWith('Proved') ? words : 'Not proved best yet.';

const turnWords = (count: number): string =>
  count === 0
    ? 'Everything lies face up.'
    : count === 1
      ? 'One piece lies face down.'
      : `${count} pieces lie face down.`;

const rackWords = (count: number): string =>
  count === 0 ? 'Nothing from the rack.' : count === 1 ? 'One piece from the rack.' : `${count} pieces from the rack.`;

function Figure({ title, children }: { readonly title: string; readonly children: React.ReactNode }) {
  return (
    <View style={styles.figure}>
      <Text kind="small">{title}</Text>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  card: { gap: space.m },
  figures: { flexDirection: 'row', flexWrap: 'wrap', gap: space.l },
  figure: { gap: 2, minWidth: 76 },
});
