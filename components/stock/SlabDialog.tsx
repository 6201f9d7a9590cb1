import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { SPECIES } from '@/geometry/wood/species';
import type { StockSlab } from '@/shared/contracts/stock';
import { ApiError } from '../api/api-problem';
import { useCreateStock, useDeleteStock, useUpdateStock } from '../api/use-stock';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Field } from '../ui/Field';
import { Segmented } from '../ui/Segmented';
import { Select } from '../ui/Select';
import { Text } from '../ui/Text';
import { useToast } from '../ui/ToastProvider';
import { space } from '../ui/tokens';
import { readSlab, slabTexts, type SlabField, type SlabTexts } from './read-slab';
import { named } from './stock-words';

export interface SlabDialogProps {
  /** The slab to change; null for a new one. */
  readonly slab: StockSlab | null;
  /** A new slab begins with this wood. */
  readonly species: string;
  readonly metric: boolean;
  readonly onClose: () => void;
}

const HINTS: Partial<Record<SlabField, string>> = {
  code: 'What plans and sheets call it, such as M96.',
  count: 'Empty: as many as wanted.',
  'measured depth': "Where the maker's depth is off.",
  crook: 'Bow of the edge over the whole length.',
  straightening: 'Taken off the depth to straighten an edge; plans use what is left.',
  trim: 'Cut off at each factory end. Empty: as the job says.',
};

const LABELS: Readonly<Record<SlabField, string>> = {
  code: 'Name',
  species: 'Wood',
  thickness: 'Thickness',
  length: 'Length, along the grain',
  depth: 'Depth',
  price: 'Price each',
  count: 'In the shop',
  faces: 'Faces',
  batch: 'Batch',
  supplier: 'Supplier',
  'measured depth': 'Depth as measured',
  crook: 'Crook',
  straightening: 'Straightening takes',
  trim: 'Trim at each end',
};

const START: SlabTexts = { faces: 'both' };

/** A slab that can be bought: everything plans need to know of it, typed as on a tape. */
export function SlabDialog({ slab, species, metric, onClose }: SlabDialogProps) {
  const [texts, setTexts] = useState<SlabTexts>(() => (slab ? slabTexts(slab, metric) : { ...START, species }));
  const [errors, setErrors] = useState<Partial<Record<SlabField, string>>>({});
  const [key] = useState(() => crypto.randomUUID());
  const create = useCreateStock();
  const update = useUpdateStock();
  const remove = useDeleteStock();
  const toast = useToast();
  const set = (field: SlabField) => (text: string) => {
    setTexts((now) => ({ ...now, [field]: text }));
    setErrors(({ [field]: _, ...rest }) => rest);
  };
  const save = () => {
    const read = readSlab(texts, metric);
    if (!read.ok) return setErrors(read.errors);
    const done = {
      onSuccess: () => {
        toast({ text: `${read.slab.code} is stored` });
        onClose();
      },
      onError: (error: Error) => {
        const taken =
          error instanceof ApiError && error.problem.kind === 'problem' && error.problem.code === 'code_taken';
        setErrors(taken ? { code: error.message } : {});
      },
    };
    if (slab) update.mutate({ slabId: slab.id, ...read.slab }, done);
    else create.mutate({ ...read.slab, key }, done);
  };
  const field = (name: SlabField) => (
    <View key={name} style={styles.field}>
      <Field
        label={LABELS[name]}
        hint={HINTS[name]}
        error={errors[name]}
        value={texts[name] ?? ''}
        autoComplete="off"
        maxLength={name === 'supplier' ? 200 : 80}
        onChange={set(name)}
        onSubmit={save}
      />
    </View>
  );
  const woods = [...new Set([...SPECIES.map((one) => one.key), ...(texts.species ? [texts.species] : [])])];
  const failed = (create.error ?? update.error ?? remove.error) as Error | null;
  return (
    <Dialog
      open
      title={slab ? `Slab ${slab.code}` : 'New slab'}
      onClose={onClose}
      actions={
        <>
          {slab && (
            <Button
              label="Take it out"
              icon="bin"
              look="danger"
              busy={remove.isPending}
              onPress={() =>
                remove.mutate(slab.id, {
                  onSuccess: () => {
                    toast({
                      text: `${slab.code} is out of the stock`,
                      action: {
                        label: 'Undo',
                        onPress: () => {
                          const again = readSlab(slabTexts(slab, metric), metric);
                          if (again.ok) create.mutate({ ...again.slab, key: crypto.randomUUID() });
                        },
                      },
                    });
                    onClose();
                  },
                })
              }
            />
          )}
          <Button label="Save" look="primary" busy={create.isPending || update.isPending} onPress={save} />
        </>
      }
    >
      <View style={styles.fields}>
        {field('code')}
        <View style={styles.field}>
          <Select
            label={LABELS.species}
            options={woods.map((wood) => ({ value: wood, label: named(wood) }))}
            value={texts.species ?? null}
            error={errors.species}
            onChange={set('species')}
          />
        </View>
        {(['thickness', 'length', 'depth', 'price', 'count'] as const).map(field)}
        <View style={styles.field}>
          <Segmented
            label="Good faces"
            options={[
              { value: 'both', label: 'Both' },
              { value: 'one', label: 'One' },
            ]}
            value={texts.faces === 'one' ? 'one' : 'both'}
            onChange={set('faces')}
          />
        </View>
        {(['batch', 'supplier', 'measured depth', 'crook', 'straightening', 'trim'] as const).map(field)}
      </View>
      {failed && !errors.code && (
        <Text kind="strong" tone="red">
          {failed.message}
        </Text>
      )}
    </Dialog>
  );
}

const styles = StyleSheet.create({
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.m },
  field: { flexGrow: 1, flexBasis: 220 },
});
