import { useState } from 'react';

import type { Point } from '@/geometry/core/point';
import { useOpenJob } from '../editor/JobProvider';
import { baseOf } from '../editor/tools/base-tool';
import { CROSS_START, stepCross, type CrossState } from '../editor/tools/cross-tool';
import { placeBase } from '../editor/tools/place-tool';
import type { OnWall } from '../editor/tools/tool';
import { useToast } from '../ui/ToastProvider';
import { lookOf, type RoomTool } from './room-tools';
import { observationOf, targetOf } from './tape-walk';
import type { RoomView } from './use-room-view';

export interface RoomTools {
  readonly tool: RoomTool;
  readonly take: (tool: RoomTool) => void;
  /** Back to taping. */
  readonly putAway: () => void;
  readonly prompt: string;
  readonly cross: CrossState;
  /** What a tap on the drawing means with this tool. */
  readonly tap: (target: string | null, at: Point, on: OnWall | null, reach: number) => void;
  /** Takes away what can be taken away with a key; false when it is nothing of the kind. */
  readonly remove: (target: string) => boolean;
}

const TAPE: RoomTool = { kind: 'wall' };

/** The tool in hand, and what the drawing does with it. */
export function useRoomTools(view: RoomView): RoomTools {
  const { layout, run, mayEdit } = useOpenJob();
  const toast = useToast();
  const [held, setTool] = useState<RoomTool>(TAPE);
  const [cross, setCross] = useState(CROSS_START);
  const tool = mayEdit ? held : TAPE;
  const say = (text: string) => toast({ tone: 'failure', text });
  const take = (next: RoomTool) => {
    setTool(next);
    setCross(CROSS_START);
    if (next.kind !== 'wall' && next.kind !== 'bow') view.select(null);
  };

  const select = (id: string | null) => {
    const base = id === null ? null : baseOf(layout, id);
    if (base) return view.openBase(base.id, base.wall);
    const target = id === null ? null : targetOf(layout, id);
    // A second tap on what is selected types it.
    if (target && view.selected && observationOf(view.selected) === id && !view.base) view.open(target);
    else view.select(target);
  };
  const tap: RoomTools['tap'] = (id, at, on, reach) => {
    if (tool.kind === 'corner') {
      const target = id === null ? null : targetOf(layout, id);
      if (target?.kind === 'corner') return view.open(target);
      return say('Tap the corner itself, where two walls meet.');
    }
    if (tool.kind === 'bow') {
      if (!on) return say('Tap the wall that bows.');
      setTool(TAPE);
      return view.select({ kind: 'wall', wall: on.wall });
    }
    if (tool.kind === 'cross') {
      const step = stepCross(cross, { kind: 'tap', at, target: id, on, reach });
      setCross(step.state);
      if (step.refusal) say(step.refusal);
      if (step.state.picked) {
        const { from, to } = step.state.picked;
        setTool(TAPE);
        setCross(CROSS_START);
        view.open({ kind: 'tie', id: null, from, to });
      }
      return;
    }
    if (tool.kind === 'place') {
      if (!on) return say('Tap a wall: everything stands along one.');
      const placed = placeBase(layout, tool.what, on);
      if ('refusal' in placed) return say(placed.refusal);
      if (!run(placed.edit.edit, placed.edit.label)) return;
      setTool(TAPE);
      return view.openBase(placed.id, on.wall);
    }
    select(id);
  };
  return {
    tool,
    take,
    putAway: () => take(TAPE),
    prompt: cross.from ? 'Now tap the second mark.' : lookOf(tool).prompt,
    cross,
    tap,
    remove: (target) => {
      const base = baseOf(layout, target);
      if (!mayEdit) return false;
      if (base) return run({ kind: 'removeItem', section: 'bases', item: base.id }, base.kind);
      const reading = targetOf(layout, target);
      if (reading?.kind !== 'tie' || reading.id === null) return false;
      return run({ kind: 'removeTie', tie: reading.id }, 'a cross');
    },
  };
}
