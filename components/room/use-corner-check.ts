import { useMemo, useState } from 'react';

import type { Corner } from '@/geometry/core/layout';
import { wallLabel } from '@/geometry/core/layout';
import { useOpenJob } from '../editor/JobProvider';
import { marksThatFit, type Marks } from './corner-marks';
import { observationOf, type Target } from './tape-walk';
import type { RoomView } from './use-room-view';

export type CornerTarget = Extract<Target, { kind: 'corner' }>;

/** The check of one corner while it is being made: which marks, by which way, and what stands on the pad. */
export interface CornerCheck {
  readonly target: CornerTarget;
  readonly corner: Corner | undefined;
  readonly labels: readonly [string, string];
  /** Sizes that fit both walls, longest first. */
  readonly sizes: readonly Marks[];
  readonly marks: Marks;
  readonly setMarks: (marks: Marks) => void;
  readonly way: 'triangle' | 'protractor';
  readonly setWay: (way: 'triangle' | 'protractor') => void;
  /** What the pad shows, inches. */
  readonly live: number | null;
  readonly setLive: (value: number | null) => void;
}

interface Making {
  readonly of: string;
  readonly marks: Marks | null;
  readonly way: CornerCheck['way'];
  readonly live: number | null;
}

/** Null unless a corner is being checked. */
export function useCornerCheck(view: RoomView): CornerCheck | null {
  const { layout } = useOpenJob();
  const { typing, room } = view;
  const [making, setMaking] = useState<Making | null>(null);
  const target = typing?.kind === 'corner' ? typing : null;
  const of = target ? observationOf(target) : '';
  const lengths = useMemo(() => new Map(room.fit?.walls.map((w) => [w.id, w.adjusted])), [room.fit]);
  if (!target) return null;
  const corner = layout.room.corners.find((c) => c.between.join() === target.between.join());
  const [left, right] = target.between;
  const sizes = marksThatFit(lengths.get(left) ?? Infinity, lengths.get(right) ?? Infinity);
  const taken = corner?.triangle;
  const now: Making =
    making?.of === of
      ? making
      : { of, marks: null, way: corner?.angle === undefined ? 'triangle' : 'protractor', live: null };
  const set = (change: Partial<Making>) => setMaking({ ...now, ...change });
  const label = (id: string) => wallLabel(layout.room.walls.findIndex((w) => w.id === id));
  return {
    target,
    corner,
    labels: [label(left), label(right)],
    sizes,
    marks: now.marks ?? (taken ? [taken.a.value, taken.b.value] : sizes[0]!),
    setMarks: (marks) => set({ marks }),
    way: now.way,
    setWay: (way) => set({ way }),
    live: now.live,
    setLive: (live) => {
      if (live !== now.live) set({ live });
    },
  };
}
