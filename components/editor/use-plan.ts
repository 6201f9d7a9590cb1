import { useMemo } from 'react';
import { useStore } from 'zustand';

import type { Layout } from '@/geometry/core/layout';
import type { ShopSettings } from '@/geometry/core/settings';
import { layRoom } from '@/geometry/plan/lay-room';
import { finishPlan } from '@/geometry/plan/make-plan';
import { nestInstanceOf } from '@/geometry/plan/nest-instance';
import type { Plan } from '@/geometry/plan/types';
import { turnPlan, viewTurn } from '@/geometry/scene/turn-plan';
import type { EditorStore } from './editor-store';
import { useNest, type NestSearch } from './use-nest';

export interface LivePlan {
  /** What is drawn: the layout with a drag in progress on it. */
  readonly layout: Layout;
  readonly plan: Plan;
  /** The same plan turned to lie as the room was traced, for drawing and for touching. */
  readonly drawn: Plan;
  /** Radians by which `drawn` is turned. */
  readonly turn: number;
  readonly nest: NestSearch;
}

/** The plan of what is on screen, computed again on every change; only the slabs take longer and follow. */
export function useLivePlan(store: EditorStore, settings: ShopSettings): LivePlan {
  const layout = useStore(store, (state) => state.preview ?? state.layout);
  const dragging = useStore(store, (state) => state.preview !== null);
  const laid = useMemo(() => layRoom(layout, settings), [layout, settings]);
  const instance = useMemo(() => nestInstanceOf(layout, laid.tops.pieces), [layout, laid]);
  // While a finger drags, the slabs wait: the search begins when it rests.
  const nest = useNest(dragging || laid.room.untaped.length > 0 ? null : instance);
  const plan = useMemo(
    () => finishPlan(laid, layout, settings, { nest: nest.plan, nestProblem: nest.error }),
    [laid, layout, settings, nest.plan, nest.error],
  );
  const turn = viewTurn(layout.room);
  const drawn = useMemo(() => turnPlan(plan, turn), [plan, turn]);
  return { layout, plan, drawn, turn, nest };
}
