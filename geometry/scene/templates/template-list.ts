import { circlePathOf, flattenPath, roundCorners, straightPath, type ArcPath } from '../../core/arc-path';
import type { Layout } from '../../core/layout';
import type { Point } from '../../core/point';
import { boundingBox, counterClockwise, type Box } from '../../core/polygon';
import type { Plan } from '../../plan/types';
import { offsetAt } from '../../room/profile';
import { formatLength } from '../../tape/format-length';
import { exposedCorners } from '../../top/piece-path';
import type { Scribe } from '../../top/scribe';
import type { PlacedCutout } from '../../top/types';

/** A line of a template: what is cut or marked along, and what only shows where the template lies. */
export interface TemplateLine {
  readonly kind: 'edge' | 'scribe' | 'reference';
  readonly path: ArcPath;
}

/** Something to lay on the wood at its true size. Inches in axes of its own, y up, good face up. */
export interface Template {
  readonly id: string;
  readonly title: string;
  /** Where it is laid and what is done with it. */
  readonly about: string;
  readonly lines: readonly TemplateLine[];
  /** Words at a place, under it where `below`. */
  readonly notes: readonly { readonly at: Point; readonly text: string }[];
  readonly box: Box;
}

/** Inches: straight edge kept beside a round corner, and the legs of a check angle. */
const LEG = 3;
const STATION = 6;
const ANGLE_LEG = 7;
const ANGLE_HIGHEST = 5;
/** Inches off a back edge below which nobody planes. */
const NO_SCRIBE = 1 / 128;

/** All templates of a job: scribe lines, round corners, cutouts, angles of miters; none where a job needs none. */
export function templatesOf(plan: Plan, layout: Layout): readonly Template[] {
  return [
    ...scribeTemplates(plan, layout),
    ...cornerTemplates(plan, layout),
    ...cutoutTemplates(plan, layout),
    ...angleTemplates(plan, layout),
  ];
}

function template(given: Omit<Template, 'box'>): Template {
  const points = given.lines.flatMap(({ path }) => flattenPath(path));
  return { ...given, box: boundingBox([...points, ...given.notes.map((note) => note.at)]) };
}

const say = (inches: number, { step }: Layout): string =>
  step.endsWith('mm') ? formatLength(inches, step) : `${formatLength(inches, step)} in`;

function scribeTemplates(plan: Plan, layout: Layout): Template[] {
  return plan.wallFit.scribes
    .filter((scribe) => scribe.takeOff > NO_SCRIBE)
    .map((scribe) => scribeTemplate(scribe, plan, layout));
}

/** Along the wall to the right, the wall above; the back edge as sawn is y = 0. */
function scribeTemplate(scribe: Scribe, plan: Plan, layout: Layout): Template {
  const run = layout.runs.find((one) => one.id === scribe.run);
  const far = run?.side === 'back' ? -1 : 1;
  const from = scribe.stations[0]!.at;
  const to = scribe.stations.at(-1)!.at;
  const place = (at: number, off: number): Point => [at - from, -far * off];
  const low = scribe.takeOff + 0.75;
  const across = (at: number): TemplateLine => ({
    kind: 'reference',
    path: straightPath([place(at, 0), place(at, low)], false),
  });
  const marks = stationMarks(scribe);
  const seams = plan.seams.filter((seam) => seam.on === scribe.run && !seam.edge);
  const letters = plan.pieces
    .filter((piece) => piece.on === scribe.run && piece.kind !== 'leg')
    .map((piece) => piece.letter);
  return template({
    id: `scribe-${scribe.run}`,
    title: `Scribe line of run ${scribe.run}, ${letters.join(' and ')}`,
    about: `Lay the dashed line on the back edge as sawn, left end at the left end of the back edge. Plane down to the solid line, at most ${say(scribe.takeOff, layout)}. Then the top moves ${say(scribe.shift, layout)} nearer to the wall.`,
    lines: [
      {
        kind: 'scribe',
        path: straightPath(
          scribe.stations.map((s) => place(s.at, s.takeOff)),
          false,
        ),
      },
      { kind: 'reference', path: straightPath([place(from, 0), place(to, 0)], false) },
      ...marks.map((mark) => across(mark.at)),
      ...seams.filter((seam) => seam.at > from && seam.at < to).map((seam) => across(seam.at)),
    ],
    notes: [
      ...marks.map((s) => ({
        at: place(s.at, low + 0.2),
        text: `${formatLength(s.at - from, layout.step)}: ${formatLength(s.takeOff, layout.step)} off`,
      })),
      ...seams.filter((seam) => seam.at > from && seam.at < to).map((seam) => ({ at: place(seam.at, low + 0.5), text: `seam ${seam.letters.join(' | ')}` })), // prettier-ignore
    ],
  });
}

/** The stations, and every half foot between them where none is near. */
function stationMarks({ stations }: Scribe): readonly { readonly at: number; readonly takeOff: number }[] {
  const line = stations.map(({ at, takeOff }) => ({ at, off: takeOff }));
  const [from, to] = [stations[0]!.at, stations.at(-1)!.at];
  const feet = Array.from({ length: Math.floor((to - from) / STATION) }, (_, i) => from + (i + 1) * STATION);
  const between = feet.filter((at) => stations.every((station) => Math.abs(station.at - at) > STATION / 3));
  return [...stations, ...between.map((at) => ({ at, takeOff: offsetAt(line, at) }))].sort((a, b) => a.at - b.at);
}

/** Straight edges beside a round corner: long where the page has room for them. */
const legOf = (radius: number): number => Math.min(LEG, Math.max(1.5, ANGLE_HIGHEST - radius));

/** A plate with one round corner at its lower left. */
function cornerPlate(radius: number): TemplateLine[] {
  const side = radius + legOf(radius);
  const square: Point[] = [[0, 0], [side, 0], [side, side], [0, side]]; // prettier-ignore
  return [
    { kind: 'edge', path: roundCorners(square, new Map([[0, radius]])) },
    { kind: 'reference', path: straightPath([[radius, 0], [radius, side / 4 + radius]], false) },
    { kind: 'reference', path: straightPath([[0, radius], [side / 4 + radius, radius]], false) },
  ]; // prettier-ignore
}

function cornerTemplates(plan: Plan, layout: Layout): Template[] {
  const uses = new Map<number, string[]>();
  for (const piece of plan.pieces) {
    for (const { radius, end, edge } of exposedCorners(piece)) {
      uses.set(radius, [...(uses.get(radius) ?? []), `${piece.letter} ${edge} ${end}`]);
    }
  }
  return [...uses].map(([radius, places]) =>
    template({
      id: `corner-${radius}`,
      title: `Exposed corner, radius ${say(radius, layout)}`,
      about: `For ${places.join(', ')}. Lay both straight edges flush with the edges of the piece, mark the round, saw outside the line and sand to it.`,
      lines: cornerPlate(radius),
      notes: [{ at: [radius + legOf(radius) / 2, radius + legOf(radius) / 2], text: `radius ${say(radius, layout)}` }],
    }),
  );
}

function cutoutTemplates(plan: Plan, layout: Layout): Template[] {
  const corners = new Map<number, PlacedCutout[]>();
  const whole: Template[] = [];
  for (const cutout of plan.cutouts) {
    const drawn = layout.cutouts.find((one) => one.id === cutout.id);
    const name = cutout.label || `${cutout.kind} in ${cutout.letters.join(' and ')}`;
    if (drawn?.outline && drawn.outline.length >= 3) whole.push(outlineTemplate(cutout.id, name, drawn.outline));
    else if (cutout.kind === 'tap') whole.push(holeTemplate(cutout, name, layout));
    else if (cutout.radius > 0) corners.set(cutout.radius, [...(corners.get(cutout.radius) ?? []), cutout]);
  }
  const plates = [...corners].map(([radius, cutouts]) =>
    template({
      id: `cutout-${radius}`,
      title: `Cutout corner, radius ${say(radius, layout)}`,
      about: `For ${cutouts.map((c) => `${c.label || c.kind}, ${say(c.width, layout)} × ${say(c.depth, layout)}, in ${c.letters.join(' and ')}`).join('; ')}. Lay it inside the marked cutout, both straight edges on its lines. Cut after glue-up.`,
      lines: cornerPlate(radius),
      notes: [
        { at: [radius + legOf(radius) / 2, radius + legOf(radius) / 2], text: `inside, radius ${say(radius, layout)}` },
      ],
    }),
  );
  return [...plates, ...whole];
}

function outlineTemplate(id: string, name: string, outline: readonly Point[]): Template {
  const box = boundingBox(outline);
  return template({
    id: `outline-${id}`,
    title: `Cutout outline: ${name}`,
    about: 'The outline as its maker gave it, front side below. Check it against the sink or the hob itself before you cut.',
    lines: [
      { kind: 'edge', path: straightPath(counterClockwise(outline), true) },
      { kind: 'reference', path: straightPath([[0, box.minY], [0, box.maxY]], false) },
    ],
    notes: [{ at: [0, (box.minY + box.maxY) / 2], text: 'middle' }],
  }); // prettier-ignore
}

function holeTemplate(cutout: PlacedCutout, name: string, layout: Layout): Template {
  const r = cutout.radius;
  const reach = r + 1;
  const crossLines: Point[][] = [[[-reach, 0], [reach, 0]], [[0, -reach], [0, reach]]]; // prettier-ignore
  return template({
    id: `hole-${cutout.id}`,
    title: `Hole: ${name}`,
    about: `Hole of ${say(2 * r, layout)} across. Prick its middle through the paper and bore from the good face.`,
    lines: [
      { kind: 'edge', path: circlePathOf([0, 0], r) },
      ...crossLines.map((points): TemplateLine => ({ kind: 'reference', path: straightPath(points, false) })),
    ],
    notes: [{ at: [0, -reach - 0.2], text: `${say(2 * r, layout)} across` }],
  });
}

/** The angle between the back edge and the cut at each side of every miter; one where both sides are alike. */
function angleTemplates(plan: Plan, layout: Layout): Template[] {
  return plan.joints
    .filter((joint) => joint.kind === 'miter')
    .flatMap((joint) => {
      const [a, b] = joint.angles;
      const alike = a.toFixed(2) === b.toFixed(2);
      const sides = alike ? [{ angle: a, letters: joint.letters.join(' and ') }] : joint.angles.map((angle, i) => ({ angle, letters: joint.letters[i]! })); // prettier-ignore
      return sides.map(({ angle, letters }) => angleTemplate(angle, letters, joint.letters.join('-'), layout));
    });
}

function angleTemplate(angle: number, letters: string, joint: string, layout: Layout): Template {
  const radians = (angle * Math.PI) / 180;
  const leg = Math.min(ANGLE_LEG, ANGLE_HIGHEST / Math.sin(radians));
  const tip: Point = [leg * Math.cos(radians), leg * Math.sin(radians)];
  const across = 2 * leg * Math.sin(radians / 2);
  return template({
    id: `angle-${joint}-${letters.replaceAll(' ', '')}`,
    title: `Check angle of miter ${joint}: ${letters}, ${angle.toFixed(2)}°`,
    about: `Lay the lower edge on the back edge, point at the long point; the slope must follow the cut. It can be turned over. Both edges ${say(leg, layout)}, ends ${say(across, layout)} apart.`,
    lines: [{ kind: 'edge', path: straightPath([[0, 0], [leg, 0], tip], true) }],
    notes: [{ at: [leg * 0.45, leg * 0.12], text: `${angle.toFixed(2)}° ${letters}` }],
  }); // prettier-ignore
}
