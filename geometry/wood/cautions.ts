import { LIFT_CAUTION } from './hands';

/** Short cautions for sheets and screens, each with its source. */
export const CAUTIONS = {
  saw: {
    text: 'Guard down, riving knife in, no gloves at the blade. Unplug before touching it.',
    source: '29 CFR 1910.213 and 1910.243, from memory',
  },
  dust: {
    text: 'Wood dust causes cancer; oak and beech are the worst studied. Extract at the tool and wear a mask.',
    source: 'IARC Monographs 62 and 100C; NIOSH limit 1 mg/m3',
  },
  lifting: { text: `Lift with the hands the sheet calls for. ${LIFT_CAUTION}`, source: 'NIOSH 94-110, p. 6; HSE L23' },
  rags: {
    text: 'Oily rags catch fire by themselves. Spread them flat outdoors to dry, or keep them under water in a tight metal can.',
    source: '29 CFR 1926.252(e); NFPA advice, second hand',
  },
  trades: {
    text: 'Gas, water and electricity are for licensed trades. Local codes come first.',
    source: 'common practice',
  },
  cooktop: {
    text: "Cutout size and clearances by the maker's instructions; they come before any figure here.",
    source: 'IRC M1504.1, second hand',
  },
  strength: {
    text: "Strength and movement figures are advice, not an engineer's approval.",
    source: 'our choice',
  },
} as const;
