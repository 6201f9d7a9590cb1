import type { Layout } from '../../core/layout';
import type { Plan } from '../../plan/types';
import { careText, FINISHES } from '../../wood/finish';
import { speciesOf } from '../../wood/species';
import type { DrawItem, Scene, TextRun } from '../display-list';
import { embedScene } from '../paper/embed-scene';
import { numberPages } from '../paper/number-pages';
import { styles } from '../paper/page-builder';
import { PageFlow } from '../paper/page-flow';
import type { SheetPages } from '../paper/sheet-request';
import { perspectiveScene } from '../perspective/perspective-scene';
import { topsScene } from '../tops/tops-scene';
import { turnPlan, viewTurn } from '../turn-plan';

/** The top for the people who will live with it: how it looks, what it is made of, how it moves, how to care for it. */
export const customerPages: SheetPages = ({ plan, layout, head, paper, numbering }) => {
  if (plan.pieces.length === 0 || !plan.room) return [];
  const wood = layout.material.species;
  const flow = new PageFlow({
    title: 'Your top',
    about: [{ text: `${head.jobName}, in ${wood}.` }],
    alt: `Your top in ${wood}: as it will look, and from above.`,
    head,
    paper,
    notToScale: 'Pictures not to scale.',
  });
  const seen = turnPlan(plan, viewTurn(layout.room));
  const half = (flow.width - 24) / 2;
  const height = flow.room - 8;
  const box = { top: flow.y + 26, height: height - 26, width: half };
  flow.page.text(flow.left, flow.y + 14, 'As you will see it', styles.label, { id: 'picture' });
  const picture = perspectiveScene(seen, layout);
  embedScene(
    flow.page,
    { ...picture, items: picture.items.filter((item) => inside(item, picture)) },
    { ...box, left: flow.left },
  );
  flow.page.text(flow.left + half + 24, flow.y + 14, 'From above', styles.label, { id: 'plan' });
  const from = topsScene(seen, layout, { layers: { grain: true, sizes: false, hardware: false, walls: true } });
  embedScene(flow.page, { ...from, items: from.items.filter(plain) }, { ...box, left: flow.left + half + 24 });
  flow.turnPage();
  flow.heading('What it is made of');
  madeOf(plan, layout).forEach((runs) => flow.paragraph(runs));
  flow.heading('What moves with the seasons');
  seasons(plan, layout).forEach((runs) => flow.paragraph(runs));
  flow.heading('Care');
  careText(layout.finish, wood).forEach((text) => flow.paragraph([{ text }]));
  flow.paragraph([{ text: "Figures of movement are advice, not an engineer's approval." }], {
    style: { ...styles.body, size: 14 },
  });
  return numberPages(flow.pages, head, numbering);
};

/** Letters, arrows and handles say nothing to somebody who does not cut. */
const plain = ({ layer }: { readonly layer: string }): boolean =>
  layer !== 'letters' && layer !== 'hardware' && layer !== 'sizes' && layer !== 'readings' && layer !== 'walls';

/** Walls and floor of the picture reach past its frame; on paper nothing cuts them off there. */
function inside(item: DrawItem, { bounds }: Scene): boolean {
  if (!('outline' in item)) return true;
  return item.outline.every(([x, y]) => x >= bounds.minX && x <= bounds.maxX && y >= bounds.minY && y <= bounds.maxY);
}

const strong = (text: string): TextRun => ({ text, style: styles.strong });

function madeOf(plan: Plan, layout: Layout): TextRun[][] {
  const { material, edges, finish, step } = layout;
  const joins = plan.joints.length;
  const seams = plan.seams.filter((seam) => !seam.edge);
  const hidden = seams.filter((seam) => seam.inCutout !== null).length;
  const word = (count: number, one: string) => `${count === 1 ? 'one' : count} ${one}${count === 1 ? '' : 's'}`;
  return [
    [strong('Wood: '), { text: `solid ${material.species}, ` }, { inches: material.thickness, step, unit: true, style: styles.number }, { text: ' thick, in strips glued edge to edge.' }], // prettier-ignore
    [
      strong('Edge: '),
      {
        text:
          edges.profile === 'square' ? 'square, softened to the touch.' : `${edges.profile}, softened to the touch.`,
      },
    ],
    [strong('Finish: '), { text: `${FINISHES[finish.kind].name}. ${FINISHES[finish.kind].foodContact.text}` }],
    [
      strong('Joins: '),
      {
        text: `${joins === 0 ? 'no corner join' : `${word(joins, 'corner join')}, where the wood turns`}; ${
          seams.length === 0
            ? 'no join in the long runs.'
            : `${word(seams.length, 'join')} in the long runs${hidden > 0 ? `, ${hidden === seams.length ? (hidden === 1 ? 'at the sink' : 'at the cutouts') : `${hidden} of them at a cutout`}` : ''}.`
        }`,
      },
    ],
  ];
}

function seasons(plan: Plan, layout: Layout): TextRun[][] {
  const fine = layout.step.endsWith('mm') ? '0.5 mm' : '1/32';
  const opens = Math.max(0, ...plan.joints.map((joint) => joint.seasonal));
  const wood = speciesOf(layout.material.species);
  return [
    [
      {
        text: `Solid wood grows a little across its width in damp months and shrinks in dry ones${wood ? '' : ' (this wood is reckoned as a lively one)'}. From the driest to the dampest month your deepest top changes by about `,
      },
      { inches: plan.movement.acrossPerDepth, step: fine, unit: true, style: styles.number },
      { text: '. The gap at the wall, hidden by the backsplash, is there for that.' },
    ],
    ...(opens > 0 && plan.joints.some((joint) => joint.assembled === 'site')
      ? [[{ text: 'A corner join that is not glued may open at its end by up to ' }, { inches: opens, step: fine, unit: true, style: styles.number }, { text: ' in the driest weeks and close again.' }] as TextRun[]] // prettier-ignore
      : []),
    [{ text: 'This is how wood is, and no fault.' }],
  ];
}
