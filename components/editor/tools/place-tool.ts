import type { Base, BaseKind, Layout } from '@/geometry/core/layout';
import { inches } from '@/geometry/top/sentence';
import { BASE_LOOK, baseEnd, freePlace, onFloor } from '../../room/base-words';
import type { LabelledEdit, OnWall } from './tool';

/** What a tap on a wall can put there; a corner base with no access is a kind of its own on the bar. */
export type Placed = BaseKind | 'no access';

export type PlaceResult = { readonly id: string; readonly edit: LabelledEdit } | { readonly refusal: string };

/** Inches a new base is moved at most so that it stands against its neighbour. */
const CATCH = 3;

/**
 * Puts something on a wall where it was tapped, its middle there, moved to the nearest free stretch.
 *
 * @returns the edit and the id it gives; or why it does not fit, with the number
 */
export function placeBase(layout: Layout, what: Placed, on: OnWall): PlaceResult {
  const kind: BaseKind = what === 'no access' ? 'corner base' : what;
  const look = BASE_LOOK[kind];
  const width = Math.min(look.width, on.length);
  const wanted = Math.min(Math.max(0, on.at - width / 2), Math.max(0, on.length - width));
  const from = kind === 'window' ? wanted : nearestFree(layout.bases, on, width, wanted);
  if (from === null)
    return {
      refusal: `No stretch of ${inches(width, layout.step)} is free on this wall. Make something narrower first.`,
    };
  const rounded = Math.round(from * 16) / 16;
  const item: Base = {
    id: freshBaseId(layout.bases),
    wall: on.wall,
    from: rounded,
    to: Math.min(rounded + width, on.length),
    kind,
    depth: look.depth,
    access: what === 'no access' ? 'none' : 'open',
  };
  return {
    id: item.id,
    edit: { edit: { kind: 'addItem', section: 'bases', item }, label: look.name.toLowerCase() },
  };
}

/** The free place nearest to the wanted one, drawn against a neighbour or the wall's end when it nearly stands there. */
function nearestFree(bases: readonly Base[], { wall, length }: OnWall, width: number, wanted: number): number | null {
  const standing = bases.filter((base) => base.wall === wall && onFloor(base));
  const free = (from: number) =>
    from >= -1e-9 &&
    from + width <= length + 1e-9 &&
    standing.every((base) => Math.min(from + width, baseEnd(base, length)) - Math.max(from, base.from) <= 1 / 32);
  const against = [0, length - width, ...standing.flatMap((base) => [baseEnd(base, length), base.from - width])]
    .filter(free)
    .sort((a, b) => Math.abs(a - wanted) - Math.abs(b - wanted));
  const [nearest] = against;
  if (free(wanted)) return nearest !== undefined && Math.abs(nearest - wanted) <= CATCH ? nearest : wanted;
  return nearest ?? freePlace(bases, wall, length, width);
}

export function freshBaseId(items: readonly { readonly id: string }[]): string {
  let n = items.length + 1;
  while (items.some((item) => item.id === `b${n}`)) n++;
  return `b${n}`;
}
