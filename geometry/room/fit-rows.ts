import { toDegrees } from '../core/angle';
import { angleQuantity, wallEnd, wallQuantity } from './room-frame';
import type { RoomObservation } from './room-observations';
import type { SolvedRoom } from './solved-room';
import type { CornerFit, ReadingFit, RoomInput, TieFit, WallFit } from './types';

type Row = ReadingFit & { readonly kind: RoomObservation['kind']; readonly subject: number; readonly ignored: boolean };

/** Walls, corners and ties of a solved room as the fit reports them. */
export function fitRows(
  input: RoomInput,
  solved: SolvedRoom,
): { readonly walls: WallFit[]; readonly corners: CornerFit[]; readonly ties: TieFit[] } {
  const rows = [
    ...solved.active.map((o, i) => activeRow(solved, o, i)),
    ...solved.ignored.map((o) => ignoredRow(solved, o)),
  ];
  return {
    walls: input.walls.map((_, i) => wallRow(solved, i, rows)),
    corners: solved.frame.corners.map((_, i) => cornerRow(solved, i, rows)),
    ties: input.ties.map((tie, i) => tieRow(solved, tie.id, i, rows)),
  };
}

const isAngle = (kind: RoomObservation['kind']): boolean => kind === 'angle' || kind === 'assumed';

function activeRow({ adjustment }: SolvedRoom, o: RoomObservation, i: number): Row {
  const scale = isAngle(o.kind) ? toDegrees : (x: number): number => x;
  const taped = scale(o.observation.value);
  const residual = scale(adjustment.residuals[i]!);
  const { kind, subject } = o;
  const redundancy = adjustment.redundancies[i]!;
  const standardised = adjustment.standardised[i]!;
  return { kind, subject, ignored: false, taped, adjusted: taped + residual, residual, redundancy, standardised };
}

function ignoredRow({ adjustment }: SolvedRoom, { kind, subject, observation }: RoomObservation): Row {
  const scale = isAngle(kind) ? toDegrees : (x: number): number => x;
  const taped = scale(observation.value);
  const adjusted = scale(adjustment.predict(observation.quantity).value);
  const residual = adjusted - taped;
  return { kind, subject, ignored: true, taped, adjusted, residual, redundancy: null, standardised: null };
}

/** The reading that fits worst; of readings nobody checks, the first. */
function worstOf(rows: readonly Row[]): Row | undefined {
  return rows.reduce<Row | undefined>(
    (worst, row) => (!worst || Math.abs(row.standardised ?? 0) > Math.abs(worst.standardised ?? 0) ? row : worst),
    undefined,
  );
}

const bare = ({ taped, adjusted, residual, redundancy, standardised }: Row): ReadingFit => ({
  taped,
  adjusted,
  residual,
  redundancy,
  standardised,
});

function wallRow({ frame, adjustment }: SolvedRoom, wall: number, rows: readonly Row[]): WallFit {
  const own = rows.filter((r) => r.kind === 'wall' && r.subject === wall);
  const worst = worstOf(own);
  const { value: adjusted, variance } = adjustment.predict(wallQuantity(frame, wall));
  const [ax, ay] = adjustment.points[wall]!;
  const [bx, by] = adjustment.points[wallEnd(frame, wall)]!;
  return {
    id: frame.wallIds[wall]!,
    taped: worst?.taped ?? null,
    adjusted,
    sd: Math.sqrt(variance),
    bearing: Math.atan2(by - ay, bx - ax),
    residual: worst?.residual ?? null,
    redundancy: worst?.redundancy ?? null,
    standardised: worst?.standardised ?? null,
    ignored: worst?.ignored ?? false,
    readings: own.map(bare),
  };
}

function cornerRow({ frame, adjustment }: SolvedRoom, index: number, rows: readonly Row[]): CornerFit {
  const corner = frame.corners[index]!;
  const own = rows.filter((r) => r.kind !== 'wall' && r.kind !== 'tie' && r.subject === index);
  const inFit = own.filter((r) => !r.ignored);
  // What the corner's row shows is a reading that counts, before an assumption, before one that is left out.
  const shown = worstOf(inFit.filter((r) => r.kind !== 'assumed')) ?? inFit[0] ?? own[0]!;
  const { value, variance } = adjustment.predict(angleQuantity(frame, corner));
  return {
    between: corner.between,
    angleDeg: toDegrees(value),
    sdDeg: toDegrees(Math.sqrt(variance)),
    measured: inFit.some((r) => r.kind !== 'assumed'),
    kind: shown.kind === 'triangle' || shown.kind === 'angle' ? shown.kind : 'assumed',
    ...bare(shown),
    taped: shown.kind === 'assumed' ? null : shown.taped,
    ignored: own.some((r) => r.ignored),
    readings: own.filter((r) => r.kind !== 'assumed').map(bare),
  };
}

function tieRow({ active, ignored, adjustment }: SolvedRoom, id: string, tie: number, rows: readonly Row[]): TieFit {
  const row = rows.find((r) => r.kind === 'tie' && r.subject === tie)!;
  const { observation } = [...active, ...ignored].find((o) => o.kind === 'tie' && o.subject === tie)!;
  const sd = Math.sqrt(adjustment.predict(observation.quantity).variance);
  return { id, sd, ...bare(row), ignored: row.ignored };
}
