import type { ShopSettings } from '../../core/settings';
import type { Layout } from '../../core/layout';
import type { Plan } from '../../plan/types';
import { CAUTIONS } from '../../wood/cautions';
import { shimsOf } from '../../wood/level-support';
import type { TextRun } from '../display-list';
import { styles } from '../paper/page-builder';

/** What the fitters have to know, a paragraph each, in the order of their day. */
export function fitWords(plan: Plan, layout: Layout, settings: ShopSettings): TextRun[][] {
  const { step } = layout;
  const size = (inches: number): TextRun => ({ inches, step, unit: true, style: styles.number });
  const strong = (text: string): TextRun => ({ text, style: styles.strong });
  const shims = shimsOf(layout.bases);
  const gaps = [...new Set(layout.runs.filter((run) => run.side !== 'back').map((run) => run.backGap))];
  const fromAbove = plan.wallFit.slides.filter((slide) => !slide.slides);
  return [
    [
      strong('Drawers out. '),
      { text: 'Cabinets level and screwed together, old fixings pulled, the back edges sealed.' },
    ],
    ...shims.map(({ base, thickness }): TextRun[] => [
      strong('Shim '),
      { text: `the base from ` },
      size(layout.bases.find((one) => one.id === base)?.from ?? 0),
      { text: ' by ' },
      size(thickness),
      { text: '.' },
    ]),
    ...(gaps.length > 0
      ? [
          [
            strong('Leave '),
            ...list(gaps.map(size)),
            { text: ' at the walls: the top moves with the seasons.' },
          ] as TextRun[],
        ]
      : []),
    ...fromAbove.map((slide): TextRun[] => [
      strong('From above: '),
      { text: `${lettersOn(plan, slide.run)} is ` },
      size(slide.short),
      { text: ' wider than the way in between its side walls. Tilt it and lower it, back edge first.' },
    ]),
    ...screwWords(plan, settings, size, strong),
    [
      strong('Never glue '),
      { text: 'the top to the cabinets, nor the screws behind the front line: what cannot move cracks.' },
    ],
    [{ text: CAUTIONS.lifting.text }],
    [{ text: CAUTIONS.trades.text }],
  ];
}

function screwWords(
  plan: Plan,
  settings: ShopSettings,
  size: (inches: number) => TextRun,
  strong: (text: string) => TextRun,
): TextRun[][] {
  if (!plan.screws)
    return [
      [strong('Screws: '), { text: 'no stock length both bites and stays clear of the face. Do not fasten; ask.' }],
    ];
  const { length, bite, left } = plan.screws;
  return [
    [
      strong('Screws '),
      size(length),
      { text: ': ' },
      size(bite),
      { text: ' bites, ' },
      size(left),
      { text: ' of wood is left above the point. Front line in round holes, ' },
      size(settings.screws.frontLine),
      { text: ' behind the edge; behind it slots ' },
      size(plan.movement.slot),
      { text: ' long across the grain, screw in the middle, not tight.' },
    ],
  ];
}

const lettersOn = (plan: Plan, run: string): string =>
  plan.pieces
    .filter((piece) => piece.on === run)
    .map((piece) => piece.letter)
    .join(' and ');

function list(parts: readonly TextRun[]): TextRun[] {
  return parts.flatMap((part, i) => (i === 0 ? [part] : [{ text: i === parts.length - 1 ? ' and ' : ', ' }, part]));
}
