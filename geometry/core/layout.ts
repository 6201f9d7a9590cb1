import type { Point } from './point';

/**
 * The Layout: one job as a plain document. Lengths are inches, angles degrees (as a protractor reads them),
 * money integer cents. The zod schema in shared/layout satisfies these types; only edits change a Layout.
 */
export interface Layout {
  readonly format: 'offsquare-layout';
  readonly version: 1;
  readonly units: Units;
  /** Display step: every number that reaches a saw is rounded to it once, at the end. */
  readonly step: Step;
  readonly room: RoomReadings;
  readonly bases: readonly Base[];
  readonly runs: readonly Run[];
  readonly islands: readonly Island[];
  readonly strips: readonly Strip[];
  readonly cutouts: readonly Cutout[];
  readonly joints: readonly JointChoice[];
  /** Pinned seams; others are placed by the seam planner. */
  readonly seams: readonly PinnedSeam[];
  readonly material: Material;
  readonly climate: ClimateYear;
  readonly fixing: Fixing;
  readonly access: SiteAccess;
  readonly edges: EdgeProfile;
  readonly finish: Finish;
  readonly stock: Stock;
  readonly site: SiteNotes;
  readonly notes: readonly PlacedNote[];
  /** Letters already given, by piece key, so that none jumps when something else is edited. */
  readonly letters: Readonly<Record<string, string>>;
  /** Findings a designer or owner accepted, by finding key, with the reason typed. */
  readonly accepted: Readonly<Record<string, AcceptedFinding>>;
  /** What somebody changed in the generated order of work; missing while nobody did. */
  readonly work?: WorkPlan;
}

export type Units = 'in' | 'mm';
export type Step = '1/16' | '1/32' | '1 mm' | '0.5 mm';

/** One reading of a tape: the text as typed beside its value in inches. */
export interface Reading {
  readonly text: string;
  readonly value: number;
  /** Standard deviation, inches, when this reading brings its own. */
  readonly sd?: number;
  /** Who read it and when (ISO), for the list of readings. */
  readonly by?: string;
  readonly at?: string;
}

/** Inches from a wall's left end, or its right-hand corner itself. */
export type Along = number | 'end';

export interface RoomReadings {
  readonly closed: boolean;
  readonly tapeSd: { readonly fixed: number; readonly perInch: number };
  readonly walls: readonly Wall[];
  readonly corners: readonly Corner[];
  readonly ties: readonly Tie[];
  readonly trust: readonly string[];
  readonly ignore: readonly string[];
  /** Traced corners, inches, room on the right-hand side; as many points as walls + 1 (closed: as walls). */
  readonly sketch: readonly Point[];
}

export interface Wall {
  /** Stable; the label A, B, C … follows from the wall's place in the list. */
  readonly id: string;
  /** Empty until taped; a second entry is the same wall taped twice. */
  readonly length: readonly Reading[];
  /** Offsets from a straight-edge, inches; plus = hollow, minus = bump. */
  readonly profile: readonly { readonly at: number; readonly off: number }[];
  /** How far the wall leans over one foot of height, inches; plus leans away from the room. */
  readonly outOfPlumb?: number;
}

export interface Corner {
  readonly between: readonly [string, string];
  /** Interior angle drawn, degrees: 90 inside corner, 270 outside corner, 135 bay. */
  readonly nominal: number;
  /** Mark a on the left-hand wall, b on the right-hand wall, c between the marks. */
  readonly triangle?: { readonly a: Reading; readonly b: Reading; readonly c: Reading };
  /** Protractor reading, degrees, interior. */
  readonly angle?: number;
  readonly sd?: number;
}

export interface Mark {
  readonly wall: string;
  readonly at: Along;
}

export interface Tie {
  readonly id: string;
  readonly from: Mark;
  readonly to: Mark;
  readonly length: Reading;
}

export type BaseKind = 'cabinet' | 'sink base' | 'corner base' | 'dishwasher' | 'range' | 'opening' | 'window' | 'pipe';

/** What stands along a wall. */
export interface Base {
  readonly id: string;
  readonly wall: string;
  readonly from: number;
  readonly to: Along;
  readonly kind: BaseKind;
  readonly depth: number;
  /** Whether a hand gets in from below to turn a bolt. */
  readonly access: 'open' | 'none';
  /** Shim under the cabinet to bring it level, inches. */
  readonly shim?: number;
  /** Window: height of the sill above the cabinet tops, inches. */
  readonly sill?: number;
  readonly label?: string;
}

export type RunEnd =
  | { readonly kind: 'wall'; readonly clearance: number }
  | { readonly kind: 'open'; readonly overhang: number; readonly radius: number }
  /** Negative overhang = a gap to the appliance. */
  | { readonly kind: 'appliance'; readonly overhang: number }
  | { readonly kind: 'joint' }
  /** A vertical leg with a mitred edge; `height` from floor to the top's show face, inches. */
  | { readonly kind: 'waterfall'; readonly overhang: number; readonly height: number };

/** A stretch of wall covered by a top. Depth is the piece's width, back edge to front edge. */
export interface Run {
  readonly id: string;
  readonly wall: string;
  readonly from: number;
  readonly to: Along;
  readonly depth: number;
  readonly backGap: number;
  readonly left: RunEnd;
  readonly right: RunEnd;
  /** 'back' lays the run on the far side of the wall line (a peninsula's other side). */
  readonly side?: 'front' | 'back';
}

export interface Island {
  readonly id: string;
  readonly length: number;
  readonly depth: number;
  /** Left front corner in room axes and bearing of the long side, degrees; laid beside the room when missing. */
  readonly at?: Point;
  readonly bearing?: number;
  readonly shape?: 'rectangle' | 'clipped' | 'rounded' | 'free';
  /** Clip or radius at the corners, inches. */
  readonly corner?: number;
  /** Own axes, x along the grain from the left end, y from the front edge; for 'free'. */
  readonly outline?: readonly Point[];
  /** How far it hangs past its cabinets on each side, inches; a side that is not typed is carried to its edge. */
  readonly hangs?: IslandHangs;
}

/** Front is the island's own y = 0; left is x = 0, where its grain begins. */
export interface IslandHangs {
  readonly front?: number;
  readonly back?: number;
  readonly left?: number;
  readonly right?: number;
}

/** A narrow rectangle with the grain along it: backsplash, filler, shelf. */
export interface Strip {
  readonly id: string;
  readonly label: string;
  readonly length: number;
  readonly width: number;
  readonly thickness: number;
  readonly count: number;
}

export type CutoutKind = 'sink' | 'cooktop' | 'tap' | 'notch' | 'free';

export interface Cutout {
  readonly id: string;
  /** Run or island it is cut in. */
  readonly on: string;
  readonly kind: CutoutKind;
  readonly mount?: 'drop-in' | 'undermount' | 'apron';
  /** Along the wall, from its left end (island: from its left end), to the cutout's centre. */
  readonly centre: number;
  /** From the top's front edge to the cutout's front side. */
  readonly setback: number;
  readonly width: number;
  readonly depth: number;
  readonly radius: number;
  /** A maker's template, own axes (x along, y from the cutout's front side, centred on x = 0); overrides the typed size. */
  readonly outline?: readonly Point[];
  readonly label?: string;
}

export type JointKind = 'miter' | 'butt' | 'diagonal';

export interface JointChoice {
  readonly between: readonly [string, string];
  readonly kind: JointKind;
  /** Butt: the run that goes through to the other's back line. */
  readonly through?: string;
  /** Diagonal: length of the diagonal's front, inches. */
  readonly width?: number;
  /** Diagonal: angle at which it leaves the left-hand run's front, degrees; the same on both sides when missing. */
  readonly angle?: number;
  readonly assembled: 'shop' | 'site';
}

export interface PinnedSeam {
  readonly on: string;
  /** Along the wall, from its left end (island: from its left end). */
  readonly at: number;
}

export type Faces = 'both' | 'one';
export type GrainCut = 'mixed' | 'flat' | 'edge';

export interface Material {
  /** Key of the species table, or null while none is picked. */
  readonly species: string;
  readonly thickness: number;
  readonly slabDepth: number;
  readonly stave: number;
  readonly faces: Faces;
  readonly grain: GrainCut;
}

export interface Climate {
  readonly tempF: number;
  /** Relative humidity, percent. */
  readonly rh: number;
}

export interface ClimateYear {
  readonly make: Climate;
  readonly summer: Climate;
  readonly winter: Climate;
  readonly heated: boolean;
}

export interface Fixing {
  /** Thickness of the rail or corner block the screw passes, inches. */
  readonly rail: number;
  /** Thickness of the backsplash that covers the back gap, inches; 0 = none. */
  readonly backsplash: number;
  /** Stock length of screw chosen for this job, inches; the longest that is safe when missing or 0. */
  readonly screw?: number;
  /** Name of a connector of the table chosen for this job; the shop's own when missing or ''. */
  readonly connector?: string;
}

export interface SiteAccess {
  readonly doorWidth: number;
  readonly doorHeight: number;
  /** Widths of the two legs of a corridor corner, or null where there is none. */
  readonly corridor: readonly [number, number] | null;
  /** Longest piece that stairs or a landing let through, inches; null = no limit known. */
  readonly clearLength: number | null;
  readonly crew: number;
}

export interface EdgeProfile {
  readonly profile: 'square' | 'roundover' | 'chamfer' | 'bevel';
  readonly size: number;
}

export interface Finish {
  readonly kind: 'oil' | 'hard wax' | 'film' | 'none';
  readonly coats?: number;
  /** Food is prepared straight on the top. */
  readonly foodPrep?: boolean;
}

export interface Defect {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
}

export interface StockSlab {
  readonly id: string;
  readonly length: number;
  readonly depth: number;
  readonly price: number;
  /** null = as many as wanted. */
  readonly count: number | null;
  readonly trim?: number;
  readonly species?: string;
  readonly thickness?: number;
  readonly batch?: string;
  readonly faces?: Faces;
  readonly defects?: readonly Defect[];
}

export interface RackPiece {
  readonly id: string;
  readonly length: number;
  readonly depth: number;
  readonly price?: number;
  readonly species?: string;
  readonly thickness?: number;
  readonly batch?: string;
  readonly faces?: Faces;
  readonly defects?: readonly Defect[];
}

export interface Stock {
  readonly slabs: readonly StockSlab[];
  readonly rack: readonly RackPiece[];
  readonly kerf: number;
  readonly trim: number;
  readonly reuseMin: number;
  readonly turn: boolean;
  readonly turnOver: boolean;
  readonly grainMatch: boolean;
}

export interface SiteNotes {
  /** Highest and lowest cabinet top, inches apart, along the whole kitchen. */
  readonly cabinetsOutOfLevel?: number;
  readonly floorOutOfLevel?: number;
}

export interface PlacedNote {
  readonly id: string;
  readonly text: string;
  readonly wall?: string;
  readonly at?: Point;
  readonly photo?: string;
}

export interface AcceptedFinding {
  readonly reason: string;
  readonly by: string;
  readonly at: string;
  /** The finding's sentence when it was accepted: with another number in it, it is open again. */
  readonly text?: string;
}

/** Changes to the order of work, which is generated anew from every layout. */
export interface WorkPlan {
  /** First day of the work, YYYY-MM-DD. */
  readonly start?: string;
  /** Days of the week on which it is worked at, 0 Sunday to 6 Saturday, and hours a day. */
  readonly workDays?: readonly number[];
  readonly hoursPerDay?: number;
  readonly changes: readonly StepChange[];
  readonly added: readonly AddedStep[];
  /** Steps by name or id as somebody put them; those that came since stand where the generated order has them. */
  readonly order: readonly string[];
}

export interface StepChange {
  /** Name of the generated step. */
  readonly id: string;
  readonly text?: string;
  readonly caution?: string;
  readonly hours?: number;
  /** Why the step is left out. */
  readonly skipped?: string;
}

/** A step that somebody added. */
export interface AddedStep {
  readonly id: string;
  readonly text: string;
  readonly part: 'shop' | 'site';
  readonly hours: number;
  readonly caution?: string;
  /** Step before which it was added; at the end of its part when missing or gone. */
  readonly before?: string;
}

const LABELS = 'ABCDEFGHIJKLMN';

/** Label of the wall at `index`: A to N in the order a person in the room sees them, then A2, B2 … */
export function wallLabel(index: number): string {
  const round = Math.floor(index / LABELS.length);
  return `${LABELS[index % LABELS.length]}${round === 0 ? '' : round + 1}`;
}
