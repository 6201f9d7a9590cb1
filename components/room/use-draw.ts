import { useMemo, useState } from 'react';

import type { Layout } from '@/geometry/core/layout';
import { add, subtract } from '@/geometry/core/vector';
import { useOpenJob } from '../editor/JobProvider';
import { breakAt, type Break } from '../editor/tools/break-wall';
import {
  canClose,
  close,
  endsOf,
  open,
  sketchOf,
  traceEdit,
  wallIndex,
  without,
  type Sketch,
} from '../editor/tools/sketch';
import { stepTrace, TRACE_START, type TraceState } from '../editor/tools/trace-tool';
import type { ToolEvent } from '../editor/tools/tool';
import { useToast } from '../ui/ToastProvider';

/** The walls under the pencil, and everything that can be done to them. */
export interface Draw {
  readonly sketch: Sketch;
  /** What is drawn now: the sketch, or a drag in progress. */
  readonly shown: Sketch;
  readonly state: TraceState;
  readonly send: (event: ToolEvent) => void;
  readonly select: (target: string | null) => void;
  readonly breakWall: (wall: string, kind: Break) => void;
  readonly removeWall: (wall: string) => void;
  /** Closes the ring, or leaves it open again; null when neither can be. */
  readonly ring: { readonly label: string; readonly act: () => void } | null;
  readonly mirror: () => void;
}

export function useDraw(): Draw {
  const job = useOpenJob();
  const { layout, run } = job;
  const toast = useToast();
  const [state, setState] = useState<TraceState>(TRACE_START);
  const [preview, setPreview] = useState<Sketch | null>(null);
  const asDrawn = useMemo(() => layoutAsDrawn(layout, job.drawn.room?.points ?? null), [layout, job.drawn.room]);
  const sketch = useMemo(() => sketchOf(asDrawn), [asDrawn]);
  const refuse = (text: string) => toast({ tone: 'failure', text });
  const send = (event: ToolEvent) => {
    const step = stepTrace(state, event, asDrawn);
    setState(step.state);
    setPreview(step.preview);
    if (step.refusal) refuse(step.refusal);
    if (step.edit) run(step.edit.edit, step.edit.label);
  };
  return {
    sketch,
    shown: preview ?? sketch,
    state,
    send,
    select: (selected) => setState({ ...state, selected }),
    breakWall: (wall, kind) => {
      const index = wallIndex(sketch, wall);
      if (index < 0) return;
      const [from, to] = endsOf(sketch, index);
      const result = breakAt(asDrawn, sketch, wall, [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2], kind);
      if ('refusal' in result) refuse(result.refusal);
      else run(result.edit, result.label);
    },
    removeWall: (wall) => {
      if (run(traceEdit(without(sketch, wall)), 'taking a wall away')) setState(TRACE_START);
    },
    ring: sketch.closed
      ? { label: 'Leave it open', act: () => void run(traceEdit(open(sketch)), 'leaving the room open') }
      : canClose(sketch)
        ? { label: 'Close the room', act: () => void run(traceEdit(close(sketch, 3)), 'closing the room') }
        : null,
    mirror: () => {
      const fitted = new Map(job.plan.room?.walls.map((wall) => [wall.id, wall.adjusted]));
      const lengths = Object.fromEntries(
        sketch.walls.map((id, i) => {
          const [from, to] = endsOf(sketch, i);
          return [id, fitted.get(id) ?? Math.hypot(to[0] - from[0], to[1] - from[1])];
        }),
      );
      run({ kind: 'mirrorRoom', lengths }, 'mirroring the room');
    },
  };
}

/**
 * While nothing is read the sketch is what is drawn. Once the tape has spoken, the corners stand where it puts them, and
 * the pencil starts from there.
 */
function layoutAsDrawn(layout: Layout, points: Sketch['points'] | null): Layout {
  const { room } = layout;
  const read =
    room.walls.some((w) => w.length.length > 0) ||
    room.corners.some((c) => c.triangle || c.angle !== undefined) ||
    room.ties.length > 0;
  const origin = room.sketch[0];
  if (!read || !points || !origin || points.length !== room.sketch.length) return layout;
  const by = subtract(origin, points[0]!);
  return { ...layout, room: { ...room, sketch: points.map((point) => add(point, by)) } };
}
