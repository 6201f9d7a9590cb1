import { CAUTIONS } from '../../wood/cautions';
import type { TextRun } from '../display-list';
import { numberPages } from '../paper/number-pages';
import { runsHeight, styles } from '../paper/page-builder';
import { PageFlow } from '../paper/page-flow';
import { jobSettings } from '../../wood/job-settings';
import type { SheetPages } from '../paper/sheet-request';
import { addJointFace, FACE_HEIGHT } from './joint-face';
import { jointPlaces } from './joint-places';
import { inchesRun, jointWords, SHORT_PIECE, shortPieces } from './joint-words';

/** Every miter, butt and seam with its face, its connectors and how it is closed; none where nothing meets. */
export const jointPages: SheetPages = ({ plan, layout, settings: usual, head, paper, numbering }) => {
  // The plan was made with the connector chosen for this job; its mortises are printed, not the shop's usual ones.
  const settings = jobSettings(layout, usual);
  const places = jointPlaces(plan, settings);
  if (places.length === 0) return [];
  const shop = places.filter((place) => place.assembled === 'shop').length;
  const about = `${shop} closed in the shop, ${places.length - shop} on site. All marks along the joint, from its back point.`;
  const flow = new PageFlow({
    title: 'Joint sheet',
    about: [{ text: about }],
    alt: `Joint sheet: ${places.map((place) => place.name).join(', ')}.`,
    head,
    paper,
    notToScale: 'Faces not to scale.',
  });
  for (const place of places) {
    const words = jointWords(place, layout, settings);
    const text = words.reduce((sum, runs) => sum + runsHeight(runs, styles.body, flow.width).height + 8, 0);
    flow.heading(`${place.name}, ${place.assembled === 'shop' ? 'in the shop' : 'on site'}`, FACE_HEIGHT + text);
    addJointFace(flow.page, place, layout.step, { left: flow.left + 14, top: flow.y, width: flow.width - 28 });
    flow.y += FACE_HEIGHT + 10;
    words.forEach((runs) => flow.paragraph(runs));
  }
  const short = shortPieces(plan.pieces);
  const hold: TextRun[][] =
    short.length > 0
      ? [
          [
            { text: `Hold ${short.join(', ')} down with a clamped block: under ` },
            inchesRun(SHORT_PIECE, layout.step),
            { text: ' long they are not held by hand.' },
          ],
        ]
      : [];
  flow.caution('Before you rout and glue', [...hold, [{ text: CAUTIONS.saw.text }], [{ text: CAUTIONS.dust.text }]]);
  return numberPages(flow.pages, head, numbering);
};
