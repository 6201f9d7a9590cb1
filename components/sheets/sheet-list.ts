import type { Layout } from '@/geometry/core/layout';
import type { ShopSettings } from '@/geometry/core/settings';
import type { Plan } from '@/geometry/plan/types';
import { cutSheetScene } from '@/geometry/scene/cut-sheet/cut-sheet-scene';
import type { Scene } from '@/geometry/scene/display-list';
import type { LabelChoice } from '@/geometry/scene/labels/label-grids';
import type { Paper, SheetHead } from '@/geometry/scene/paper/sheet-head';
import { sheetEntry, SHEET_KINDS, type SheetKind } from '@/geometry/scene/sheet-kinds';
import { placeSlab } from '@/geometry/scene/slab/placed-slab';

/** One card of the list: a slab's cut sheet, or all pages of another kind. */
export interface SheetItem {
  readonly key: string;
  readonly kind: SheetKind;
  readonly title: string;
  readonly detail: string;
  readonly note: string;
  readonly pages: readonly Scene[];
  /** Places of its pages among those of its kind, from 1. */
  readonly numbers: readonly number[];
}

export interface SheetSource {
  readonly plan: Plan;
  readonly layout: Layout;
  readonly settings: ShopSettings;
  readonly head: SheetHead;
  readonly paper: Paper;
  readonly prices: boolean;
  readonly labels?: LabelChoice;
}

/** Everything that can be printed of a plan, cut sheets slab by slab first. */
export function sheetItems(source: SheetSource): readonly SheetItem[] {
  const nested = (source.plan.nest?.slabs.length ?? 0) > 0;
  return [
    ...(nested ? cutItems(source) : []),
    ...SHEET_KINDS.filter((kind) => kind !== 'cut' && (nested || !sheetEntry(kind).needsSlabs)).flatMap((kind) => {
      const { name, reader, pages: draw } = sheetEntry(kind);
      const pages = draw(source);
      if (pages.length === 0) return [];
      const note = pages.length === 1 ? 'one page' : `${pages.length} pages`;
      return [{ key: kind, kind, title: name, detail: reader, note, pages, numbers: pages.map((_, i) => i + 1) }];
    }),
  ];
}

function cutItems({ plan, layout, head, paper }: SheetSource): SheetItem[] {
  let before = 0;
  return (plan.nest?.slabs ?? []).map((_, index) => {
    const slab = placeSlab(plan, layout, index);
    const pages = cutSheetScene(plan, layout, index, head, paper);
    const numbers = pages.map((__, i) => before + i + 1);
    before += pages.length;
    const letters = [...new Set(slab.pieces.map((piece) => piece.letter))];
    return {
      key: `cut ${index}`,
      kind: 'cut',
      title: `Cut sheet ${index + 1}`,
      detail: `${slab.name[0]!.toUpperCase()}${slab.name.slice(1)}, ${listed(letters)}`,
      note: `${slab.cuts.length} saw cuts`,
      pages,
      numbers,
    };
  });
}

const listed = (all: readonly string[]): string =>
  all.length < 2 ? all.join('') : `${all.slice(0, -1).join(', ')} and ${all[all.length - 1]}`;

/** Pages as the server takes them: [1, 2, 3, 5] is "1-3,5". */
export function pageList(numbers: readonly number[]): string {
  const sorted = [...new Set(numbers)].sort((a, b) => a - b);
  const parts: string[] = [];
  for (let i = 0; i < sorted.length;) {
    let end = i;
    while (sorted[end + 1] === sorted[end]! + 1) end++;
    parts.push(end > i ? `${sorted[i]}-${sorted[end]}` : String(sorted[i]));
    i = end + 1;
  }
  return parts.join(',');
}
