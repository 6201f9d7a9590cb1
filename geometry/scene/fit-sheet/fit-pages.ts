import type { Layout } from '../../core/layout';
import type { Plan } from '../../plan/types';
import { solvedRoom } from '../../top/solved-room';
import { wallFrames } from '../../top/wall-frame';
import { fastenersOfTops, type Fastener } from '../../wood/fasteners';
import type { ShopSettings } from '../../core/settings';
import type { Scribe } from '../../top/scribe';
import type { TextRun } from '../display-list';
import { numberPages } from '../paper/number-pages';
import { styles } from '../paper/page-builder';
import { PageFlow, type FlowColumn } from '../paper/page-flow';
import type { SheetPages } from '../paper/sheet-request';
import { carryOrder, type Carry } from './carry-order';
import { addFitPlan } from './fit-plan';
import { fitWords } from './fit-words';
import { addSection } from './section-drawing';

/** Share of the page that the plan takes, and px from the top of its box to the foot. */
const PLAN_SHARE = 0.58;
/** So many carries stand beside the plan; more get a page of their own. */
const BESIDE_PLAN = 9;

/** What the fitters work from: the plan with gaps, screws and slots, the order of carry, scribing, cautions, signatures. */
export const fitPages: SheetPages = ({ plan, layout, settings, head, paper, numbering }) => {
  if (plan.pieces.length === 0) return [];
  const fasteners = fastenersIn(plan, layout, settings);
  const carries = carryOrder(plan);
  const flow = new PageFlow({
    title: 'Fit sheet',
    about: aboutRuns(carries, layout),
    alt: `Fit sheet: the tops from above with their screws and gaps, set in the order ${carries.map((carry) => carry.letters.join('')).join(', ')}.`,
    head,
    paper,
  });
  const planWidth = Math.round(flow.width * PLAN_SHARE);
  const side = { left: flow.left + planWidth + 20, width: flow.width - planWidth - 20 };
  const top = flow.y;
  const height = flow.room - 4;
  addFitPlan(flow.page, plan, layout, fasteners, { left: flow.left, top, width: planWidth, height });
  const beside = carries.length <= BESIDE_PLAN;
  if (beside) flow.table('carry', carryColumns(layout, fasteners, false), carries, side);
  const section = { left: side.left, top: Math.max(flow.y + 6, top + height - 176), width: side.width, height: 168 };
  if (section.top + section.height <= top + height + 4 && plan.screws) addSection(flow.page, sectionOf(plan, layout), layout.step, section); // prettier-ignore
  flow.turnPage();
  if (!beside) flow.table('carry', carryColumns(layout, fasteners, true), carries);
  flow.caution('On site', fitWords(plan, layout, settings));
  for (const scribe of plan.wallFit.scribes) addScribe(flow, scribe, plan, layout);
  flow.signatures(['Fitted by, date', 'Customer, seen']);
  return numberPages(flow.pages, head, numbering);
};

function fastenersIn(plan: Plan, layout: Layout, settings: ShopSettings): readonly Fastener[] {
  if (!plan.room) return [];
  const walls = wallFrames(solvedRoom(plan.room, layout.room)).byIndex.filter((wall) => wall !== undefined);
  return fastenersOfTops(plan.tops, layout.bases, walls, settings.screws, plan.movement.slot);
}

function aboutRuns(carries: readonly Carry[], layout: Layout): TextRun[] {
  const longest = Math.max(...carries.map((carry) => carry.span));
  const heaviest = Math.max(...carries.map((carry) => carry.weightLb));
  return [
    { text: `Crew of ${layout.access.crew}. `, style: styles.strong },
    { text: 'Longest carry ' },
    { inches: longest, step: layout.step, unit: true, style: styles.number },
    { text: `, heaviest ${Math.round(heaviest)} lb.` },
  ];
}

function carryColumns(layout: Layout, fasteners: readonly Fastener[], wide: boolean): FlowColumn<Carry>[] {
  const screws = ({ letters }: Carry) => fasteners.filter((one) => letters.includes(one.letter)).length;
  const hands = ({ hands: { people } }: Carry) => (people === 4 ? '4 or a lift' : String(people));
  return [
    { title: 'Set', share: 0.15, tick: true, cell: ({ n }) => [{ text: String(n), style: styles.strong }] },
    { title: wide ? 'Pieces' : 'Piece', share: 0.2, cell: ({ letters }) => [{ text: letters.join(' '), style: styles.strong }] }, // prettier-ignore
    { title: 'Long', share: 0.21, cell: ({ span }) => [{ inches: span, step: layout.step, style: styles.number }] },
    { title: 'Weight', share: 0.16, cell: ({ weightLb }) => [{ text: `${Math.round(weightLb)} lb` }] },
    { title: 'Hands', share: 0.14, cell: (carry) => [{ text: hands(carry) }] },
    { title: 'Screws', share: 0.14, cell: (carry) => [{ text: String(screws(carry)) }] },
  ];
}

function sectionOf(plan: Plan, layout: Layout) {
  const gaps = layout.runs.map((run) => run.backGap);
  return {
    gap: gaps[0] ?? 0,
    thickness: layout.material.thickness,
    rail: layout.fixing.rail,
    bite: plan.screws?.bite ?? 0,
    left: plan.screws?.left ?? 0,
    slot: plan.movement.slot,
  };
}

function addScribe(flow: PageFlow, scribe: Scribe, plan: Plan, layout: Layout): void {
  const letters = plan.pieces.filter((piece) => piece.on === scribe.run).map((piece) => piece.letter);
  const size = (inches: number): TextRun => ({ inches, step: layout.step, style: styles.number });
  flow.heading(`Scribe ${letters.join(' and ')} to the bowed wall`, 110);
  flow.paragraph(
    scribe.takeOff > 0
      ? [
          { text: 'The top moves back ' },
          size(scribe.shift),
          { text: ' once scribed; at most ' },
          size(scribe.takeOff),
          { text: ' comes off and ' },
          size(scribe.depthLeft),
          { text: ' of depth is left. Check every station with the top in place before you cut.' },
        ]
      : [
          { text: 'Nothing to take off: the backsplash covers the widest gap, ' },
          size(scribe.largestGap),
          { text: '.' },
        ],
  );
  flow.table(
    `scribe ${scribe.run}`,
    [
      {
        title: 'Along the wall from its left end',
        share: 0.4,
        cell: ({ at }: Scribe['stations'][number]) => [size(at)],
      },
      { title: 'Gap as laid', share: 0.3, cell: ({ gap }) => [size(gap)] },
      { title: 'Take off', share: 0.3, cell: ({ takeOff }) => (takeOff > 0 ? [size(takeOff)] : [{ text: 'nothing' }]) },
    ],
    scribe.stations,
  );
}
