import type { ClimateYear } from '../core/layout';
import type { Standing } from './sourced';

/** A year's indoor air that can be picked instead of typed. */
export interface ClimatePreset {
  readonly key: string;
  readonly name: string;
  readonly summer: ClimateYear['summer'];
  readonly winter: ClimateYear['winter'];
  readonly heated: boolean;
  readonly standing: Standing;
}

/** Round indoor figures to start from; a hygrometer left in the kitchen for a week beats all of them. */
export const CLIMATE_PRESETS: readonly ClimatePreset[] = [
  preset('inland', 'Heated house, cold winters', [75, 60], [68, 25], true),
  preset('coast', 'Heated house by the sea', [72, 65], [68, 45], true),
  preset('mild', 'Heated house, mild winters', [76, 55], [68, 40], true),
  preset('desert', 'Dry country', [78, 25], [68, 25], true),
  preset('damp', 'Hot damp summers, windows open', [80, 75], [70, 50], true),
  preset('steady', 'Air conditioned the year round', [74, 50], [70, 35], true),
  preset('unheated', 'House left unheated in winter', [72, 65], [40, 80], false),
];

function preset(
  key: string,
  name: string,
  summer: readonly [number, number],
  winter: readonly [number, number],
  heated: boolean,
): ClimatePreset {
  return {
    key,
    name,
    summer: { tempF: summer[0], rh: summer[1] },
    winter: { tempF: winter[0], rh: winter[1] },
    heated,
    standing: 'our choice',
  };
}

/** Air of a shop kept at the usual figures for making. */
export const USUAL_SHOP: ClimateYear['make'] = { tempF: 68, rh: 45 };
