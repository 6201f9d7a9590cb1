import type { Layout } from '../../core/layout';
import type { Plan } from '../../plan/types';
import { CAUTIONS } from '../../wood/cautions';
import { datedSchedule, USUAL_CALENDAR, type DatedStep } from '../../wood/dated-schedule';
import { finishSetting, FINISHES } from '../../wood/finish';
import { finishQuarts, sealedArea } from '../../wood/quantities';
import { BETWEEN_GRIT, sandingGrits } from '../../wood/sanding';
import type { FinishSetting } from '../../core/settings';
import type { TextRun } from '../display-list';
import { numberPages } from '../paper/number-pages';
import { styles } from '../paper/page-builder';
import { PageFlow } from '../paper/page-flow';
import { dateWords } from '../paper/sheet-head';
import type { SheetPages } from '../paper/sheet-request';

const strong = (text: string): TextRun => ({ text, style: styles.strong });

/** Sanding, coats with their times and quantities, what was chosen, and what can catch fire. */
export const finishPages: SheetPages = ({ plan, layout, settings, head, paper, numbering }) => {
  if (plan.pieces.length === 0) return [];
  const choice = FINISHES[layout.finish.kind];
  const setting = finishSetting(layout.finish, settings);
  const letters = plan.pieces.map((piece) => piece.letter).join(', ');
  const flow = new PageFlow({
    title: 'Finish sheet',
    about: [strong(choice.name), { text: ` on ${layout.material.species}, pieces ${letters}.` }],
    alt: `Finish sheet: ${choice.name} on ${letters}.`,
    head,
    paper,
  });
  flow.heading('Chosen');
  flow.paragraph(edgeWords(layout));
  flow.paragraph([strong('Food: '), { text: choice.foodContact.text }]);
  sanding(flow, plan, layout);
  if (setting) coats(flow, plan, layout, setting);
  else flow.paragraph([{ text: 'No finish was chosen: the wood stays bare. Nothing keeps water out of it.' }]);
  flow.heading('Afterwards');
  flow.paragraph([strong('Upkeep: '), { text: choice.upkeep.text }]);
  flow.paragraph([strong('Repair: '), { text: choice.repair.text }]);
  flow.caution('Before you open the can', [
    ...(choice.oilyRags ? [[{ text: CAUTIONS.rags.text }]] : []),
    [{ text: CAUTIONS.dust.text }],
    ...(setting
      ? [[{ text: "Fresh air and no flame while it is wet; gloves and mask by the maker's sheet, which goes first." }]]
      : []),
  ]);
  flow.signatures(['Finished by, date', 'Checked']);
  return numberPages(flow.pages, head, numbering);
};

function edgeWords({ edges, step }: Layout): TextRun[] {
  if (edges.profile === 'square') return [strong('Edge: '), { text: 'square, arris taken off.' }];
  return [
    strong('Edge: '),
    { text: `${edges.profile} ` },
    { inches: edges.size, step, unit: true, style: styles.number },
  ];
}

function sanding(flow: PageFlow, plan: Plan, layout: Layout): void {
  const grits = sandingGrits(layout.finish);
  flow.heading('Sand, once and last, along the grain', 120);
  flow.table(
    'sanding',
    [
      { title: 'Grit', share: 0.14, tick: true, cell: (grit: number) => [strong(String(grit))] },
      { title: 'Pieces', share: 0.4, cell: () => [{ text: plan.pieces.map((piece) => piece.letter).join(' ') }] },
      { title: 'How', share: 0.46, cell: (grit) => [{ text: gritWords(grit, grits) }] },
    ],
    grits,
  );
  if (layout.finish.kind === 'oil')
    flow.paragraph([{ text: `Grit ${BETWEEN_GRIT.value} by hand between coats of oil, then wipe.` }]);
}

function gritWords(grit: number, grits: readonly number[]): string {
  if (grit === grits[0]) return 'after cutting and glue-up, until saw and glue marks are gone';
  return grit === grits.at(-1) ? 'last, then vacuum and wipe' : 'until the scratches before are gone';
}

interface Coat {
  readonly n: number;
  readonly where: string;
  readonly quarts: number;
  readonly hours: number;
  readonly last: boolean;
  readonly step: DatedStep | undefined;
}

function coats(flow: PageFlow, plan: Plan, layout: Layout, setting: FinishSetting): void {
  const area = plan.pieces.reduce((sum, piece) => sum + sealedArea(piece), 0);
  const dated = datesOf(plan, layout);
  const rows = Array.from({ length: setting.coats }, (_, i): Coat => {
    const first = i === 0;
    const last = i === setting.coats - 1;
    return {
      n: i + 1,
      where: first ? 'all faces, underside, ends and cutouts alike, in the shop' : 'show faces and edges, on site',
      quarts: finishQuarts(first ? area : area / 2, 1, setting.sqFtPerQuart),
      hours: last ? setting.cureHours : setting.recoatHours,
      last,
      step: dated.find((step) => step.step === (first ? 'Seal all faces' : `Finish coat ${i + 1}`)),
    };
  });
  flow.heading('Coats', 120);
  flow.table(
    'coats',
    [
      { title: 'Coat', share: 0.1, tick: true, cell: ({ n }: Coat) => [strong(String(n))] },
      { title: 'Where', share: 0.34, cell: ({ where }) => [{ text: where }] },
      { title: 'About', share: 0.1, cell: ({ quarts }) => [{ text: `${quarts.toFixed(1)} qt` }] },
      { title: 'Then wait', share: 0.2, cell: ({ hours, last }) => [{ text: `${hours} h, ${last ? 'to cure' : 'to recoat'}` }] }, // prettier-ignore
      { title: 'On', share: 0.26, cell: ({ step }) => [{ text: step ? `${dateWords(step.starts)}, ready ${dateWords(step.ready)}` : '____________' }] }, // prettier-ignore
    ],
    rows,
  );
  flow.paragraph([
    { text: `Light use only until it has cured, ${Math.ceil(setting.cureHours / 24)} days. ` },
    { text: "Times are the shop's; the maker's sheet goes first." },
  ]);
}

/** Dates of the steps where a first day was chosen; none else. */
function datesOf(plan: Plan, layout: Layout): readonly DatedStep[] {
  const start = layout.work?.start;
  if (!start) return [];
  const { workDays = USUAL_CALENDAR.workDays, hoursPerDay = USUAL_CALENDAR.hoursPerDay } = layout.work ?? {};
  return datedSchedule(plan.schedule, start, { ...USUAL_CALENDAR, workDays, hoursPerDay });
}
