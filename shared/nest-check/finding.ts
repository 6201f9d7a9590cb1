export type NestFindingCode =
  | 'unknown_stock'
  | 'too_many_slabs'
  | 'unknown_part'
  | 'part_missing'
  | 'part_twice'
  | 'no_option_cut'
  | 'two_options_cut'
  | 'option_incomplete'
  | 'choices_misreported'
  | 'turn_forbidden'
  | 'turn_over_forbidden'
  | 'outside_slab'
  | 'in_trim'
  | 'on_defect'
  | 'parts_overlap'
  | 'kerf_missing'
  | 'group_split'
  | 'group_turned_over'
  | 'group_mixed_turns'
  | 'group_out_of_order'
  | 'group_edge_not_level'
  | 'group_not_neighbours'
  | 'cut_numbering'
  | 'cut_wrong_width'
  | 'cut_wrong_angle'
  | 'cut_misses_wood'
  | 'cut_too_short'
  | 'cut_through_part'
  | 'crosscut_after_rip'
  | 'cut_names_wrong_piece'
  | 'cut_shared_wrong'
  | 'part_not_freed'
  | 'parts_not_parted'
  | 'offcut_not_there'
  | 'offcut_keep_wrong'
  | 'cost_wrong'
  | 'bound_above_cost'
  | 'gap_wrong'
  | 'proved_wrong'
  | 'bound_not_confirmed';

/** Something wrong with a plan, named so that a person can look at the place. */
export interface NestFinding {
  readonly code: NestFindingCode;
  readonly text: string;
  /** Index into the plan's slabs. */
  readonly slab?: number;
}

/** Inches within which the checker takes two places for one: ten times the search's own tolerance, an eighth of a kerf's hundredth. */
export const CHECK_TOLERANCE = 1e-3;
