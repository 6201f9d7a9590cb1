import type { NestGroup, NestInstance } from '@/geometry/nest/types';
import { CHECK_TOLERANCE, type NestFinding } from './finding';
import { isLaid, type LaidPart } from './laid-part';
import { distanceBetween, hullOf, overlapDepth, spanOf } from './polygons';

/** Each group's parts on one slab, face up, all turned or none, side by side in their order with one edge level. */
export function checkGroups(instance: NestInstance, laid: readonly (readonly (LaidPart | null)[])[]): NestFinding[] {
  return (instance.groups ?? []).flatMap((group) => checkGroup(group, laid));
}

function checkGroup(group: NestGroup, laid: readonly (readonly (LaidPart | null)[])[]): NestFinding[] {
  const say = (code: NestFinding['code'], text: string): NestFinding[] => [
    { code, text: `Group ${group.id}: ${text}` },
  ];
  const ids = group.parts.filter((id) => laid.flat().some((p) => p?.part.id === id));
  if (ids.length < 2) return [];
  const slabs = laid.filter((slab) => ids.every((id) => slab.some((p) => p?.part.id === id)));
  if (slabs.length === 0) return say('group_split', 'its parts do not lie on one slab.');
  const answers = slabs.flatMap((slab) =>
    runsOf(ids, slab.filter(isLaid)).map((run) => checkRun(run, slab.filter(isLaid), say)),
  );
  return answers.find((a) => a.length === 0) ?? answers[0]!;
}

/** Every way to name one copy of each part; a part cut more than once may stand in the group with any of its copies. */
function runsOf(ids: readonly string[], parts: readonly LaidPart[]): LaidPart[][] {
  return ids.reduce<LaidPart[][]>(
    (runs, id) => runs.flatMap((run) => parts.filter((p) => p.part.id === id).map((p) => [...run, p])),
    [[]],
  );
}

function checkRun(
  run: readonly LaidPart[],
  all: readonly LaidPart[],
  say: (code: NestFinding['code'], text: string) => NestFinding[],
): NestFinding[] {
  if (run.some((p) => p.place.turnedOver)) return say('group_turned_over', 'a part is turned over.');
  const turned = run[0]!.place.turned;
  if (run.some((p) => p.place.turned !== turned))
    return say('group_mixed_turns', 'some parts are turned and others are not.');
  const inOrder = turned ? [...run].reverse() : run;
  for (let i = 1; i < inOrder.length; i++) {
    const a = inOrder[i - 1]!;
    const b = inOrder[i]!;
    if (middle(b) <= middle(a)) return say('group_out_of_order', 'its parts do not follow each other in their order.');
    const level = turned
      ? spanOf(a.outline).maxY - spanOf(b.outline).maxY
      : spanOf(a.outline).minY - spanOf(b.outline).minY;
    if (Math.abs(level) > CHECK_TOLERANCE)
      return say('group_edge_not_level', `the front edges of ${a.part.id} and ${b.part.id} are not in line.`);
    const hull = hullOf([...a.outline, ...b.outline]);
    if (all.some((p) => p !== a && p !== b && overlapDepth(p.outline, hull) > CHECK_TOLERANCE && between(p, a, b)))
      return say('group_not_neighbours', `something lies between ${a.part.id} and ${b.part.id}.`);
  }
  return [];
}

const middle = ({ outline }: LaidPart): number => outline.reduce((sum, p) => sum + p[0], 0) / outline.length;

function between(p: LaidPart, a: LaidPart, b: LaidPart): boolean {
  return middle(p) > middle(a) && middle(p) < middle(b) && distanceBetween(a.outline, b.outline) > CHECK_TOLERANCE;
}
