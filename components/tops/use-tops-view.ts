import { useCallback, useState } from 'react';

import type { Finding } from '@/geometry/findings/types';
import type { TopsLayers } from '@/geometry/scene/tops/tops-scene';
import { useOpenJob } from '../editor/JobProvider';
import { piecesOf, pointsOf } from './finding-places';
import { mainBlade } from './main-blade';
import { choiceOf, type TopsChoice } from './tops-choice';
import type { CanvasFocus } from './TopsCanvas';
import type { PadRequest } from './tops-pad';
import { useBefore, type Before, type BeforeWhat } from './use-before';

/** What the side column, or the sheet on a phone, is about. */
export type TopsSide = 'lists' | 'add' | 'job' | 'compare';

export interface TopsView {
  readonly name: string | null;
  readonly choice: TopsChoice | null;
  readonly choose: (name: string | null) => void;
  readonly side: TopsSide;
  readonly show: (side: TopsSide) => void;
  readonly layers: TopsLayers;
  readonly toggle: (layer: keyof TopsLayers) => void;
  /** The picture of the finished tops stands in place of the plan. */
  readonly picture: boolean;
  readonly setPicture: (on: boolean) => void;
  readonly typing: PadRequest | null;
  readonly type: (request: PadRequest | null) => void;
  readonly onDigit: (key: string, target: string) => boolean;
  readonly lit: readonly string[];
  readonly focus: CanvasFocus | null;
  readonly zoom: (finding: Finding) => void;
  readonly what: BeforeWhat;
  readonly setWhat: (what: BeforeWhat) => void;
  /** Held: what the drawing shows instead. */
  readonly before: Before | null;
  readonly hold: (held: boolean) => void;
}

const LAYERS: TopsLayers = { grain: true, sizes: false, hardware: false, walls: true };

/** The state of the tops screen that is nobody's business but the screen's. */
export function useTopsView(): TopsView {
  const job = useOpenJob();
  const { plan, drawn, layout } = job;
  const [name, setName] = useState<string | null>(null);
  const [side, setSide] = useState<TopsSide>('lists');
  const [layers, setLayers] = useState(LAYERS);
  const [picture, setPicture] = useState(false);
  const [typing, setTyping] = useState<PadRequest | null>(null);
  const [lit, setLit] = useState<readonly string[]>([]);
  const [focus, setFocus] = useState<CanvasFocus | null>(null);
  const [what, setWhat] = useState<BeforeWhat>('change');
  const [held, hold] = useState(false);
  const { before } = useBefore(what, held);
  const choose = useCallback((next: string | null) => {
    setName(next);
    setSide('lists');
    setTyping(null);
    setLit([]);
  }, []);
  return {
    name,
    choice: choiceOf(plan, layout, name),
    choose,
    side,
    show: (next) => {
      choose(null);
      setSide(next);
    },
    layers,
    toggle: (layer) => setLayers((now) => ({ ...now, [layer]: !now[layer] })),
    picture,
    setPicture,
    typing,
    type: setTyping,
    onDigit: (key, target) => {
      const choice = choiceOf(plan, layout, target);
      const request = choice && mainBlade(job, choice);
      if (!request) return false;
      setName(target);
      setTyping({ ...request, firstKey: key });
      return true;
    },
    lit,
    focus,
    zoom: (finding) => {
      setPicture(false);
      setLit(piecesOf(finding, plan));
      const points = pointsOf(finding, drawn);
      if (points.length > 0) setFocus({ points });
    },
    what,
    setWhat,
    before,
    hold,
  };
}
