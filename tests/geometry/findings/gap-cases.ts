import type { Layout } from '@/geometry/core/layout';
import { run } from '@/tests/helpers/tops-builder';
import type { RuleCases } from './case';
import { base, kitchen, sink, STEADY } from './kitchen';

/** Default year: 25 in of mixed maple swells 0.2184 in and shrinks 0.2014 in. */
export const YEAR: Layout['climate'] = {
  make: { tempF: 68, rh: 45 },
  summer: { tempF: 75, rh: 65 },
  winter: { tempF: 68, rh: 25 },
  heated: true,
};

const gap = (backGap: number, backsplash = 0.5, climate = YEAR) =>
  kitchen({ layout: { runs: [run('1', 'A', { backGap })], climate, fixing: { rail: 1.5, backsplash } } });

const bowed = (off: number, backsplash = 0.5, over: Partial<Layout> = {}) =>
  kitchen({
    layout: {
      ...over,
      runs: [run('1', 'A', { backGap: 0.25 })],
      climate: STEADY,
      fixing: { rail: 1.5, backsplash },
      room: {
        closed: false,
        tapeSd: { fixed: 1 / 32, perInch: 0 },
        walls: [
          {
            id: 'A',
            length: [],
            profile: [
              { at: 0, off: 0 },
              { at: 45, off },
              { at: 90, off: 0 },
            ],
          },
        ],
        corners: [],
        ties: [],
        trust: [],
        ignore: [],
        sketch: [],
      },
    },
  });

const leaning = (outOfPlumb: number) => {
  const context = bowed(0);
  const walls = context.layout.room.walls.map((wall) => ({ ...wall, outOfPlumb }));
  return { ...context, layout: { ...context.layout, room: { ...context.layout.room, walls } } };
};

export const GAP_CASES: RuleCases = {
  'gap-under-swelling': {
    severity: 'stop',
    raises: () => gap(0.2),
    spares: () => gap(0.22),
    says: ['wall A (P)', '3/16 in', '7/32 in'],
    other: () => gap(0.125),
  },
  'gap-not-covered': {
    severity: 'warn',
    raises: () => bowed(0.3125),
    spares: () => bowed(0.25),
    says: ['9/16 in', '45 in along', 'covers 1/2 in'],
    other: () => bowed(0.5),
  },
  'gap-opens-in-winter': {
    severity: 'warn',
    raises: () => gap(0.3),
    spares: () => gap(0.298),
    says: ['3/16 in', '0.501 in', 'covers 1/2 in'],
    other: () => gap(0.45),
  },
  // Back gap 1/4, backsplash 1/2: a hollow of 1 in takes the top 3/4 back, to 1/2 past cabinets 24 deep.
  'scribe-front-short': {
    severity: 'warn',
    raises: () => bowed(1.0625, 0.5, { bases: [base()] }),
    spares: () => bowed(1, 0.5, { bases: [base()] }),
    says: ['wall A (P)', '13/16 in', '7/16 in past', '1/2 in is the least'],
    other: () => bowed(1.25, 0.5, { bases: [base()] }),
  },
  // A hollow of 5/16 takes the top 1/16 back; at 3 in along, the side of the sink, 1/48 of that is gap already.
  'scribe-strip-narrow': {
    severity: 'warn',
    raises: () => bowed(0.3125, 0.5, { cutouts: [sink({ centre: 18 })] }),
    spares: () => bowed(0.25, 0.5, { cutouts: [sink({ centre: 18 })] }),
    says: ['1 15/16 in behind', '1/32 in is scribed', '2 in is the least'],
    other: () => bowed(0.5, 0.5, { cutouts: [sink({ centre: 18 })] }),
  },
  'wall-out-of-plumb': {
    severity: 'warn',
    // 4 in of backsplash: 3/8 in a foot leaves 1/8 in.
    raises: () => leaning(0.4),
    spares: () => leaning(0.375),
    says: ['away from the room', '4 in', '9/64 in', '1/8 in'],
    other: () => leaning(-0.75),
  },
};
