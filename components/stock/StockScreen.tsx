import { useRouter } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import type { StockSlab } from '@/shared/contracts/stock';
import { may } from '@/shared/roles/roles';
import { ApiError } from '../api/api-problem';
import { useSession } from '../api/use-session';
import { useShop } from '../api/use-shop';
import { useStock } from '../api/use-stock';
import { Button } from '../ui/Button';
import { Chips } from '../ui/Segmented';
import { Field } from '../ui/Field';
import { PageFrame } from '../ui/PageFrame';
import { EmptyState, ErrorState, LoadingState, NoPermissionState, OfflineState } from '../ui/StateCard';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { ImportDialog } from './ImportDialog';
import { SlabDialog } from './SlabDialog';
import { SlabRows } from './SlabRows';
import { byWood, named } from './stock-words';

/** Slabs that can be bought, by wood. Owners change them; plans take them from here. */
export function StockScreen() {
  const router = useRouter();
  const wide = useWide();
  const { me } = useSession();
  const maySee = me !== null && may(me.role, 'stock.see');
  const mayEdit = me !== null && may(me.role, 'stock.edit');
  const metric = useShop().data?.units === 'mm';
  const stock = useStock(maySee);
  const [editing, setEditing] = useState<StockSlab | 'new' | null>(null);
  const [importing, setImporting] = useState(false);
  const [wood, setWood] = useState('all');
  const [search, setSearch] = useState('');
  const all = stock.data?.slabs ?? [];
  const woods = byWood(all);
  const words = search.trim().toLowerCase();
  const shown = all.filter(
    (slab) =>
      (wood === 'all' || slab.species === wood) &&
      `${slab.code} ${slab.species} ${slab.batch} ${slab.supplier}`.toLowerCase().includes(words),
  );
  const buttons = mayEdit && (
    <>
      <Button label="From a file" icon="download" onPress={() => setImporting(true)} />
      <Button label="New slab" icon="plus" look="primary" onPress={() => setEditing('new')} />
    </>
  );
  return (
    <PageFrame
      title="Stock"
      onNavigate={(href) => router.navigate(href as never)}
      actions={wide ? buttons : undefined}
      footer={!wide && buttons ? <View style={styles.foot}>{buttons}</View> : undefined}
    >
      <View style={styles.page}>
        {all.length > 0 && (
          <>
            <View style={styles.search}>
              <Field
                label="Search the stock"
                labelHidden
                kind="search"
                icon="search"
                placeholder="Name, wood, supplier"
                value={search}
                onChange={setSearch}
              />
            </View>
            <Chips
              label="Wood"
              options={[
                { value: 'all', label: `All ${all.length}` },
                ...woods.map(([species, slabs]) => ({ value: species, label: `${named(species)} ${slabs.length}` })),
              ]}
              value={wood}
              onChange={setWood}
            />
          </>
        )}
        <StockContent maySee={maySee} mayEdit={mayEdit} stock={stock} onNew={() => setEditing('new')}>
          {shown.length === 0 ? (
            <EmptyState
              icon="search"
              title="No slab fits"
              body="No slab has this wood and these words together."
              actions={
                <Button
                  label="Show all slabs"
                  onPress={() => {
                    setWood('all');
                    setSearch('');
                  }}
                />
              }
            />
          ) : (
            byWood(shown).map(([species, slabs]) => (
              <SlabRows
                key={species}
                species={species}
                slabs={slabs}
                metric={metric}
                currency={stock.data?.currency ?? 'USD'}
                onOpen={mayEdit ? setEditing : undefined}
              />
            ))
          )}
          <Text kind="small">
            {mayEdit
              ? 'Plans use the depth as measured, less what straightening takes. Jobs keep the slabs they were planned with until they are opened again.'
              : 'Only the owner changes these.'}
          </Text>
        </StockContent>
      </View>
      {editing && (
        <SlabDialog
          key={editing === 'new' ? 'new' : editing.id}
          slab={editing === 'new' ? null : editing}
          species={wood === 'all' ? 'hard maple' : wood}
          metric={metric}
          onClose={() => setEditing(null)}
        />
      )}
      {importing && <ImportDialog slabs={all} metric={metric} onClose={() => setImporting(false)} />}
    </PageFrame>
  );
}

function StockContent(props: {
  readonly maySee: boolean;
  readonly mayEdit: boolean;
  readonly stock: ReturnType<typeof useStock>;
  readonly onNew: () => void;
  readonly children: ReactNode;
}) {
  const { maySee, mayEdit, stock } = props;
  if (!maySee) return <NoPermissionState body="Owner, designer and shop hand see the stock." />;
  if (stock.data && stock.data.slabs.length > 0) return props.children;
  const again = <Button label="Try now" onPress={() => void stock.refetch()} />;
  if (stock.error)
    return stock.error instanceof ApiError && stock.error.problem.kind === 'offline' ? (
      <OfflineState body="The stock shows when the signal is back." actions={again} />
    ) : (
      <ErrorState title="The stock did not come" body={stock.error.message} actions={again} />
    );
  if (!stock.data) return <LoadingState title="Fetching the stock" />;
  return (
    <EmptyState
      icon="stock"
      title="No slabs yet"
      body={
        mayEdit
          ? 'Add the slabs you can buy: plans are made from them.'
          : 'The owner adds the slabs that can be bought.'
      }
      actions={mayEdit ? <Button label="New slab" look="primary" icon="plus" onPress={props.onNew} /> : undefined}
    />
  );
}

const styles = StyleSheet.create({
  page: { gap: space.l },
  search: { maxWidth: 420 },
  foot: { flexDirection: 'row', gap: space.m, padding: space.m },
});
