import { useMemo } from 'react';

import type { Point } from '@/geometry/core/point';
import type { Plan } from '@/geometry/plan/types';
import { distance } from '@/geometry/core/vector';
import type { CanvasDrag } from '../canvas/Canvas';
import { useOpenJob } from '../editor/JobProvider';
import { alongOf, baseOf, stepBase } from '../editor/tools/base-tool';
import { useToast } from '../ui/ToastProvider';
import { basePlace, wallEnds } from './room-targets';
import type { RoomView } from './use-room-view';

export interface BaseDrag {
  readonly start: (drag: CanvasDrag) => void;
  readonly move: (drag: CanvasDrag) => void;
  readonly end: (drag: CanvasDrag) => void;
  readonly cancel: () => void;
  /** Arrow keys: along the wall, by the inches given. */
  readonly nudge: (target: string, by: Point) => void;
}

/** Slides what stands along a wall, and its edges: previewed while the finger moves, one edit when it lifts. */
export function useBaseDrag(plan: Plan, view: RoomView): BaseDrag {
  const { store, run } = useOpenJob();
  const toast = useToast();
  const { openBase } = view;
  return useMemo(() => {
    const step = (kind: 'drag' | 'drop' | 'nudge', target: string, by: Point) => {
      // Positions always start from the stored layout: the one on screen may be a preview.
      const { layout } = store.getState();
      const base = baseOf(layout, target);
      const place = base && basePlace(plan, base);
      const ends = base && wallEnds(plan, base.wall);
      if (!place || !ends) return null;
      const along = alongOf(place.along, [0, 0], by);
      const event = kind === 'nudge' ? ({ kind, target, by, on: null } as const) : ({ kind, target, from: [0, 0], to: by, on: null, reach: 0 } as const); // prettier-ignore
      return stepBase(event, layout, { length: distance(...ends) }, along);
    };
    const finish = (kind: 'drop' | 'nudge', target: string, by: Point) => {
      const done = step(kind, target, by);
      store.getState().showPreview(null);
      if (done?.refusal) toast({ tone: 'failure', text: done.refusal });
      if (done?.edit) run(done.edit.edit, done.edit.label);
    };
    return {
      start: ({ target }) => {
        const base = baseOf(store.getState().layout, target);
        if (base) openBase(base.id, base.wall);
      },
      move: ({ target, by }) => {
        const preview = step('drag', target, by)?.preview;
        store.getState().showPreview(
          preview
            ? [
                {
                  kind: 'changeItem',
                  section: 'bases',
                  item: preview.id,
                  change: { from: preview.from, to: preview.to },
                },
              ]
            : null,
        );
      },
      end: ({ target, by }) => finish('drop', target, by),
      cancel: () => store.getState().showPreview(null),
      nudge: (target, by) => finish('nudge', target, by),
    };
  }, [store, run, plan, toast, openBase]);
}
