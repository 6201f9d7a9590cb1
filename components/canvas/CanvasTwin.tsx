import type { KeyboardEvent } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Point } from '@/geometry/core/point';

import { Press } from '../ui/Press';
import { webStyle } from '../ui/web-style';
import { middleOf, type HitTarget } from './hit-test';
import { toScreen, type ScreenPoint, type Viewport } from './viewport';

/** Something on a drawing that has a name. */
export interface TwinTarget extends HitTarget {
  /** What a screen reader hears: "Wall B, 118 and 5 eighths inches". */
  readonly name: string;
  /** Left out of the list: a second hit area of something already in it. */
  readonly unlisted?: boolean;
}

export interface CanvasTwinProps {
  readonly label: string;
  readonly targets: readonly TwinTarget[];
  readonly view: Viewport;
  readonly onTap: (target: string | null, at: Point) => void;
  readonly onMenu: (target: string, at: Point, place: ScreenPoint) => void;
  readonly onNudge?: (target: string, by: Point) => void;
  readonly onKey?: (key: string, target: string) => boolean;
  readonly onFocusTarget?: (target: string) => void;
  /** Brings a place into sight. */
  readonly onReveal: (at: Point) => void;
}

/** px; as big as what a finger needs. */
const SIDE = 44;

/** Inches an arrow key moves: one step of the tape, or with Shift a whole inch. */
const STEP = 1 / 16;
const BIG_STEP = 1;

const ARROWS: Readonly<Record<string, Point>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

/**
 * The drawing as a list of buttons in the order of the walk. Each lies over its place on the drawing, so that the focus
 * ring shows where one is; the mouse and fingers go through it to the drawing.
 */
export function CanvasTwin(props: CanvasTwinProps) {
  const { label, targets, view } = props;
  return (
    <View role="list" aria-label={`${label}, as a list`} style={[StyleSheet.absoluteFill, styles.through]}>
      {targets
        .filter((target) => !target.unlisted)
        .map((target) => {
          const at = middleOf(target.shape);
          const [x, y] = toScreen(view, at);
          return (
            <View key={target.id} role="listitem" style={[styles.place, { left: x - SIDE / 2, top: y - SIDE / 2 }]}>
              <Press
                aria-label={target.name}
                onPress={() => props.onTap(target.id, at)}
                onFocus={() => {
                  props.onReveal(at);
                  props.onFocusTarget?.(target.id);
                }}
                onKeyDown={(event) => onKeyDown(props, target, event)}
                style={styles.button}
              />
            </View>
          );
        })}
    </View>
  );
}

function onKeyDown(props: CanvasTwinProps, target: TwinTarget, event: KeyboardEvent<HTMLElement>): void {
  if (event.ctrlKey || event.metaKey || event.altKey) return;
  const used = handleKey(props, target, event);
  if (!used) return;
  event.preventDefault();
  event.stopPropagation();
}

function handleKey(props: CanvasTwinProps, target: TwinTarget, event: KeyboardEvent<HTMLElement>): boolean {
  const arrow = ARROWS[event.key];
  if (arrow && props.onNudge) {
    const step = event.shiftKey ? BIG_STEP : STEP;
    props.onNudge(target.id, [arrow[0] * step, arrow[1] * step]);
    return true;
  }
  if (event.key === 'ContextMenu' || (event.shiftKey && event.key === 'F10')) {
    const at = middleOf(target.shape);
    props.onMenu(target.id, at, toScreen(props.view, at));
    return true;
  }
  if (event.key === 'Enter' || event.key === ' ' || event.key === 'Tab') return false;
  return props.onKey?.(event.key, target.id) ?? false;
}

const styles = StyleSheet.create({
  through: { pointerEvents: 'none', ...webStyle({ overflow: 'clip' }) },
  place: { position: 'absolute', width: SIDE, height: SIDE },
  button: { width: SIDE, height: SIDE, borderRadius: 4 },
});
