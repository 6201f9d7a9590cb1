import type { Point } from '../../core/point';
import { along } from '../../core/vector';
import type { Plan } from '../../plan/types';

/** An end of a run that no joint closes. */
export interface OpenRunEnd {
  readonly run: string;
  readonly side: 'left' | 'right';
  /** Back corner and front corner, axes of the plan. */
  readonly from: Point;
  readonly to: Point;
}

/** The end lines of every run but those at joints. */
export function runEnds(plan: Plan): OpenRunEnd[] {
  return plan.tops.runs.flatMap((run) =>
    (['left', 'right'] as const).flatMap((side): OpenRunEnd[] => {
      if (run[side].kind === 'joint') return [];
      const [back, front] = side === 'left' ? [run.backFrom, run.frontFrom] : [run.backTo, run.frontTo];
      return [
        {
          run: run.id,
          side,
          from: along(run.back.origin, run.back.direction, back),
          to: along(run.front.origin, run.front.direction, front),
        },
      ];
    }),
  );
}
