import { useRef, useState, type ChangeEvent } from 'react';
import { StyleSheet, View } from 'react-native';

import type { StockSlab } from '@/shared/contracts/stock';
import { useImportStock, useRemoveStock } from '../api/use-stock';
import { saveText } from '../sheets/save-file';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Icon } from '../ui/Icon';
import { Text } from '../ui/Text';
import { useToast } from '../ui/ToastProvider';
import { color, space } from '../ui/tokens';
import { sizeWords } from './stock-words';
import { readStockCsv, writeStockCsv, type CsvReading } from './stock-csv';

export interface ImportDialogProps {
  readonly slabs: readonly StockSlab[];
  readonly metric: boolean;
  readonly onClose: () => void;
}

/** Slabs from a CSV file: shown before anything is stored, line by line, and taken back in one press. */
export function ImportDialog({ slabs, metric, onClose }: ImportDialogProps) {
  const input = useRef<HTMLInputElement>(null);
  const [reading, setReading] = useState<(CsvReading & { readonly name: string }) | null>(null);
  const [key, setKey] = useState(() => crypto.randomUUID());
  const store = useImportStock();
  const remove = useRemoveStock();
  const toast = useToast();
  const good = reading?.rows.flatMap((row) => row.slab ?? []) ?? [];
  const read = async (event: ChangeEvent<HTMLInputElement>) => {
    const file = event.target.files?.[0];
    event.target.value = '';
    if (!file) return;
    setKey(crypto.randomUUID());
    const codes = new Set(slabs.map((slab) => slab.code));
    setReading({ name: file.name, ...readStockCsv(await file.text(), metric, codes) });
  };
  const take = () =>
    store.mutate(
      { key, slabs: good },
      {
        onSuccess: ({ added, refused }) => {
          const ids = added.map((slab) => slab.id);
          toast({
            text: `${added.length} slabs are in the stock${refused.length > 0 ? `; ${refused.map((one) => one.message).join(' ')}` : ''}`,
            ...(ids.length > 0 && { action: { label: 'Undo', onPress: () => remove.mutate(ids) } }),
          });
          onClose();
        },
      },
    );
  return (
    <Dialog
      open
      title="Slabs from a file"
      onClose={onClose}
      actions={
        <>
          <Button label={reading ? 'Another file' : 'Choose a CSV file'} onPress={() => input.current?.click()} />
          {good.length > 0 && (
            <Button
              label={`Take ${good.length} ${good.length === 1 ? 'slab' : 'slabs'}`}
              look="primary"
              busy={store.isPending}
              onPress={take}
            />
          )}
        </>
      }
    >
      <input
        ref={input}
        type="file"
        accept=".csv,text/csv"
        aria-label="CSV file of slabs"
        style={{ display: 'none' }}
        onChange={(event) => void read(event)}
      />
      {!reading && (
        <View style={styles.words}>
          <Text>
            The first line names the columns: code, species, thickness, length, depth, price, and where you have them
            count, faces, batch, supplier, measured depth, crook, straightening, trim.
          </Text>
          <Button
            label="The stock as such a file"
            icon="download"
            onPress={() => saveText('stock.csv', writeStockCsv(slabs, metric), 'text/csv')}
          />
        </View>
      )}
      {reading && <Preview reading={reading} metric={metric} />}
      {store.error && (
        <Text kind="strong" tone="red">
          {`Nothing was stored. ${store.error.message}`}
        </Text>
      )}
    </Dialog>
  );
}

function Preview({
  reading,
  metric,
}: {
  readonly reading: CsvReading & { readonly name: string };
  readonly metric: boolean;
}) {
  const bad = reading.rows.filter((row) => row.errors.length > 0).length;
  if (reading.problem)
    return (
      <Text kind="strong" tone="red">
        {`${reading.name}: ${reading.problem}`}
      </Text>
    );
  return (
    <View style={styles.words}>
      <Text kind="strong">
        {`${reading.name}: ${reading.rows.length - bad} can be taken${bad > 0 ? `, ${bad} cannot` : ''}. Nothing is stored yet.`}
      </Text>
      {reading.ignored.length > 0 && (
        <Text kind="second">{`Left out: the columns ${reading.ignored.join(', ')}.`}</Text>
      )}
      <View role="list" aria-label="Lines of the file">
        {reading.rows.map((row) => (
          <View key={row.line} role="listitem" style={styles.row}>
            <Icon name={row.slab ? 'check' : 'warn'} size={20} tone={row.slab ? 'chalk' : 'red'} />
            <View style={styles.grow}>
              <Text>
                {row.slab
                  ? `Line ${row.line}, ${row.code}: ${row.slab.species}, ${sizeWords(row.slab, metric)}`
                  : `Line ${row.line}, ${row.code}`}
              </Text>
              {row.errors.map((error) => (
                <Text key={error} kind="second" tone="red">
                  {error}
                </Text>
              ))}
            </View>
          </View>
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  words: { gap: space.m },
  row: {
    flexDirection: 'row',
    gap: space.s,
    paddingVertical: space.s,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
  grow: { flex: 1, minWidth: 0 },
});
