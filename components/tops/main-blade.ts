import { inches as say } from '@/geometry/top/sentence';
import type { EditDraft } from '@/shared/layout/apply-edit';
import type { OpenJob } from '../editor/JobProvider';
import { someLength, wallLength } from './length-checks';
import { choiceTitle, inSentence, topName, type TopsChoice } from './tops-choice';
import type { PadRequest } from './tops-pad';
import { seamEdit } from './use-tops-drag';

/** The length a digit typed on the drawing is meant for: a top's depth, a cutout's centre, a seam's place; null where there is none. */
export function mainBlade(job: OpenJob, choice: TopsChoice): PadRequest | null {
  switch (choice.kind) {
    case 'piece': {
      const on = job.plan.pieces.find((piece) => piece.letter === choice.letter)?.on;
      return on === undefined ? null : depthBlade(job, on);
    }
    case 'top':
      return depthBlade(job, choice.id);
    case 'cutout':
      return centreBlade(job, choice.id);
    case 'seam':
      return seamBlade(job, choice);
    case 'end':
      return endBlade(job, choice);
    case 'joint':
      return null;
  }
}

function depthBlade({ layout, run }: OpenJob, id: string): PadRequest | null {
  const section = layout.runs.some((r) => r.id === id) ? 'runs' : 'islands';
  const top = layout[section].find((t) => t.id === id);
  if (!top || ('shape' in top && top.shape === 'free')) return null;
  const name = topName(layout, id);
  return {
    title: `${name}, depth`,
    now: top.depth,
    check: someLength('A top’s depth'),
    onLength: (depth) =>
      run(
        { kind: 'changeItem', section, item: id, change: { depth } } as EditDraft,
        `${name}, ${say(depth, layout.step)} deep`,
      ),
  };
}

function centreBlade({ layout, run, plan }: OpenJob, id: string): PadRequest | null {
  const cutout = layout.cutouts.find((c) => c.id === id);
  if (!cutout) return null;
  const name = choiceTitle({ kind: 'cutout', id }, plan, layout);
  return {
    title: `${name}, centre`,
    now: cutout.centre,
    onLength: (centre) =>
      run(
        { kind: 'changeItem', section: 'cutouts', item: id, change: { centre } },
        `${inSentence(name)}, centre at ${say(centre, layout.step)}`,
      ),
  };
}

function seamBlade({ layout, run, plan }: OpenJob, { letters }: TopsChoice & { kind: 'seam' }): PadRequest | null {
  const seam = plan.seams.find((s) => s.letters.join() === letters.join());
  if (!seam || seam.edge) return null;
  const pin = layout.seams.find((p) => p.on === seam.on && Math.abs(p.at - seam.at) < 1 / 64);
  const wall = layout.runs.find((r) => r.id === seam.on)?.wall;
  const most = wall === undefined ? Infinity : (wallLength(plan, wall) ?? Infinity);
  return {
    title: `Seam ${letters.join(' to ')}`,
    now: seam.at,
    check: (at) => (at > 0 && at < most ? null : 'The seam has to lie on its run.'),
    onLength: (at) => {
      const { edit, label } = seamEdit(pin?.at ?? null, seam.on, at, say(at, layout.step));
      run(edit, label);
    },
  };
}

function endBlade({ layout, run }: OpenJob, choice: TopsChoice & { kind: 'end' }): PadRequest | null {
  const end = layout.runs.find((r) => r.id === choice.run)?.[choice.side];
  if (!end || end.kind === 'joint') return null;
  const field = end.kind === 'wall' ? 'clearance' : 'overhang';
  const what = end.kind === 'wall' ? 'clear of the wall' : 'overhang';
  const now = end.kind === 'wall' ? end.clearance : Math.abs(end.overhang);
  const sign = end.kind === 'appliance' && end.overhang < 0 ? -1 : 1;
  const name = `${topName(layout, choice.run)}, ${choice.side} end`;
  return {
    title: `${name}, ${what}`,
    now,
    onLength: (value) =>
      run(
        {
          kind: 'changeItem',
          section: 'runs',
          item: choice.run,
          change: { [choice.side]: { ...end, [field]: sign * value } },
        },
        `${name}, ${what} ${say(value, layout.step)}`,
      ),
  };
}
