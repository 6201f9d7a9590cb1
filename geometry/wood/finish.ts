import type { Finish } from '../core/layout';
import type { FinishSetting, ShopSettings } from '../core/settings';
import type { Standing } from './sourced';

export type FinishKind = Finish['kind'];

/** One line of what is known of a finish, with where it is from. */
export interface FinishFact {
  readonly text: string;
  readonly standing: Standing;
  readonly source: string;
}

/** A finish as the shop offers it. */
export interface FinishChoice {
  readonly kind: FinishKind;
  readonly name: string;
  readonly foodContact: FinishFact;
  readonly upkeep: FinishFact;
  readonly repair: FinishFact;
  /** How far it keeps air's moisture out of the wood. */
  readonly moisture: FinishFact;
  /** A board is cut on straight on the top: does it stand up to that. */
  readonly foodPrep: boolean;
  /** Rags soaked in it heat up by themselves. */
  readonly oilyRags: boolean;
}

const FOOD_RULE = '21 CFR 175.300';
const MOISTURE_TABLE = 'FPL-RP-462 (Feist, Little, Wennesheimer 1985), three coats, 14 days at 90 % humidity';

const practice = (text: string): FinishFact => ({ text, standing: 'common practice', source: '' });
const excludes = (text: string): FinishFact => ({ text, standing: 'second hand', source: MOISTURE_TABLE });
const foodFact = (text: string): FinishFact => ({ text, standing: 'published', source: FOOD_RULE });

/** The finishes a layout can name, in the order they are offered. */
export const FINISHES: Readonly<Record<FinishKind, FinishChoice>> = {
  oil: {
    kind: 'oil',
    name: 'Oil',
    foodContact: foodFact(
      "Drying oils such as tung and linseed are among the listed materials; safe for food once cured, by the maker's word for driers and thinners.",
    ),
    upkeep: practice('A thin coat whenever water stops beading: often in the first weeks, then about twice a year.'),
    repair: practice('Sand the spot along the grain and oil it again; it blends in.'),
    moisture: excludes("Keeps out next to none of the air's moisture: tung oil 2 %, linseed oil 0 %."),
    foodPrep: true,
    oilyRags: true,
  },
  'hard wax': {
    kind: 'hard wax',
    name: 'Hard wax oil',
    foodContact: foodFact(
      'Oils and waxes cured in the wood; take one whose maker states it for food contact once cured.',
    ),
    upkeep: practice('Wash with a mild soap; freshen worn places about once a year.'),
    repair: practice('Clean, sand the spot lightly and rub in a thin coat; it blends in well.'),
    moisture: {
      text: 'No published figure was found; reckon with little more than oil.',
      standing: 'our choice',
      source: '',
    },
    foodPrep: true,
    oilyRags: true,
  },
  film: {
    kind: 'film',
    name: 'Film finish (varnish, lacquer)',
    foodContact: foodFact(
      'A cured film of listed materials that bars the wood off may touch food; a film that is cut through does not.',
    ),
    upkeep: practice('Little until it wears; no knives, no grit, no standing water at edges and seams.'),
    repair: practice('A scratch shows: sand the whole surface to the next edge and coat it again.'),
    moisture: excludes("Slows the air's moisture: two-part polyurethane 66 %, spar varnish 30 %, lacquer 10 %."),
    foodPrep: false,
    oilyRags: true,
  },
  none: {
    kind: 'none',
    name: 'None',
    foodContact: foodFact('Bare wood is no coating; the rule on coatings says nothing of it.'),
    upkeep: practice('Stains from the first day; scrub along the grain and dry at once.'),
    repair: practice('Sand along the grain.'),
    moisture: excludes('Keeps out nothing: unfinished wood 0 %.'),
    foodPrep: true,
    oilyRags: false,
  },
};

/** Coats, spread and times of a finish: the shop's own for its kind, else the shop's usual ones; null for bare wood. */
export function finishSetting(finish: Finish, settings: ShopSettings): FinishSetting | null {
  if (finish.kind === 'none') return null;
  const own = settings.finishes[finish.kind];
  const usual: FinishSetting = {
    coats: 3,
    sqFtPerQuart: settings.spread.finishSqFtPerQuart,
    recoatHours: settings.times.recoatHours,
    cureHours: settings.times.finishCureHours,
  };
  return { ...usual, ...own, ...(finish.coats !== undefined && { coats: finish.coats }) };
}

/** Care of a top for the people who live with it; the last line comes from the finish. */
export function careText(finish: Finish, wood: string): readonly string[] {
  const { upkeep, repair } = FINISHES[finish.kind];
  return [
    `Your top is solid ${wood}. It grows a little in damp weather and shrinks in dry weather; that is what the gaps at the wall are for.`,
    'Wipe up water at once, most of all round the sink and at the joints.',
    'Put hot pans on a trivet. Bare metal from the oven scorches wood through any finish.',
    'Keep the room between 35 and 55 % humidity if you can; very dry air in winter opens joints.',
    'Dry the underside by the dishwasher if its door is opened while steam is coming out.',
    `${upkeep.text} ${repair.text}`,
  ];
}
