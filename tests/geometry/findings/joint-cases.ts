import type { Layout } from '@/geometry/core/layout';
import type { FindingContext } from '@/geometry/findings/context';
import type { RuleCases } from './case';
import { base, cornerKitchen, kitchen, STEADY } from './kitchen';

const onSite = (access: 'open' | 'none') =>
  cornerKitchen({
    joint: { assembled: 'site' },
    layout: { bases: [base({ from: 50, kind: 'corner base', access })] },
  });

/** The corner's connectors as somebody moved them. */
const connectors = (...places: readonly number[]) => {
  const context = cornerKitchen();
  return { ...context, joints: context.joints.map((joint) => ({ ...joint, connectors: places })) };
};

/** A corner of this angle; equal depths make the pieces' points half of it. */
const sharp = (angleDeg: number) => cornerKitchen({ angles: [angleDeg] });

const short = (length: number) => {
  const context = connectors();
  return { ...context, joints: context.joints.map((joint) => ({ ...joint, length })) };
};

const screws = (rail: number, thickness = 1.5) =>
  kitchen({ layout: { fixing: { rail, backsplash: 0.5 }, material: { ...MAPLE, thickness } } });

const MAPLE: Layout['material'] = {
  species: 'hard maple',
  thickness: 1.5,
  slabDepth: 25,
  stave: 1.5,
  faces: 'both',
  grain: 'mixed',
};

/** Made at 70 F and 50 %, 9.246 % moisture; a summer of this humidity. J is 35.355 in, the coefficient 0.00259. */
export const summer = (rh: number, heated = true): Layout['climate'] => ({
  ...STEADY,
  summer: { tempF: 70, rh },
  heated,
});

const opens = (rh: number, heated = true) =>
  cornerKitchen({ joint: { assembled: 'site' }, layout: { climate: summer(rh, heated) } });

const swings = (rh: number) => cornerKitchen({ layout: { climate: summer(rh) } });

const butt = (rh: number): FindingContext =>
  cornerKitchen({ joint: { kind: 'butt', through: '1' }, layout: { climate: summer(rh) } });

export const JOINT_CASES: RuleCases = {
  'joint-no-access': {
    severity: 'stop',
    raises: () => onSite('none'),
    spares: () => onSite('open'),
    says: ['Joint P to Q', '3 drawbolts'],
  },
  'connector-comes-through': {
    severity: 'stop',
    // (s - 0.46875 - 1.1875) sin 45 = 1/4 at s = 2.0098 in.
    raises: () => connectors(2, 18),
    spares: () => connectors(2.01, 18),
    says: ['2 in from the back', '1 3/16 in deep', '0.243 in', '1/4 in'],
    other: () => connectors(1, 18),
  },
  'joint-no-connectors': {
    severity: 'warn',
    raises: () => short(12),
    spares: () => short(11.99),
    says: ['Joint P to Q', '12 in long', '12 in'],
    other: () => short(30),
  },
  'connector-near-point': {
    severity: 'note',
    raises: () => sharp(50),
    spares: () => sharp(62),
    says: ['Joint P to Q', '3 5/8 in from the back point', '3 in', '1/4 in'],
    other: () => sharp(40),
  },
  'screw-too-long': {
    severity: 'stop',
    raises: () => screws(0.25, 1),
    spares: () => screws(0.375, 1),
    says: ['1/4 in of rail', '1 in of top', '1/4 in above its point', '3/8 in'],
    other: () => screws(0.125, 1),
  },
  'screw-too-short': {
    severity: 'warn',
    raises: () => screws(2.5),
    spares: () => screws(2.375),
    says: ['2 1/2 in of rail', '3 in', 'bites 1/2 in', '5/8 in'],
    other: () => screws(2.75),
  },
  'miter-opens': {
    severity: 'note',
    // 51 % opens it 0.00259 x 0.16 x 35.36 = 0.0150 in; 53 % 0.0456 in.
    raises: () => opens(53),
    spares: () => opens(52),
    says: ['Joint P to Q', '3/64 in', '1/32 in'],
    other: () => opens(60),
  },
  'corner-swings': {
    severity: 'note',
    // The 89 3/4 in leg swings 0.0367 in at 51 % and under 1/32 in at 50.8 %.
    raises: () => swings(51),
    spares: () => swings(50.8),
    says: ['89 3/4 in leg', '1/32 in', 'The gap there is 1/4 in'],
    other: () => swings(55),
  },
  'butt-cross-grain': {
    severity: 'note',
    raises: () => butt(55),
    spares: () => butt(52.5),
    says: ['Joint P to Q', 'over 1/32 in'],
    other: () => butt(60),
  },
};
