import { useMemo } from 'react';

import { solvedRoom } from '@/geometry/top/solved-room';
import { wallFrames, type WallFrame } from '@/geometry/top/wall-frame';
import { useOpenJob } from '../editor/JobProvider';

/** Walls of the open job as they were solved; none while the room is not known. */
export function useWalls(): readonly WallFrame[] {
  const { plan, layout } = useOpenJob();
  const fit = plan.roomError ? null : plan.room;
  return useMemo(
    () => (fit ? wallFrames(solvedRoom(fit, layout.room)).byIndex.filter((wall) => wall !== undefined) : []),
    [fit, layout.room],
  );
}
