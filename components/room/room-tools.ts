import type { IconName } from '../ui/icon-shapes';
import type { Placed } from '../editor/tools/place-tool';

/** What a tap on the drawing does. */
export type RoomTool =
  | { readonly kind: 'wall' }
  | { readonly kind: 'corner' }
  | { readonly kind: 'cross' }
  | { readonly kind: 'bow' }
  | { readonly kind: 'draw' }
  | { readonly kind: 'place'; readonly what: Placed };

export interface ToolLook {
  readonly tool: RoomTool;
  readonly label: string;
  readonly icon: IconName;
  /** What to do on the drawing, said while the tool is in hand. */
  readonly prompt: string;
  /** Letter that takes it in hand. */
  readonly key?: string;
}

const place = (what: Placed, label: string, icon: IconName, key?: string): ToolLook => ({
  tool: { kind: 'place', what },
  label,
  icon,
  prompt: `Tap a wall where the ${label.toLowerCase()} stands. Drag it afterwards.`,
  ...(key && { key }),
});

/** The bar at the foot of the canvas, in its order. */
export const TOOLS: readonly ToolLook[] = [
  { tool: { kind: 'wall' }, label: 'Wall', icon: 'tape', prompt: 'Tap a wall, a corner or a cross.', key: 'w' },
  { tool: { kind: 'corner' }, label: 'Corner', icon: 'corner', prompt: 'Tap the corner to check.', key: 'c' },
  { tool: { kind: 'cross' }, label: 'Cross', icon: 'slide', prompt: 'Tap the first mark: a corner or a place on a wall.', key: 'x' }, // prettier-ignore
  { tool: { kind: 'bow' }, label: 'Bow', icon: 'bow', prompt: 'Tap the wall that bows.', key: 'b' },
  place('sink base', 'Sink', 'sink', 's'),
  { ...place('range', 'Gap', 'range', 'g'), prompt: 'Tap a wall where the range stands. Drag it afterwards.' },
  place('window', 'Window', 'window'),
  {
    ...place('no access', 'No access', 'lock'),
    prompt: 'Tap the wall at the corner cabinet that no hand gets into from below.',
  },
  { tool: { kind: 'draw' }, label: 'Draw', icon: 'pencil', prompt: 'Tap to add a wall, drag to move one.', key: 'd' },
];

export const sameTool = (a: RoomTool, b: RoomTool): boolean =>
  a.kind === b.kind && (a.kind !== 'place' || (b.kind === 'place' && a.what === b.what));

export const lookOf = (tool: RoomTool): ToolLook => TOOLS.find((look) => sameTool(look.tool, tool)) ?? TOOLS[0]!;
