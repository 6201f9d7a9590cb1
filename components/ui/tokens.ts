import type { Ink } from '@/geometry/scene/display-list';

/** Colours by job. The drawing's inks, and a few only screens need. */
export type ColorName = Ink | 'chalkDeep' | 'rail' | 'railText' | 'scrim';

export type ThemeName = 'light' | 'dark' | 'print';

export type Palette = Readonly<Record<ColorName, string>>;

const INK = '#14202E';

/** Every colour as hex, for painters and for contrast checks. Styles use `color` instead, so that a theme change costs no render. */
export const palettes: Readonly<Record<ThemeName, Palette>> = {
  light: {
    paper: '#F6F2E8',
    card: '#FFFDF7',
    ink: INK,
    ink2: '#4A5561',
    chalk: '#1A5AA8',
    chalkDeep: '#144A8C',
    onchalk: '#FFFFFF',
    chalkT: '#DEEAF6',
    red: '#B3281A',
    redT: '#FBE7DF',
    tape: '#FFC72E',
    tapeInk: INK,
    edge: '#857F70',
    line: '#DDD5C4',
    wall: '#CFC8B8',
    hook: INK,
    rail: INK,
    railText: '#CFD6DD',
    scrim: 'rgba(20, 32, 46, 0.4)',
  },
  dark: {
    paper: '#10171F',
    card: '#1A232D',
    ink: '#F3EEE2',
    ink2: '#B4BEC8',
    chalk: '#86BDF7',
    chalkDeep: '#A6CFFA',
    onchalk: '#10171F',
    chalkT: '#1F3A57',
    red: '#FF8F78',
    redT: '#4A211B',
    tape: '#FFC72E',
    tapeInk: INK,
    edge: '#8794A1',
    line: '#33404D',
    wall: '#3A4652',
    hook: '#9AA6B2',
    rail: '#1A232D',
    railText: '#CFD6DD',
    scrim: 'rgba(0, 0, 0, 0.6)',
  },
  print: {
    paper: '#FFFFFF',
    card: '#FFFFFF',
    ink: '#000000',
    ink2: '#000000',
    chalk: '#000000',
    chalkDeep: '#000000',
    onchalk: '#FFFFFF',
    chalkT: '#FFFFFF',
    red: '#000000',
    redT: '#FFFFFF',
    tape: '#FFFFFF',
    tapeInk: '#000000',
    edge: '#000000',
    line: '#000000',
    wall: '#FFFFFF',
    hook: '#000000',
    rail: '#FFFFFF',
    railText: '#000000',
    scrim: '#FFFFFF',
  },
};

export const COLOR_NAMES = Object.keys(palettes.light) as readonly ColorName[];

/** Each colour as a CSS variable that follows the theme (and paper, when printed). For styles and for SVG fill and stroke. */
export const color = Object.fromEntries(COLOR_NAMES.map((name) => [name, `var(--${name})`])) as Palette;

/** Font families as `app/_layout.tsx` loads them. Each is one weight, so never set fontWeight beside it. */
export const font = {
  label600: 'BarlowCondensed-SemiBold',
  label700: 'BarlowCondensed-Bold',
  label800: 'BarlowCondensed-ExtraBold',
  body400: 'AtkinsonHyperlegibleNext-Regular',
  body700: 'AtkinsonHyperlegibleNext-Bold',
} as const;

/** The family with what to fall back on while it loads. */
export const fontStack = (family: string): string =>
  family.startsWith('Barlow')
    ? `${family}, "Arial Narrow", Arial, sans-serif`
    : `${family}, Verdana, Arial, sans-serif`;

export interface TypeRole {
  readonly family: string;
  /** px */
  readonly size: number;
  /** px */
  readonly line: number;
  readonly tabular?: boolean;
}

export type TypeRoleName =
  | 'wordmark'
  | 'screenTitle'
  | 'sheetTitle'
  | 'rowTitle'
  | 'labelLarge'
  | 'label'
  | 'labelSmall'
  | 'body'
  | 'strong'
  | 'second'
  | 'small'
  | 'number';

export const typeRoles: Readonly<Record<TypeRoleName, TypeRole>> = {
  wordmark: { family: font.label800, size: 46, line: 48 },
  screenTitle: { family: font.label700, size: 30, line: 33 },
  sheetTitle: { family: font.label700, size: 24, line: 26 },
  rowTitle: { family: font.label700, size: 20, line: 22 },
  labelLarge: { family: font.label600, size: 19, line: 21 },
  label: { family: font.label600, size: 17, line: 19 },
  labelSmall: { family: font.label600, size: 16, line: 18 },
  body: { family: font.body400, size: 16, line: 22 },
  strong: { family: font.body700, size: 16, line: 22 },
  second: { family: font.body400, size: 15, line: 21 },
  small: { family: font.body400, size: 14, line: 20 },
  number: { family: font.body700, size: 22, line: 26, tabular: true },
};

/** px. The only gaps and paddings there are. */
export const space = { xs: 4, s: 8, m: 12, l: 16, xl: 24, xxl: 32 } as const;

/** px. Page gutter left and right. */
export const gutter = { phone: 16, wide: 28 } as const;

/** px. 0 for blades and badges. */
export const radius = { none: 0, control: 4, card: 6 } as const;

/** px. Smallest side of what a finger has to hit. */
export const target = { least: 44, icon: 48, atTheSaw: 84 } as const;

/** px. From here on there is a rail at the left and an inspector at the right. */
export const WIDE_FROM = 900;

/** px. Width of the inspector. */
export const INSPECTOR_WIDTH = { least: 372, most: 392 } as const;

/** ms. Nothing loops; with reduced motion all are 0. */
export const motion = { sheet: 160, selection: 120, settle: 240 } as const;

/** Stroke widths and dashes on a drawing, px; they do not scale with the zoom. */
export const strokes = {
  wall: { width: 2.6 },
  selectedWall: { width: 5 },
  badWall: { width: 5, dash: [12, 5] },
  notTaped: { width: 2.2, dash: [9, 6] },
  tie: { width: 1.8, dash: [10, 4, 2, 4] },
  cross: { width: 1.2, dash: [10, 4, 2, 4] },
  bow: { width: 2.4, dash: [2, 5] },
  piece: { width: 2 },
  miter: { width: 3.2 },
  seam: { width: 3.6 },
  hiddenSeam: { width: 3.6, dash: [2, 5] },
  sharedCut: { width: 5 },
  slab: { width: 2.4 },
  fixture: { width: 1.3, dash: [3, 3] },
} as const;
