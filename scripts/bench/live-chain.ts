import path from 'node:path';

import { build } from 'esbuild';
import polygonClipping from 'polygon-clipping';

import type { Layout } from '@/geometry/core/layout';
import { launchChromium } from '@/tests/helpers/chromium';
import type { BenchRow } from './bench-row';
import { kitchen, KITCHENS, type KitchenSize } from './kitchens';
import { layoutsOfDrag, liveChain } from './live-chain-moves';
import { quantile, timeTurnAbout } from './side-by-side';

/** One picture of a 60 Hz screen, milliseconds. */
const FRAME = 1000 / 60;
/** A phone is taken to be this many times slower than the machine that runs the bench. */
const THROTTLE = 4;
const SEED = 1;
const FRAMES = 240;
/** Frames of a drag after which the browser has compiled what runs in each of them. */
const WARM = 60;

/** The live chain against the union of its pieces, its growth with the pieces, and in a slowed browser against a frame. */
export async function rows(): Promise<BenchRow[]> {
  const measured = againstUnions();
  const inNode = measured.map(({ walls, pieces, chain, union }): BenchRow => ({
    name: `live chain, ${walls} walls, ${pieces} pieces`,
    value: chain,
    unit: 'ms',
    against: { name: 'polygon-clipping, union of the same pieces', value: union },
    ratio: chain / union,
  }));
  const growth = measured.slice(1).map(({ pieces, chain }, i): BenchRow => {
    const before = measured[i]!;
    const [value, even] = [chain / before.chain, nLogN(pieces) / nLogN(before.pieces)];
    return {
      name: `growth of the live chain, ${before.pieces} to ${pieces} pieces`,
      value,
      unit: 'times',
      against: { name: 'n log n', value: even },
      ratio: value / even,
    };
  });
  return [...inNode, ...growth, ...(await inSlowBrowser())];
}

const nLogN = (n: number): number => n * Math.log(n);

interface Measured extends KitchenSize {
  /** Milliseconds of processor time, the median. */
  readonly chain: number;
  readonly union: number;
}

function againstUnions(): Measured[] {
  const works = KITCHENS.flatMap((size) => {
    const layouts = layoutsOfDrag(kitchen(SEED, size));
    const plan = liveChain(layouts[0]!);
    if (plan.pieces.length !== size.pieces) throw new Error(`${plan.pieces.length} pieces instead of ${size.pieces}`);
    const outlines = plan.pieces.map(({ outline }) => [outline.map(([x, y]): Pair => [onGrid(x), onGrid(y)])]);
    return [
      (round: number) => liveChain(layouts[round % layouts.length]!),
      () => polygonClipping.union(outlines[0]!, ...outlines.slice(1)),
    ];
  });
  const times = timeTurnAbout(works, { rounds: 160, warmUp: 80 }).map((list) => quantile(list, 0.5));
  return KITCHENS.map((size, i) => ({ ...size, chain: times[2 * i]!, union: times[2 * i + 1]! }));
}

type Pair = [number, number];

/** The library cannot finish rings of pieces that touch within rounding errors, so it gets them on a grid of 1/1024 in. */
const onGrid = (inches: number): number => Math.round(inches * 1024) / 1024;

async function inSlowBrowser(): Promise<BenchRow[]> {
  const size = KITCHENS.find(({ pieces }) => pieces === 20)!;
  const frames = await framesInBrowser(kitchen(SEED, size));
  const drag = frames.slice(WARM);
  const what = `live chain in Chromium, CPU ${THROTTLE} times slower, ${size.walls} walls, ${size.pieces} pieces`;
  return [
    row(`${what}, middle of a drag`, quantile(drag, 0.5)),
    row(`${what}, 95 of 100 frames within`, quantile(drag, 0.95)),
    row(`${what}, middle of the first ${WARM} frames, not yet compiled`, quantile(frames.slice(1, WARM), 0.5)),
    row(`${what}, first plan after loading`, frames[0]!),
  ];
}

const row = (name: string, value: number): BenchRow => ({
  name,
  value,
  unit: 'ms',
  against: { name: 'one frame at 60 Hz', value: FRAME },
  ratio: value / FRAME,
});

async function framesInBrowser(layout: Layout): Promise<number[]> {
  const code = await pageCode();
  const browser = await launchChromium();
  try {
    const page = await browser.newPage();
    const devTools = await page.context().newCDPSession(page);
    await page.addScriptTag({ content: code });
    await devTools.send('Emulation.setCPUThrottlingRate', { rate: THROTTLE });
    return await page.evaluate(
      ([given, count]) =>
        (globalThis as unknown as { dragFrames: (layout: Layout, frames: number) => number[] }).dragFrames(
          given,
          count,
        ),
      [layout, FRAMES] as const,
    );
  } finally {
    await browser.close();
  }
}

/** The chain as one script, minified as the web app is. */
async function pageCode(): Promise<string> {
  const root = path.resolve(__dirname, '../..');
  const { outputFiles } = await build({
    entryPoints: [path.join(__dirname, 'live-chain-page.ts')],
    tsconfig: path.join(root, 'tsconfig.json'),
    alias: { '@': root },
    bundle: true,
    minify: true,
    format: 'iife',
    target: 'es2022',
    write: false,
  });
  return outputFiles[0]!.text;
}
