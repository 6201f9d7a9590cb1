import { useCallback, useDeferredValue, useMemo, useState } from 'react';

import { measureRoom, type RoomState } from '@/geometry/plan/lay-room';
import { useOpenJob } from '../editor/JobProvider';
import { observationOf, targetOf, type Target } from './tape-walk';

/** What the room screen is doing. */
export interface RoomView {
  /** The room with what to measure next, which takes longer than the drawing and follows it. */
  readonly room: RoomState;
  readonly selected: Target | null;
  /** Selects a target and opens what types it. */
  readonly open: (target: Target) => void;
  readonly select: (target: Target | null) => void;
  /** The pad or the corner check is open for this target. */
  readonly typing: Target | null;
  readonly stopTyping: () => void;
}

export function useRoomView(): RoomView {
  const { layout } = useOpenJob();
  const readings = useDeferredValue(layout.room);
  const room = useMemo(() => measureRoom(readings, { next: true }), [readings]);
  const [chosen, setChosen] = useState<Target | null>(null);
  const [typing, setTyping] = useState(false);
  // A wall that somebody took away is not selected any more.
  const selected =
    chosen && (chosen.kind === 'tie' && chosen.id === null ? chosen : targetOf(layout, observationOf(chosen)));
  const open = useCallback((target: Target) => {
    setChosen(target);
    setTyping(true);
  }, []);
  const select = useCallback((target: Target | null) => {
    setChosen(target);
    setTyping(false);
  }, []);
  return {
    room,
    selected,
    open,
    select,
    typing: typing ? selected : null,
    stopTyping: useCallback(() => setTyping(false), []),
  };
}
