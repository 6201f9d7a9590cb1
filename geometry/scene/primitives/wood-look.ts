import type { Point } from '../../core/point';

/** How a species looks on screen. Figure strokes are inches, u along the grain, v across it. */
export interface WoodLook {
  readonly tones: readonly string[];
  readonly edge: string;
  readonly line: string;
  /** Share of the cells of a stave that carry figure. */
  readonly density: number;
  readonly figureWidth: number;
  readonly roundFigure: boolean;
  /** Black lines on it need a casing. */
  readonly dark: boolean;
  /** Strokes of one mark; `roll` in 0..1 varies it. */
  readonly figure: (roll: number) => readonly (readonly Point[])[];
}

interface Recipe {
  readonly base: string;
  readonly line: string;
  readonly density: number;
  readonly width: number;
  readonly round?: boolean;
  readonly figure: WoodLook['figure'];
}

const flecks = (roll: number): Point[][] => [[[0, 0], [1.5 + 4 * roll, 0]]]; // prettier-ignore
const waves = (roll: number): Point[][] => [
  Array.from({ length: 9 }, (_, i): Point => [i * (0.8 + roll), 0.14 * Math.sin(i * 0.9 + roll * 6)]),
];
const spots = (): Point[][] => [[[0, 0], [0.28, 0]]]; // prettier-ignore
const rays = (roll: number): Point[][] =>
  [0, 1, 2].map((i) => [[i * 0.9, 0], [i * 0.9 + 0.45, 0.16 + 0.06 * roll]]); // prettier-ignore
const dashes = (roll: number): Point[][] => [
  [[0, 0], [0.5, 0]], // prettier-ignore
  [[0.8 + 0.3 * roll, -0.18], [1.3 + 0.3 * roll, -0.18]], // prettier-ignore
];

const RECIPES: Readonly<Record<string, Recipe>> = {
  'hard maple': { base: '#EBD5AB', line: '#BC9A62', density: 0.55, width: 1, figure: flecks },
  'black walnut': { base: '#7B573E', line: '#3F2817', density: 0.5, width: 1, figure: waves },
  cherry: { base: '#C07F57', line: '#834525', density: 0.3, width: 2, round: true, figure: spots },
  'white oak': { base: '#CDAE80', line: '#8D6C3C', density: 0.5, width: 1, figure: rays },
  beech: { base: '#DDB48C', line: '#A3734A', density: 0.5, width: 1.2, figure: dashes },
};

/** Other species borrow the look that comes nearest: pale, red or dark woods, or those with an open grain. */
const NEAREST: readonly (readonly [RegExp, string])[] = [
  [/walnut|wenge|iroko|teak/, 'black walnut'],
  [/cherry|mahogany|sapele|padauk/, 'cherry'],
  [/oak|ash|hickory|elm|chestnut/, 'white oak'],
  [/beech|alder|pear|birch/, 'beech'],
];

/** Tones, figure and lines of a species named in words; a pale wood where the name is not known. */
export function woodLook(species: string): WoodLook {
  const name = species.trim().toLowerCase();
  const nearest = RECIPES[name] ? name : (NEAREST.find(([pattern]) => pattern.test(name))?.[1] ?? 'hard maple');
  const known = LOOKS.get(nearest) ?? toLook(RECIPES[nearest]!);
  LOOKS.set(nearest, known);
  return known;
}

const LOOKS = new Map<string, WoodLook>();

function toLook(recipe: Recipe): WoodLook {
  const { base, line } = recipe;
  return {
    tones: [mix(base, line, 0.24), mix(base, line, 0.11), base, mix(base, '#FFFFFF', 0.12), mix(base, '#FFFFFF', 0.24)],
    edge: mix(base, line, 0.6),
    line: mix(base, line, 0.8),
    density: recipe.density,
    figureWidth: recipe.width,
    roundFigure: recipe.round ?? false,
    dark: brightness(base) < DARK,
    figure: recipe.figure,
  };
}

/** Mean of the channels, 0 to 255; black walnut has 86. */
const DARK = 110;

const brightness = (hex: string): number =>
  [1, 3, 5].reduce((sum, i) => sum + parseInt(hex.slice(i, i + 2), 16), 0) / 3;

/** A colour `share` of the way from one to another. */
function mix(from: string, to: string, share: number): string {
  const channel = (i: number) => {
    const [a, b] = [from, to].map((hex) => parseInt(hex.slice(1 + 2 * i, 3 + 2 * i), 16)) as [number, number];
    return Math.round(a + (b - a) * share)
      .toString(16)
      .padStart(2, '0');
  };
  return `#${channel(0)}${channel(1)}${channel(2)}`.toUpperCase();
}

/** A number in 0..1 that only the seed and the two counters decide (FNV-1a over the text, then mixed). */
export function chance(seed: string, a: number, b: number): number {
  let hash = 2166136261;
  for (let i = 0; i < seed.length; i++) hash = Math.imul(hash ^ seed.charCodeAt(i), 16777619);
  hash = Math.imul(hash ^ (a * 374761393), 668265263) ^ (b * 1274126177);
  hash = Math.imul(hash ^ (hash >>> 15), 2246822519);
  hash = Math.imul(hash ^ (hash >>> 13), 3266489917);
  return ((hash ^ (hash >>> 16)) >>> 0) / 4294967296;
}
