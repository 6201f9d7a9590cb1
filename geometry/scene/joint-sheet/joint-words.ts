import type { Layout } from '../../core/layout';
import type { ShopSettings } from '../../core/settings';
import type { DisplayStep } from '../../tape/format-length';
import { glueArea, glueOunces } from '../../wood/quantities';
import { CLAMPS_APART, GLUE_OPEN_MINUTES, STOP_SHORT } from '../../wood/work-effort';
import type { TextRun } from '../display-list';
import { styles } from '../paper/page-builder';
import type { JointPlace } from './joint-places';

/** A piece shorter than this along its back is held down before it is cut or routed, inches. Common practice. */
export const SHORT_PIECE = 12;

/** Everything said of one joint, a paragraph each, in the order of the work. */
export function jointWords(place: JointPlace, layout: Layout, settings: ShopSettings): TextRun[][] {
  const { step } = layout;
  const size = (inches: number): TextRun => ({ inches, step, unit: true, style: styles.number });
  return [
    aboutFace(place, size),
    ...connectorWords(place, settings, size),
    [
      { text: 'Dry fit ', style: styles.strong },
      {
        text: `${place.letters.join(' and ')} on a flat bench; the faces touch from back to front, the tops are flush.`,
      },
    ],
    place.assembled === 'shop' ? shopGlue(place, layout, settings) : siteGlue(place, settings, size),
    ...profileWords(place, layout, size),
  ];
}

function aboutFace(place: JointPlace, size: (inches: number) => TextRun): TextRun[] {
  const [left, right] = place.letters;
  const [a, b] = place.angles;
  return [
    { text: 'Face ', style: styles.strong },
    size(place.length),
    { text: ` long. ${left} is cut at ${a.toFixed(2)}°, ${right} at ${b.toFixed(2)}° to its back edge. ` },
    ...(place.visible < place.length - 1e-6
      ? [size(place.visible), { text: ' of it stays on the finished top.' }]
      : []),
  ];
}

function connectorWords(place: JointPlace, settings: ShopSettings, size: (inches: number) => TextRun): TextRun[][] {
  const { kind, width, depth } = settings.connectors;
  if (place.connectors.length === 0)
    return [[{ text: 'No connector fits here with wood left around it: align by hand and clamp a batten across.' }]];
  const shallow = place.connectors.filter((one) => one.deepest < depth - 1e-9);
  const head: TextRun[] = [
    { text: `${place.connectors.length} × ${kind} `, style: styles.strong },
    size(width),
    { text: ' wide, ' },
    size(depth),
    { text: ' deep into each face, centred in the thickness. Mark both faces from the back point.' },
  ];
  return [
    head,
    ...shallow.map((one): TextRun[] => [
      { text: 'At ' },
      size(one.at),
      { text: ' no deeper than ' },
      size(one.deepest),
      { text: ': the acute point would let it through.' },
    ]),
  ];
}

function shopGlue(place: JointPlace, layout: Layout, settings: ShopSettings): TextRun[] {
  const { clampHours, cureHours } = settings.times;
  const ounces = glueOunces(glueArea([place], [], layout.material.thickness), settings.spread.glueSqFtPerGallon);
  const clamps = Math.ceil(place.length / CLAMPS_APART.value) + 1;
  return [
    { text: 'Glue in the shop: ', style: styles.strong },
    {
      text: `about ${ounces.toFixed(1)} fl oz, ${clamps} clamps on blocks, ${GLUE_OPEN_MINUTES.value} minutes from the first glue to the last clamp. In clamps ${clampHours} h, no load and no cut for ${cureHours} h. Glued at ____:____  clamps off ____:____  load from ____ ____:____`,
    },
  ];
}

function siteGlue(place: JointPlace, settings: ShopSettings, size: (inches: number) => TextRun): TextRun[] {
  const { cureHours } = settings.times;
  const lead: TextRun = { text: 'Close on site: ', style: styles.strong };
  const cure = ` No load and no cut for ${cureHours} h. Closed at ____:____  cured at ____ ____:____`;
  if (place.cleats)
    return [
      lead,
      { text: 'screw two cleats across the seam from below, only in the waste of the cutout, at ' },
      size(place.cleats.at[0]),
      { text: ' and ' },
      size(place.cleats.at[1]),
      { text: ' from the back point, ' },
      size(place.cleats.left),
      { text: ` on ${place.letters[0]} and ` },
      size(place.cleats.right),
      { text: ` on ${place.letters[1]}. Flush the faces, draw tight, then cut the opening when it has cured.${cure}` },
    ];
  const by =
    place.bolts.length > 0 ? `${place.bolts.length} drawbolts from below, dots in the drawing` : 'clamps across';
  return [lead, { text: `${by}. Flush the faces first, then draw tight.${cure}` }];
}

function profileWords(place: JointPlace, layout: Layout, size: (inches: number) => TextRun): TextRun[][] {
  if (layout.edges.profile === 'square' || place.kind === 'edge seam') return [];
  if (place.assembled === 'shop')
    return [[{ text: 'Profile the front edge after the glue has cured, across the joint in one pass.' }]];
  return [
    [
      { text: 'Edge profile: ', style: styles.strong },
      { text: 'stop ' },
      size(STOP_SHORT.value),
      { text: ' short of the joint on both pieces; finish it here when the joint has cured.' },
    ],
  ];
}

/** Letters of pieces too short to hold by hand at the saw or the router. */
export const shortPieces = (
  pieces: readonly { readonly letter: string; readonly back: number; readonly front: number }[],
): string[] => pieces.filter((piece) => Math.min(piece.back, piece.front) < SHORT_PIECE).map((piece) => piece.letter);

export const inchesRun = (inches: number, step: DisplayStep): TextRun => ({
  inches,
  step,
  unit: true,
  style: styles.number,
});
