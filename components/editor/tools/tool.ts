import type { Layout } from '@/geometry/core/layout';
import type { Point } from '@/geometry/core/point';
import type { EditDraft } from '@/shared/layout/apply-edit';

/** A place on a wall, as the canvas found it under a finger. */
export interface OnWall {
  readonly wall: string;
  /** Inches from the wall's left end. */
  readonly at: number;
  /** The wall's length as the room says, inches. */
  readonly length: number;
}

/** What a tool hears: places in inches on the drawing, `reach` the inches a fingertip covers there. */
export type ToolEvent =
  | {
      readonly kind: 'tap';
      readonly at: Point;
      readonly target: string | null;
      readonly on: OnWall | null;
      readonly reach: number;
    }
  /** Always from where the drag began and how far it has come. */
  | {
      readonly kind: 'drag' | 'drop';
      readonly target: string;
      readonly from: Point;
      readonly to: Point;
      readonly on: OnWall | null;
      readonly reach: number;
    }
  | { readonly kind: 'nudge'; readonly target: string; readonly by: Point; readonly on: OnWall | null }
  /** Escape, blur, a second finger, or the tool was put away. */
  | { readonly kind: 'cancel' };

export interface LabelledEdit {
  readonly edit: EditDraft;
  /** In the person's words, for undo. */
  readonly label: string;
}

/** What one event makes of a tool. At most one edit; a preview is drawn and never stored. */
export interface ToolStep<State, Preview> {
  readonly state: State;
  readonly preview: Preview | null;
  readonly edit?: LabelledEdit;
  /** Why nothing was done, in a sentence. */
  readonly refusal?: string;
}

/** One gesture language: every tool of the canvas is such a function, and holds no state of its own. */
export type Tool<State, Preview> = (state: State, event: ToolEvent, layout: Layout) => ToolStep<State, Preview>;
