import { useCallback, useDeferredValue, useMemo, useState } from 'react';

import { measureRoom, type RoomState } from '@/geometry/plan/lay-room';
import type { Layout } from '@/geometry/core/layout';
import { useOpenJob } from '../editor/JobProvider';
import { nextTarget, observationOf, targetOf, wantsCross, type Target } from './tape-walk';

/** What the room screen is doing. */
export interface RoomView {
  /** The room with what to measure next, which takes longer than the drawing and follows it. */
  readonly room: RoomState;
  readonly selected: Target | null;
  /** Selects a target and opens what types it; `replace` is the reading of a wall to put another in place of. */
  readonly open: (target: Target, replace?: number) => void;
  readonly select: (target: Target | null) => void;
  /** The pad or the corner check is open for this target. */
  readonly typing: Target | null;
  readonly replace: number | null;
  readonly stopTyping: () => void;
  /** Goes on to what the walk has next after this target. Ends the walk when there is nothing. */
  readonly goOn: (after: Target) => void;
  /** What stands along the selected wall and is open for change. */
  readonly base: string | null;
  readonly openBase: (id: string | null, wall?: string) => void;
  /** Bows are drawn larger than life. */
  readonly largeBows: boolean;
  readonly setLargeBows: (on: boolean) => void;
}

export function useRoomView(): RoomView {
  const { layout, store } = useOpenJob();
  const readings = useDeferredValue(layout.room);
  const room = useMemo(() => measureRoom(readings, { next: true }), [readings]);
  const [chosen, setChosen] = useState<Target | null>(null);
  const [typing, setTyping] = useState(false);
  const [replace, setReplace] = useState<number | null>(null);
  const [base, setBase] = useState<string | null>(null);
  const [largeBows, setLargeBows] = useState(false);
  // A wall that somebody took away is not selected any more.
  const selected =
    chosen && (chosen.kind === 'tie' && chosen.id === null ? chosen : targetOf(layout, observationOf(chosen)));
  const open = useCallback((target: Target, reading?: number) => {
    setChosen(target);
    setTyping(true);
    setReplace(reading ?? null);
    setBase(null);
  }, []);
  const select = useCallback((target: Target | null) => {
    setChosen(target);
    setTyping(false);
    setBase(null);
  }, []);
  const stopTyping = useCallback(() => setTyping(false), []);
  const goOn = useCallback(
    (after: Target) => {
      const target = walkOn(store.getState().layout, after);
      if (target) open(target);
      else select(null);
    },
    [store, open, select],
  );
  const openBase = useCallback((id: string | null, wall?: string) => {
    if (wall !== undefined) {
      setChosen({ kind: 'wall', wall });
      setTyping(false);
    }
    setBase(id);
  }, []);
  return {
    room,
    selected,
    open,
    select,
    typing: typing ? selected : null,
    replace,
    stopTyping,
    goOn,
    base: layout.bases.some((b) => b.id === base) ? base : null,
    openBase,
    largeBows,
    setLargeBows,
  };
}

/** Walls and corners first; then the cross that helps most, until there are enough spare readings. */
function walkOn(layout: Layout, after: Target): Target | null {
  const missing = nextTarget(layout, null, after);
  if (missing) return missing;
  if (!wantsCross(layout)) return null;
  const next = measureRoom(layout.room, { next: true }).fit?.next;
  return next?.kind === 'tie' ? { kind: 'tie', id: null, from: next.from, to: next.to } : null;
}
