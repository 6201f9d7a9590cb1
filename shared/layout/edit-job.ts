import { z } from 'zod';

import type { JointChoice, Layout } from '@/geometry/core/layout';
import type { Draft } from 'immer';
import { EditRefused, find } from './edit-refused';
import { applyWorkEdit, workEditSchema } from './edit-work';
import {
  acceptedFindingSchema,
  baseSchema,
  betweenSchema,
  climateYearSchema,
  cutoutSchema,
  edgeProfileSchema,
  finishSchema,
  fixingSchema,
  islandSchema,
  jointChoiceSchema,
  layoutSchema,
  materialSchema,
  placedNoteSchema,
  runSchema,
  siteAccessSchema,
  siteNotesSchema,
  stockSchema,
  stripSchema,
} from './layout-schema';

const uuid = z.uuid();
const id = z.string().min(1).max(40);

/** Lists of things with ids that are added, changed and removed alike. */
const SECTIONS = {
  bases: baseSchema,
  runs: runSchema,
  islands: islandSchema,
  strips: stripSchema,
  cutouts: cutoutSchema,
  notes: placedNoteSchema,
} as const;
export type Section = keyof typeof SECTIONS;

const NOUN: Record<Section, string> = {
  bases: 'cabinet',
  runs: 'run',
  islands: 'island',
  strips: 'strip',
  cutouts: 'cutout',
  notes: 'note',
};

const adding = <S extends Section>(section: S) =>
  z.strictObject({ id: uuid, kind: z.literal('addItem'), section: z.literal(section), item: SECTIONS[section] });

/** Fields left out stay as they are; null takes an optional field away. */
const changing = <S extends Section>(section: S) =>
  z.strictObject({
    id: uuid,
    kind: z.literal('changeItem'),
    section: z.literal(section),
    item: id,
    change: z.record(z.string(), z.unknown()),
  });

export const addItemSchema = z.discriminatedUnion('section', [
  adding('bases'),
  adding('runs'),
  adding('islands'),
  adding('strips'),
  adding('cutouts'),
  adding('notes'),
]);
export const changeItemSchema = z.discriminatedUnion('section', [
  changing('bases'),
  changing('runs'),
  changing('islands'),
  changing('strips'),
  changing('cutouts'),
  changing('notes'),
]);

const setting = <K extends string, T extends z.ZodType>(kind: K, value: T) =>
  z.strictObject({ id: uuid, kind: z.literal(kind), value });

/** Edits of everything that is laid, cut and bought. */
export const jobEditSchema = z.discriminatedUnion('kind', [
  addItemSchema,
  changeItemSchema,
  z.strictObject({
    id: uuid,
    kind: z.literal('removeItem'),
    section: z.enum(['bases', 'runs', 'islands', 'strips', 'cutouts', 'notes']),
    item: id,
  }),
  z.strictObject({ id: uuid, kind: z.literal('setJoint'), joint: jointChoiceSchema }),
  z.strictObject({ id: uuid, kind: z.literal('clearJoint'), between: betweenSchema }),
  z.strictObject({ id: uuid, kind: z.literal('pinSeam'), on: id, at: z.number().min(0).max(1200) }),
  z.strictObject({
    id: uuid,
    kind: z.literal('moveSeam'),
    on: id,
    from: z.number().min(0).max(1200),
    at: z.number().min(0).max(1200),
  }),
  z.strictObject({ id: uuid, kind: z.literal('unpinSeam'), on: id, at: z.number().min(0).max(1200) }),
  setting('setMaterial', materialSchema.partial()),
  setting('setClimate', climateYearSchema.partial()),
  setting('setFixing', fixingSchema.partial()),
  setting('setAccess', siteAccessSchema.partial()),
  setting('setEdges', edgeProfileSchema.partial()),
  setting('setFinish', finishSchema.partial()),
  setting('setStock', stockSchema.partial()),
  setting('setSite', siteNotesSchema.partial()),
  setting('setDisplay', layoutSchema.pick({ units: true, step: true }).partial()),
  setting('keepLetters', z.record(z.string().max(60), z.string().max(6))),
  z.strictObject({
    id: uuid,
    kind: z.literal('acceptFinding'),
    finding: z.string().min(1).max(200),
    accepted: acceptedFindingSchema.nullable(),
  }),
  ...workEditSchema.options,
  z.strictObject({ id: uuid, kind: z.literal('replaceLayout'), layout: layoutSchema }),
]);

export type JobEdit = z.infer<typeof jobEditSchema>;
type Of<K extends JobEdit['kind']> = Extract<JobEdit, { kind: K }>;

/** Two pins nearer than this, inches, are the same seam. */
const SAME_SEAM = 1 / 64;

const SETTING_OF = {
  setMaterial: 'material',
  setClimate: 'climate',
  setFixing: 'fixing',
  setAccess: 'access',
  setEdges: 'edges',
  setFinish: 'finish',
  setStock: 'stock',
  setSite: 'site',
} as const;

function addItem(draft: Draft<Layout>, edit: Of<'addItem'>): void {
  const list = draft[edit.section] as { id: string }[];
  if (list.some((item) => item.id === edit.item.id))
    throw new EditRefused(`There is already a ${NOUN[edit.section]} called ${edit.item.id}.`);
  list.push(edit.item as { id: string });
}

function changeItem(draft: Draft<Layout>, edit: Of<'changeItem'>): void {
  const list = draft[edit.section] as { id: string }[];
  const item = find(list, edit.item, NOUN[edit.section]);
  const changed: Record<string, unknown> = { ...item };
  for (const [field, value] of Object.entries(edit.change)) {
    if (field === 'id') throw new EditRefused('A name once given stays.');
    if (value === null) delete changed[field];
    else changed[field] = value;
  }
  const checked = SECTIONS[edit.section].safeParse(changed);
  if (!checked.success) {
    const issue = checked.error.issues[0];
    throw new EditRefused(
      `The ${NOUN[edit.section]} cannot take this value: ${issue?.path.join('.')} ${issue?.message}.`,
    );
  }
  list[list.indexOf(item)] = checked.data as { id: string };
}

function removeItem(draft: Draft<Layout>, edit: Of<'removeItem'>): void {
  const list = draft[edit.section] as { id: string }[];
  list.splice(list.indexOf(find(list, edit.item, NOUN[edit.section])), 1);
  if (edit.section !== 'runs' && edit.section !== 'islands') return;
  // What was cut into or joined to it goes with it; the inverse edit brings all of it back.
  draft.cutouts = draft.cutouts.filter((c) => c.on !== edit.item);
  draft.seams = draft.seams.filter((s) => s.on !== edit.item);
  draft.joints = draft.joints.filter((j) => !j.between.includes(edit.item));
}

function setJoint(draft: Draft<Layout>, edit: Of<'setJoint'>): void {
  for (const run of edit.joint.between) find(draft.runs, run, 'run');
  draft.joints = draft.joints.filter((j) => !edit.joint.between.every((run) => j.between.includes(run)));
  draft.joints.push(edit.joint as Draft<JointChoice>);
}

function moveSeam(draft: Draft<Layout>, on: string, from: number, at: number | null): void {
  const index = draft.seams.findIndex((s) => s.on === on && Math.abs(s.at - from) < SAME_SEAM);
  if (index < 0) throw new EditRefused('The seam was moved or taken away.');
  if (at === null) draft.seams.splice(index, 1);
  else draft.seams[index]!.at = at;
}

/** Letters of pieces that have none yet; where two people gave one letter to two pieces, the first to come keeps it. */
function keepLetters(draft: Draft<Layout>, given: Readonly<Record<string, string>>): void {
  const taken = new Set(Object.values(draft.letters));
  for (const [key, letter] of Object.entries(given)) {
    if (Object.hasOwn(draft.letters, key) || taken.has(letter)) continue;
    draft.letters[key] = letter;
    taken.add(letter);
  }
}

/** Applies one edit of tops, stock or choices to a draft; throws EditRefused when it no longer applies. */
export function applyJobEdit(draft: Draft<Layout>, edit: JobEdit): void {
  switch (edit.kind) {
    case 'addItem':
      return addItem(draft, edit);
    case 'changeItem':
      return changeItem(draft, edit);
    case 'removeItem':
      return removeItem(draft, edit);
    case 'setJoint':
      return setJoint(draft, edit);
    case 'clearJoint':
      draft.joints = draft.joints.filter((j) => !edit.between.every((run) => j.between.includes(run)));
      return;
    case 'pinSeam':
      if (![...draft.runs, ...draft.islands].some((r) => r.id === edit.on))
        throw new EditRefused('The run the seam was on is gone.');
      draft.seams.push({ on: edit.on, at: edit.at });
      return;
    case 'moveSeam':
      return moveSeam(draft, edit.on, edit.from, edit.at);
    case 'unpinSeam':
      return moveSeam(draft, edit.on, edit.at, null);
    case 'setDisplay':
      Object.assign(draft, edit.value);
      return;
    case 'keepLetters':
      return keepLetters(draft, edit.value);
    case 'acceptFinding':
      if (edit.accepted) draft.accepted[edit.finding] = edit.accepted;
      else delete draft.accepted[edit.finding];
      return;
    case 'setWork':
    case 'changeStep':
    case 'addStep':
    case 'removeStep':
    case 'orderSteps':
      return applyWorkEdit(draft, edit);
    case 'replaceLayout':
      Object.assign(draft, edit.layout);
      return;
    default:
      Object.assign(draft[SETTING_OF[edit.kind]], edit.value);
  }
}
