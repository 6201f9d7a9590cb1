import type { PadKey, PadUnit } from './pad-state';

/** What a key of a real keyboard means while the pad is open; null when it means nothing here. */
export function padKeyOf(key: string, unit: PadUnit): PadKey | 'next' | 'cancel' | null {
  if (/^\d$/.test(key)) return { kind: 'digit', digit: key };
  const plain = PLAIN[key];
  if (plain) return plain;
  if (key === 'm' || key === 'M') return unit === 'mm' ? null : { kind: 'unit', to: 'mm' };
  if (key === 'i' || key === 'I') return unit === 'in' ? null : { kind: 'unit', to: 'in' };
  return null;
}

const PLAIN: Readonly<Record<string, PadKey | 'next' | 'cancel'>> = {
  ' ': { kind: 'space' },
  '/': { kind: 'slash' },
  "'": { kind: 'ft' },
  f: { kind: 'ft' },
  F: { kind: 'ft' },
  '.': { kind: 'point' },
  // The decimal key of many number blocks.
  ',': { kind: 'point' },
  '+': { kind: 'nudge', to: 'heavy' },
  '-': { kind: 'nudge', to: 'light' },
  Backspace: { kind: 'back' },
  Enter: 'next',
  Escape: 'cancel',
};
