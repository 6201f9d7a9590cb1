import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { FORMULAS } from '@/geometry/findings/formulas';
import { WHERE_FROM } from '@/geometry/findings/where-from';
import { countByStanding } from '@/geometry/wood/where-from';
import type { Standing } from '@/geometry/wood/sourced';
import { Button } from '../ui/Button';
import { Field } from '../ui/Field';
import { Chips } from '../ui/Segmented';
import { EmptyState } from '../ui/StateCard';
import { Table, type Column } from '../ui/Table';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { useWorkPart } from './work-part';

interface Line {
  readonly name: string;
  readonly figure: string;
  readonly standing: Standing;
  readonly source: string;
}

/** A value as the tables print it: no more digits than it has. */
const figureOf = (value: number, unit: string): string =>
  `${Math.abs(value) >= 1000 ? Math.round(value).toLocaleString('en-US') : Number(value.toPrecision(4))}${unit ? ` ${unit}` : ''}`;

const LINES: readonly Line[] = [
  ...FORMULAS.map(({ name, text, standing, source }) => ({ name, figure: text, standing, source })),
  ...WHERE_FROM.map(({ name, value, unit, standing, source }) => ({
    name,
    figure: figureOf(value, unit),
    standing,
    source,
  })),
];
const COUNTS = countByStanding(WHERE_FROM);
const STANDINGS = Object.keys(COUNTS) as readonly Standing[];
const capital = (text: string): string => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;

const COLUMNS: readonly Column<Line>[] = [
  { key: 'name', title: 'Figure', share: 3, cell: (one) => <Text>{one.name}</Text> },
  { key: 'value', title: 'Value', share: 2, cell: (one) => <Text tabular>{one.figure}</Text> },
  { key: 'standing', title: 'Known', width: 140, cell: (one) => <Text>{capital(one.standing)}</Text> },
  { key: 'source', title: 'Source', share: 3, cell: (one) => <Text kind="second">{one.source || '-'}</Text> },
];

/** A phone has room for one column: the same under each other. */
const STACKED: readonly Column<Line>[] = [
  {
    key: 'all',
    title: 'Figure, value and source',
    cell: (one) => (
      <>
        <Text kind="label">{one.name}</Text>
        <Text tabular>{one.figure}</Text>
        <Text kind="small">{[capital(one.standing), one.source].filter(Boolean).join(': ')}</Text>
      </>
    ),
  },
];

/** Every constant and formula with how well it is known and where it is from. */
export function FromPart() {
  const { line } = useWorkPart();
  // A link to another line starts the list anew.
  return <Lines key={line} asked={line} />;
}

function Lines({ asked }: { readonly asked: string }) {
  const { showLine } = useWorkPart();
  const wide = useWide();
  const [query, setQuery] = useState(asked);
  const [standing, setStanding] = useState<Standing | 'all'>('all');
  const shown = useMemo(() => {
    const words = query.trim().toLowerCase();
    return LINES.filter(
      (one) =>
        (standing === 'all' || one.standing === standing) &&
        (words === '' || `${one.name} ${one.source}`.toLowerCase().includes(words)),
    );
  }, [query, standing]);
  return (
    <View style={styles.part}>
      <Text kind="second">
        {`${WHERE_FROM.length} constants and ${FORMULAS.length} formulas. Constants: ${STANDINGS.map((one) => `${COUNTS[one]} ${one}`).join(', ')}. Strength and movement figures are advice, not an engineer's approval.`}
      </Text>
      <Field
        label="Find a figure or a source"
        labelHidden
        placeholder="Find a figure or a source"
        kind="search"
        icon="search"
        value={query}
        onChange={setQuery}
        autoComplete="off"
      />
      <Chips
        label="How well it is known"
        options={[
          { value: 'all', label: `All ${WHERE_FROM.length + FORMULAS.length}` },
          ...STANDINGS.map((one) => ({
            value: one,
            label: `${capital(one)} ${LINES.filter((l) => l.standing === one).length}`,
          })),
        ]}
        value={standing}
        onChange={setStanding}
      />
      {shown.length === 0 ? (
        <EmptyState
          icon="search"
          title="No line says that"
          body="Look for another word, or show all."
          actions={
            <Button label="Show all" onPress={() => (asked ? showLine('') : (setQuery(''), setStanding('all')))} />
          }
        />
      ) : (
        <Table
          label="Where every figure is from"
          rows={shown}
          rowKey={(one) => one.name}
          rowLabel={(one) => `${one.name}, ${one.figure}, ${one.standing}`}
          selected={asked || null}
          minWidth={wide ? 760 : 0}
          columns={wide ? COLUMNS : STACKED}
        />
      )}
    </View>
  );
}

const styles = StyleSheet.create({ part: { gap: space.m } });
