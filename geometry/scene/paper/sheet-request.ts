import type { Layout } from '../../core/layout';
import type { ShopSettings } from '../../core/settings';
import type { Plan } from '../../plan/types';
import type { Scene } from '../display-list';
import type { LabelChoice } from '../labels/label-grids';
import type { SheetNumbering } from './number-pages';
import type { Paper, SheetHead } from './sheet-head';

/** All that a sheet is drawn from. */
export interface SheetRequest {
  readonly plan: Plan;
  readonly layout: Layout;
  readonly settings: ShopSettings;
  readonly head: SheetHead;
  readonly paper: Paper;
  /** Whoever reads it may see what things cost. */
  readonly prices?: boolean;
  /** How labels are printed; the paper's usual grid when left out. */
  readonly labels?: LabelChoice;
  /** Where these sheets stand in a larger set. */
  readonly numbering?: SheetNumbering;
}

/** The pages of one kind of sheet; none where the job has nothing for it. */
export type SheetPages = (request: SheetRequest) => readonly Scene[];
