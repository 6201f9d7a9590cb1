import { globalCss } from '@/components/ui/global-css';
import { COLOR_NAMES, color, palettes, type ColorName, type ThemeName } from '@/components/ui/tokens';

/** WCAG 2.2, definitions of relative luminance and contrast ratio. */
function luminance(hex: string): number {
  const channels = [1, 3, 5].map((at) => parseInt(hex.slice(at, at + 2), 16) / 255);
  const [r, g, b] = channels.map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4)) as [
    number,
    number,
    number,
  ];
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(theme: ThemeName, a: ColorName, b: ColorName): number {
  const [one, two] = [luminance(palettes[theme][a]), luminance(palettes[theme][b])];
  return (Math.max(one, two) + 0.05) / (Math.min(one, two) + 0.05);
}

describe('the contrast measure', () => {
  it('gives 21 for black on white', () => {
    expect(contrast('print', 'ink', 'paper')).toBeCloseTo(21, 10);
  });
});

describe.each(['light', 'dark'] as const)('the %s theme', (theme) => {
  it('writes text at 4.5 to 1 or more on paper and card (WCAG 2.2, 1.4.3)', () => {
    for (const ink of ['ink', 'ink2', 'chalk', 'red'] as const) {
      for (const ground of ['paper', 'card'] as const) expect(contrast(theme, ink, ground)).toBeGreaterThanOrEqual(4.5);
    }
    expect(contrast(theme, 'ink', 'chalkT')).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, 'red', 'redT')).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, 'onchalk', 'chalk')).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, 'onchalk', 'chalkDeep')).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, 'onchalk', 'red')).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, 'tapeInk', 'tape')).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, 'railText', 'rail')).toBeGreaterThanOrEqual(4.5);
    expect(contrast(theme, 'ink', 'line')).toBeGreaterThanOrEqual(4.5);
  });

  it('draws the border of a control at 3 to 1 or more (WCAG 2.2, 1.4.11)', () => {
    expect(contrast(theme, 'edge', 'paper')).toBeGreaterThanOrEqual(3);
    expect(contrast(theme, 'edge', 'card')).toBeGreaterThanOrEqual(3);
    expect(contrast(theme, 'chalk', 'chalkT')).toBeGreaterThanOrEqual(3);
  });
});

describe('the print theme', () => {
  it('is black and white and nothing between', () => {
    for (const name of COLOR_NAMES) expect(['#000000', '#FFFFFF']).toContain(palettes.print[name]);
  });
});

describe('globalCss', () => {
  it('names every colour as a variable, in every theme', () => {
    const css = globalCss();
    for (const name of COLOR_NAMES) {
      expect(color[name]).toBe(`var(--${name})`);
      expect(css.split(`--${name}:`)).toHaveLength(5);
    }
  });

  it('rings the focus 3 px with a gap of 2, and stops motion on request', () => {
    expect(globalCss()).toContain(':focus-visible{outline:3px solid var(--chalk);outline-offset:2px}');
    expect(globalCss()).toContain('prefers-reduced-motion:reduce');
  });
});
