/** Short names of the documents that several tables come from. */
export const HANDBOOK = 'Wood Handbook (USDA FPL-GTR-190, GTR-282)';
export const TABLE_5_3B = `${HANDBOOK} Table 5-3b`;
export const MEMORY = 'C = S / (3000 - 20 S) with';
export const LIFTING = 'NIOSH lifting equation (DHHS 94-110)';
export const TEAM_LIFT = 'HSE L23, paragraphs 119-120';
