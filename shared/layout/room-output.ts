import { toDegrees } from '@/geometry/core/angle';
import type { CornerFit, NextMeasurement, ReadingFit, RoomFit, TieFit, WallFit } from '@/geometry/room/types';

/** A fitted room in the words of the file format: inches, angles in degrees, nothing rounded. */
export function toRoomOutput(fit: RoomFit) {
  return {
    points: fit.points,
    dof: fit.dof,
    chi2: fit.chi2,
    chi2Limit: fit.chi2Limit,
    walls: fit.walls.map(wallOutput),
    corners: fit.corners.map(cornerOutput),
    ties: fit.ties.map(tieOutput),
    suspects: fit.suspects,
    checkCorner: fit.checkCorner,
    next: fit.next && nextOutput(fit.next),
  };
}

export type RoomOutput = ReturnType<typeof toRoomOutput>;

function reading({ taped, adjusted, residual, redundancy, standardised }: ReadingFit) {
  return { taped, adjusted, residual, redundancy, standardised };
}

/** Only what is out of the ordinary: that a reading is left out, or that there are several. */
function marks(ignored: boolean, readings: readonly ReadingFit[]) {
  return { ...(ignored && { ignored }), ...(readings.length > 1 && { readings: readings.map(reading) }) };
}

function wallOutput(wall: WallFit) {
  const { id, taped, adjusted, sd, bearing, residual, redundancy, standardised } = wall;
  return {
    id,
    taped,
    adjusted,
    sd,
    bearing: toDegrees(bearing),
    residual,
    redundancy,
    standardised,
    ...marks(wall.ignored, wall.readings),
  };
}

function cornerOutput(corner: CornerFit) {
  const { between, angleDeg, sdDeg, measured, kind, taped, adjusted, residual, redundancy, standardised } = corner;
  return {
    between,
    angle: angleDeg,
    sd: sdDeg,
    measured,
    kind,
    taped,
    adjusted,
    residual,
    redundancy,
    standardised,
    ...marks(corner.ignored, corner.readings),
  };
}

function tieOutput(tie: TieFit) {
  const { id, taped, adjusted, sd, residual, redundancy, standardised } = tie;
  return { id, taped, adjusted, sd, residual, redundancy, standardised, ...marks(tie.ignored, []) };
}

function nextOutput({ worstCornerSdNowDeg, worstCornerSdThenDeg, ...next }: NextMeasurement) {
  return { ...next, worstCornerSdNow: worstCornerSdNowDeg, worstCornerSdThen: worstCornerSdThenDeg };
}
