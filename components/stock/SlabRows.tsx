import { StyleSheet, View } from 'react-native';

import type { StockSlab } from '@/shared/contracts/stock';
import { WoodSwatch } from '../canvas/WoodSwatch';
import { Fraction } from '../measure/Fraction';
import { money } from '../slabs/slab-words';
import { Press } from '../ui/Press';
import { Table, type Column } from '../ui/Table';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { countWords, facesWords, named, sizeWords, usableDepth } from './stock-words';

export interface SlabRowsProps {
  readonly species: string;
  readonly slabs: readonly StockSlab[];
  readonly metric: boolean;
  readonly currency: string;
  /** Left out where nothing can be changed. */
  readonly onOpen?: (slab: StockSlab) => void;
}

/** The slabs of one wood: a table on wide screens, cards on a phone. */
export function SlabRows({ species, slabs, metric, currency, onOpen }: SlabRowsProps) {
  const wide = useWide();
  return (
    <View style={styles.wood}>
      <View style={styles.head}>
        <View style={styles.swatch} aria-hidden>
          <WoodSwatch species={species} />
        </View>
        <Text kind="rowTitle" level={2}>
          {named(species)}
        </Text>
      </View>
      {wide ? (
        <Table
          label={`${named(species)} slabs`}
          columns={columnsOf(metric, currency)}
          rows={slabs}
          rowKey={(slab) => slab.id}
          rowLabel={(slab) => spoken(slab, metric, currency)}
          onOpen={onOpen}
        />
      ) : (
        <View role="list" aria-label={`${named(species)} slabs`} style={styles.cards}>
          {slabs.map((slab) => (
            <View key={slab.id} role="listitem">
              <Press
                style={styles.card}
                disabled={!onOpen}
                aria-label={spoken(slab, metric, currency)}
                onPress={() => onOpen?.(slab)}
              >
                <View style={styles.grow}>
                  <Text kind="rowTitle" hidden>
                    {slab.code}
                  </Text>
                  <Text kind="second" hidden>
                    {`${sizeWords(slab, metric)}, ${facesWords(slab.faces).toLowerCase()}, ${countWords(slab.count)}`}
                  </Text>
                </View>
                {slab.priceCents !== null && (
                  <Text kind="strong" hidden>
                    {money(slab.priceCents, currency)}
                  </Text>
                )}
              </Press>
            </View>
          ))}
        </View>
      )}
    </View>
  );
}

function columnsOf(metric: boolean, currency: string): readonly Column<StockSlab>[] {
  const step = metric ? '0.5 mm' : '1/16';
  const size = (inches: number) => <Fraction inches={inches} step={step} />;
  return [
    { key: 'code', title: 'Name', share: 1.2, cell: (slab) => <Text kind="strong">{slab.code}</Text> },
    { key: 'depth', title: 'Depth', cell: (slab) => size(slab.depth) },
    { key: 'length', title: 'Length', cell: (slab) => size(slab.length) },
    { key: 'thickness', title: 'Thick', cell: (slab) => size(slab.thickness) },
    {
      key: 'usable',
      title: 'Usable depth',
      cell: (slab) => (usableDepth(slab) === slab.depth ? <Text tone="ink2">all</Text> : size(usableDepth(slab))),
    },
    { key: 'faces', title: 'Faces', cell: (slab) => <Text>{facesWords(slab.faces)}</Text> },
    { key: 'batch', title: 'Batch', cell: (slab) => <Text>{slab.batch || '-'}</Text> },
    { key: 'price', title: 'Price each', cell: (slab) => <Text>{slab.priceCents === null ? '-' : money(slab.priceCents, currency)}</Text> }, // prettier-ignore
    { key: 'count', title: 'In the shop', cell: (slab) => <Text>{countWords(slab.count)}</Text> },
    { key: 'supplier', title: 'Supplier', share: 1.4, cell: (slab) => <Text lines={1}>{slab.supplier || '-'}</Text> },
  ];
}

const spoken = (slab: StockSlab, metric: boolean, currency: string): string =>
  [
    slab.code,
    sizeWords(slab, metric),
    facesWords(slab.faces),
    countWords(slab.count),
    ...(slab.priceCents === null ? [] : [money(slab.priceCents, currency)]),
  ].join(', ');

const styles = StyleSheet.create({
  wood: { gap: space.s },
  head: { flexDirection: 'row', alignItems: 'center', gap: space.m },
  swatch: { borderWidth: 1, borderColor: color.ink },
  cards: { gap: space.s },
  card: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 64,
    padding: space.m,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
    backgroundColor: color.card,
  },
  grow: { flex: 1, minWidth: 0 },
});
