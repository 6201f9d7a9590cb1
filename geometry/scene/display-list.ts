import type { Point, Polygon } from '../core/point';

/**
 * The display list: what a drawing is made of, painted alike on screen, on paper and into files. Places are inches of
 * the drawing's own plane, y up. Stroke widths, dashes and text sizes are px (1/96 in on paper) and never scale.
 */
export type Scene = {
  /** Smallest box that shows the drawing, inches. */
  readonly bounds: { readonly minX: number; readonly minY: number; readonly maxX: number; readonly maxY: number };
  readonly items: readonly DrawItem[];
};

/** Colour by role; the painter's theme says which colour it is. On paper everything is black on white. */
export type Ink =
  | 'paper'
  | 'card'
  | 'ink'
  | 'ink2'
  | 'chalk'
  | 'onchalk'
  | 'chalkT'
  | 'red'
  | 'redT'
  | 'tape'
  | 'edge'
  | 'line'
  | 'wall'
  | 'hook';

export interface Stroke {
  readonly ink: Ink;
  readonly width: number;
  readonly dash?: readonly number[];
  /** A paper-coloured line 4 px wider underneath, for lines on wood. */
  readonly casing?: boolean;
}

export type Face = 'label' | 'body';
export type Weight = 'regular' | 'semibold' | 'bold' | 'extrabold';

export interface TextStyle {
  /** 'label' is the condensed heading face, 'body' the reading face. */
  readonly face: Face;
  readonly weight: Weight;
  readonly size: number;
  readonly ink: Ink;
}

/** What a drawing item belongs to, for selection, layers and export. */
export interface Tag {
  readonly layer: Layer;
  readonly id?: string;
}

export type Layer =
  | 'walls'
  | 'bases'
  | 'readings'
  | 'tops'
  | 'staves'
  | 'cutouts'
  | 'joints'
  | 'seams'
  | 'sizes'
  | 'letters'
  | 'hardware'
  | 'slab'
  | 'cuts'
  | 'offcuts'
  | 'defects'
  | 'notes'
  | 'frame'
  | 'text';

export type DrawItem = Tag &
  (
    | { readonly kind: 'line'; readonly from: Point; readonly to: Point; readonly stroke: Stroke }
    | { readonly kind: 'polyline'; readonly points: readonly Point[]; readonly stroke: Stroke }
    /** Counter-clockwise from `start` to `end`, radians. */
    | {
        readonly kind: 'arc';
        readonly centre: Point;
        readonly radius: number;
        readonly start: number;
        readonly end: number;
        readonly stroke: Stroke;
      }
    | {
        readonly kind: 'polygon';
        readonly outline: Polygon;
        readonly holes?: readonly Polygon[];
        readonly fill?: Ink;
        readonly stroke?: Stroke;
      }
    /** Wood: strips along `along`, clipped to the outline less its holes; the tone order comes from `seed`. */
    | {
        readonly kind: 'staves';
        readonly outline: Polygon;
        readonly holes?: readonly Polygon[];
        readonly along: Point;
        readonly origin: Point;
        readonly width: number;
        readonly species: string;
        readonly seed: string;
      }
    /** Line or dot pattern clipped to the outline: waste strokes, face-down dots, grain dashes. */
    | {
        readonly kind: 'hatch';
        readonly outline: Polygon;
        readonly pattern: 'waste' | 'dots' | 'grain';
        readonly ink: Ink;
      }
    | {
        readonly kind: 'text';
        readonly at: Point;
        readonly text: string;
        readonly style: TextStyle;
        readonly anchor: 'start' | 'middle' | 'end';
        /** Radians counter-clockwise; the painter flips nothing. */
        readonly turn?: number;
        /** Largest width, px; longer text is wrapped at words, further lines below. */
        readonly wrap?: number;
        /** Ground painted under the text, so that it reads over lines. */
        readonly ground?: Ink;
      }
    /** A length with its fraction stacked, in the step given. */
    | {
        readonly kind: 'length';
        readonly at: Point;
        readonly inches: number;
        readonly step: string;
        readonly unit: boolean;
        readonly style: TextStyle;
        readonly anchor: 'start' | 'middle' | 'end';
        readonly turn?: number;
        readonly ground?: Ink;
      }
    /** A yellow tape blade lying along `turn` with a length on it. */
    | {
        readonly kind: 'blade';
        readonly at: Point;
        readonly inches: number | null;
        readonly step: string;
        readonly turn: number;
        readonly state: 'set' | 'retake' | 'empty' | 'selected' | 'twice';
      }
    /** Measured distance between two points with end ticks, drawn `offset` px to the left of from-to. */
    | {
        readonly kind: 'dimension';
        readonly from: Point;
        readonly to: Point;
        readonly offset: number;
        readonly inches: number;
        readonly step: string;
        readonly style: TextStyle;
      }
    | {
        readonly kind: 'mark';
        readonly at: Point;
        readonly mark: MarkShape;
        /** px across. */
        readonly size: number;
        readonly ink: Ink;
        readonly text?: string;
        readonly turn?: number;
      }
  );

/**
 * disc: ink ring on card with a letter (face up); square: ink square with a light letter (face down); numbered: disc with a
 * cut number; point: small ring at a corner; longPoint / shortPoint: filled / open triangle touching an edge with its tip;
 * grainArrow: two-headed arrow along `turn`; tickBox: an empty box; handle: the seam's drag handle; warn: filled triangle.
 */
export type MarkShape =
  'disc' | 'square' | 'numbered' | 'point' | 'longPoint' | 'shortPoint' | 'grainArrow' | 'tickBox' | 'handle' | 'warn';
