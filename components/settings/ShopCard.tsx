import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Shop } from '@/shared/contracts/shop';
import { Card } from '../ui/Card';
import { Field } from '../ui/Field';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { TypedField } from '../ui/TypedField';
import type { ShopChange } from './use-shop-change';

export interface ShopCardProps {
  readonly shop: Shop;
  readonly disabled: boolean;
  readonly onChange: (now: ShopChange, before: ShopChange, words: string) => void;
}

const STEPS = {
  in: [
    { value: '1/16', label: '1/16 in' },
    { value: '1/32', label: '1/32 in' },
  ],
  mm: [
    { value: '1 mm', label: '1 mm' },
    { value: '0.5 mm', label: '0.5 mm' },
  ],
} as const;

/** Name, money, units, and what stands at the head of sheets and letters. */
export function ShopCard({ shop, disabled, onChange }: ShopCardProps) {
  const line = (label: string, max: number, value: string, needed: boolean, store: (text: string) => ShopChange) => (
    <TypedField
      label={label}
      value={value}
      write={(text) => text}
      read={(text) => (needed && text.trim() === '' ? { ok: false, message: 'Something has to be typed here.' } : { ok: true, value: text.trim() })} // prettier-ignore
      maxLength={max}
      disabled={disabled}
      onValue={(text) => onChange(store(text), store(value), label)}
    />
  );
  const head = (change: Partial<Shop['letterhead']>): ShopChange => ({ letterhead: { ...shop.letterhead, ...change } });
  return (
    <Card>
      <View style={styles.card}>
        <Text kind="rowTitle" level={2}>
          The shop
        </Text>
        {line('Name of the shop', 120, shop.name, true, (name) => ({ name }))}
        <TypedField
          label="Currency"
          hint="Three letters, such as USD"
          value={shop.currency}
          write={(text) => text}
          read={(text) =>
            /^[A-Za-z]{3}$/.test(text.trim())
              ? { ok: true, value: text.trim().toUpperCase() }
              : { ok: false, message: 'Three letters, such as USD.' }
          }
          maxLength={3}
          disabled={disabled}
          onValue={(currency) => onChange({ currency }, { currency: shop.currency }, 'Currency')}
        />
        <Segmented
          label="New jobs are measured in"
          options={[
            { value: 'in', label: 'Inches' },
            { value: 'mm', label: 'Millimeters' },
          ]}
          value={shop.units}
          disabled={disabled}
          onChange={(units) =>
            onChange(
              { units, step: STEPS[units][0].value },
              { units: shop.units, step: shop.step },
              units === 'in' ? 'Inches' : 'Millimeters',
            )
          }
        />
        <Segmented
          label="and cut to"
          options={STEPS[shop.units]}
          value={shop.step}
          disabled={disabled}
          onChange={(step) => onChange({ step }, { step: shop.step }, `Cutting to ${step}`)}
        />
        <Text kind="rowTitle" level={2}>
          Letterhead
        </Text>
        <AddressLines
          shop={shop}
          disabled={disabled}
          onLines={(lines) => onChange(head({ lines }), head({}), 'Address')}
        />
        {line('Telephone', 40, shop.letterhead.phone ?? '', false, (phone) => head({ phone }))}
        {line('E-mail', 254, shop.letterhead.email ?? '', false, (email) => head({ email }))}
      </View>
    </Card>
  );
}

function AddressLines(props: {
  readonly shop: Shop;
  readonly disabled: boolean;
  readonly onLines: (lines: string[]) => void;
}) {
  const stored = (props.shop.letterhead.lines ?? []).join('\n');
  const [text, setText] = useState<string | null>(null);
  const lines = (text ?? '').split('\n').map((line) => line.trim()).filter(Boolean); // prettier-ignore
  const error = lines.length > 6 ? 'Six lines fit on a sheet; take some away.' : undefined;
  return (
    <Field
      label="Address, up to six lines"
      value={text ?? stored}
      rowCount={3}
      error={error}
      disabled={props.disabled}
      onChange={setText}
      onBlur={() => {
        if (text === null || error) return;
        setText(null);
        if (lines.join('\n') !== stored) props.onLines(lines);
      }}
    />
  );
}

const styles = StyleSheet.create({ card: { gap: space.m } });
