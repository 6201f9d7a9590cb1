import type { Point, Polygon } from '../core/point';
import type { DisplayStep } from '../tape/format-length';

/**
 * The display list: what a drawing is made of, painted alike on screen, on paper and into files. Places are inches of
 * the drawing's own plane, y up. Stroke widths, dashes and text sizes are px (1/96 in on paper) and never scale.
 */
export type Scene = {
  /** Smallest box that shows the drawing, inches. */
  readonly bounds: { readonly minX: number; readonly minY: number; readonly maxX: number; readonly maxY: number };
  readonly items: readonly DrawItem[];
  /** What the drawing is called. */
  readonly title?: string;
  /** The drawing in a sentence, for those who cannot see it. */
  readonly alt?: string;
  /**
   * The drawing is a page of paper of this size, inches: the plane is the page, px are 1/96 in and scale with it.
   * Items of layer 'text' that follow each other with the same id are read as one paragraph, 'title' as its heading;
   * items of layer 'frame' are only decoration; all others belong to the figure.
   */
  readonly paper?: { readonly width: number; readonly height: number };
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
  | 'tapeInk'
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

/** Part of a line of mixed text. `style` is the item's own where left out. */
export type TextRun =
  | { readonly text: string; readonly style?: TextStyle }
  | { readonly inches: number; readonly step: DisplayStep; readonly unit?: boolean; readonly style?: TextStyle };

/** px to the right and up from the item's place, on the unturned axes: what stands beside a line stays beside it at any zoom. */
export type Shift = readonly [number, number];

/** How text stands at its place. */
export interface TextPlace {
  /** Left end, middle or right end of the baseline. */
  readonly at: Point;
  readonly anchor: 'start' | 'middle' | 'end';
  /** `at` is half-way up the capitals instead of on the baseline. */
  readonly middle?: boolean;
  readonly shift?: Shift;
  /** Radians counter-clockwise; the painter flips nothing. */
  readonly turn?: number;
  /** Ground painted under the text, so that it reads over lines. */
  readonly ground?: Ink;
  /** Line round the ground. */
  readonly frame?: Ink;
}

/** What a side of something in a picture of the room is made of. */
export type Surface = 'wood' | 'wall' | 'floor' | 'cabinet' | 'kick' | 'steel' | 'basin' | 'glass' | 'hob';

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
    /** Wood seen at a slant: boards in their tones (0 to 4) with their figure, clipped to an outline less its holes. */
    | {
        readonly kind: 'boards';
        readonly outline: Polygon;
        readonly holes?: readonly Polygon[];
        readonly boards: readonly { readonly outline: Polygon; readonly tone: number }[];
        readonly figure: readonly (readonly Point[])[];
        readonly species: string;
      }
    /** A flat side of something that stands in the room; `light` 0 in the shade to 1 in full light. */
    | {
        readonly kind: 'facet';
        readonly outline: Polygon;
        readonly holes?: readonly Polygon[];
        readonly surface: Surface;
        readonly light: number;
        /** Of surface 'wood'. */
        readonly species?: string;
      }
    /** Line or dot pattern clipped to the outline: waste strokes, face-down dots, grain dashes. */
    | {
        readonly kind: 'hatch';
        readonly outline: Polygon;
        readonly pattern: 'waste' | 'dots' | 'grain';
        readonly ink: Ink;
        readonly holes?: readonly Polygon[];
      }
    | (TextPlace & {
        readonly kind: 'text';
        readonly text: string;
        readonly style: TextStyle;
        /** Largest width, px; longer text is wrapped at words, further lines below. */
        readonly wrap?: number;
        /** Only the outlines of the letters. */
        readonly hollow?: boolean;
      })
    /** A length with its fraction stacked, in the step given. */
    | (TextPlace & {
        readonly kind: 'length';
        readonly inches: number;
        readonly step: DisplayStep;
        readonly unit: boolean;
        readonly style: TextStyle;
      })
    /** Text and lengths in one line, wrapped like text. */
    | (TextPlace & {
        readonly kind: 'runs';
        readonly runs: readonly TextRun[];
        readonly style: TextStyle;
        readonly wrap?: number;
      })
    /** A yellow tape blade, its middle at `at`, lying along `turn` with a length on it; null says it is not taped. */
    | {
        readonly kind: 'blade';
        readonly at: Point;
        readonly inches: number | null;
        readonly step: DisplayStep;
        readonly turn: number;
        readonly state: 'set' | 'retake' | 'empty' | 'selected' | 'twice';
        readonly shift?: Shift;
        /** The measuring end lies on the right: the blade was flipped to keep its number upright. */
        readonly hookRight?: boolean;
      }
    /** A corner's tag, centred on its place: the angle over one word; '?' over it while nobody checked. */
    | {
        readonly kind: 'badge';
        readonly at: Point;
        readonly shift?: Shift;
        /** Interior angle, degrees; null while nothing is known. */
        readonly angleDeg: number | null;
        readonly word: string;
        readonly state: 'set' | 'unchecked' | 'retake';
      }
    /** Measured distance between two points with end ticks, drawn `offset` px to the left of from-to. */
    | {
        readonly kind: 'dimension';
        readonly from: Point;
        readonly to: Point;
        readonly offset: number;
        readonly inches: number;
        readonly step: DisplayStep;
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
        readonly shift?: Shift;
      }
  );

/**
 * disc: ink ring on card with a letter (face up); square: ink square with a light letter (face down); numbered: disc with a
 * cut number; dot: filled; point: small ring at a corner; longPoint / shortPoint: filled / open triangle, tip up; grainArrow:
 * two-headed arrow along `turn`; tickBox: an empty box; handle: the seam's drag handle; warn: filled triangle; turnOver: show
 * face underneath; noAccess: no hand gets in from below; logo: the sign of the program.
 */
export type MarkShape =
  | 'disc'
  | 'square'
  | 'numbered'
  | 'dot'
  | 'point'
  | 'longPoint'
  | 'shortPoint'
  | 'grainArrow'
  | 'tickBox'
  | 'handle'
  | 'warn'
  | 'turnOver'
  | 'noAccess'
  | 'logo';
