import type { DrawItem } from '@/geometry/scene/display-list';
import type { ClipPrimitive, PathPrimitive, View } from '@/geometry/scene/primitives/primitive';
import { toPrimitives } from '@/geometry/scene/primitives/to-primitives';
import { chance, woodLook } from '@/geometry/scene/primitives/wood-look';

const view = (pxPerInch: number): View => ({ pxPerInch, pixel: 1, origin: [0, 0], smallest: 11, wood: 'colour' });

const staves = (length: number, depth: number, species = 'hard maple'): DrawItem => ({
  layer: 'staves',
  kind: 'staves',
  outline: [[0, 0], [length, 0], [length, depth], [0, depth]], // prettier-ignore
  along: [1, 0],
  origin: [0, 0],
  width: 1.5,
  species,
  seed: 'S96 0',
});

const clipOf = (item: DrawItem, pxPerInch = 6) => toPrimitives(item, view(pxPerInch))[0] as ClipPrimitive;

/** Tone of each strip, from the front edge: the fill of the path that has a box starting at the strip's y. */
function tones(item: DrawItem): string[] {
  const strips: [number, string][] = [];
  for (const child of clipOf(item).children as PathPrimitive[]) {
    if (!child.fill || typeof child.fill === 'string') continue;
    for (const segment of child.path) if (segment[0] === 'M') strips.push([-segment[2], child.fill.hex]);
  }
  return strips.sort((a, b) => a[0] - b[0]).map(([, hex]) => hex);
}

describe('staves', () => {
  it('lays a strip for every stave of 1 1/2 in across 25 in', () => {
    expect(tones(staves(80, 25))).toHaveLength(17);
  });

  it('never gives two neighbours the same tone, and uses five', () => {
    const found = tones(staves(80, 240));
    expect(found.some((tone, i) => tone === found[i + 1])).toBe(false);
    expect(new Set(found)).toEqual(new Set(woodLook('hard maple').tones));
  });

  it('keeps the tones of a piece that grows', () => {
    expect(tones(staves(120, 40)).slice(0, 17)).toEqual(tones(staves(80, 25)));
  });

  it('drops the figure under 2 px an inch and keeps the strips', () => {
    const near = clipOf(staves(80, 25), 2).children.length;
    const far = clipOf(staves(80, 25), 1.9).children.length;
    expect(near - far).toBe(1);
    expect(tones(staves(80, 25))).toHaveLength(17);
  });

  it('is the base colour of the look in its middle tone', () => {
    expect(woodLook('hard maple').tones[2]).toBe('#EBD5AB');
    expect(woodLook('black walnut').tones[2]).toBe('#7B573E');
    expect(woodLook('Cherry').tones[2]).toBe('#C07F57');
    expect(woodLook('white oak').tones[2]).toBe('#CDAE80');
    expect(woodLook('beech').tones[2]).toBe('#DDB48C');
  });

  it('asks for a casing on walnut only', () => {
    const dark = ['hard maple', 'black walnut', 'cherry', 'white oak', 'beech'].filter((s) => woodLook(s).dark);
    expect(dark).toEqual(['black walnut']);
  });

  it('is grain lines instead of colour on paper', () => {
    const [lines] = toPrimitives(staves(80, 25), { ...view(6), wood: 'lines' });
    expect(lines).toMatchObject({ kind: 'path', line: { paint: 'ink' } });
  });
});

describe('chance', () => {
  it('is even enough: the mean of 5000 draws lies within 4 standard errors of a half', () => {
    const draws = Array.from({ length: 5000 }, (_, i) => chance('seed', i, 1));
    const mean = draws.reduce((a, b) => a + b, 0) / draws.length;
    expect(Math.abs(mean - 0.5)).toBeLessThan(4 * Math.sqrt(1 / 12 / draws.length));
    expect(Math.min(...draws)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...draws)).toBeLessThan(1);
  });
});
