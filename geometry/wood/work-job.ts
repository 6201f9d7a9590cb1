import type { Layout } from '../core/layout';
import type { ShopSettings } from '../core/settings';
import { formatLength } from '../tape/format-length';
import type { PlacedCutout, Tops } from '../top/types';
import { sealedArea } from './quantities';
import type { Step } from './types';

/** What the order of work is made from. */
export interface WorkInput {
  readonly layout: Pick<Layout, 'material' | 'finish' | 'edges' | 'bases' | 'climate' | 'fixing' | 'step'>;
  readonly settings: ShopSettings;
  readonly tops: Tops;
}

/** The same with everything the steps ask for more than once. */
export interface Job extends WorkInput {
  readonly letters: readonly string[];
  /** A length in the layout's step with its unit. */
  readonly size: (inches: number) => string;
  readonly shopJoints: Tops['joints'];
  readonly siteJoints: Tops['joints'];
  /** Openings a seam runs through are cut after it has cured; the others in the shop. */
  readonly cutLater: readonly PlacedCutout[];
  readonly cutNow: readonly PlacedCutout[];
  /** Square feet of all faces and edges. */
  readonly sqFt: number;
}

/** A step before it is known what it follows. */
export type Draft = Omit<Step, 'after' | 'waitHours' | 'tools' | 'consumables'> &
  Partial<Pick<Step, 'waitHours' | 'tools' | 'consumables'>>;

/** Drafts that need not wait for each other, unless they share a piece. */
export type Stage = readonly Draft[];

export function jobOf(input: WorkInput): Job {
  const { tops, layout } = input;
  const later = new Set(tops.seams.flatMap((seam) => (seam.inCutout ? [seam.inCutout] : [])));
  return {
    ...input,
    letters: tops.pieces.map((p) => p.letter),
    size: (inches) => withUnit(formatLength(inches, layout.step)),
    shopJoints: tops.joints.filter((j) => j.assembled === 'shop'),
    siteJoints: tops.joints.filter((j) => j.assembled === 'site'),
    cutLater: tops.cutouts.filter((c) => later.has(c.id)),
    cutNow: tops.cutouts.filter((c) => !later.has(c.id)),
    sqFt: tops.pieces.reduce((sum, p) => sum + sealedArea(p), 0) / 144,
  };
}

const withUnit = (length: string): string => (length.endsWith('mm') ? length : `${length} in`);
