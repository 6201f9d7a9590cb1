import { useRef, type RefObject } from 'react';
import { StyleSheet, View, type PointerEvent } from 'react-native';

import { Press } from './Press';
import { afterPress, draggedHeight, restingPosition, type SheetHeights, type SheetPosition } from './sheet-drag';
import { color } from './tokens';
import { webStyle } from './web-style';

export interface GrabBarProps {
  readonly label: string;
  readonly position: SheetPosition;
  readonly heights: SheetHeights;
  /** The sheet whose height follows the finger. */
  readonly sheet: RefObject<View | null>;
  readonly onPosition: (next: SheetPosition) => void;
  readonly onClose?: () => void;
}

interface Drag {
  readonly pointer: number;
  readonly y: number;
  readonly height: number;
  readonly lastY: number;
  readonly lastTime: number;
  /** px per ms, up is positive. */
  readonly speed: number;
}

/** px a finger may wander before a press becomes a drag. */
const SLOP = 4;

/** The bar a sheet is dragged by; pressed, it goes to the next height. */
export function GrabBar({ label, position, heights, sheet, onPosition, onClose }: GrabBarProps) {
  const drag = useRef<Drag | null>(null);
  const dragged = useRef(false);
  const node = () => sheet.current as unknown as HTMLElement | null;

  const onPointerDown = (event: PointerEvent) => {
    if (event.nativeEvent.button !== 0) return;
    dragged.current = false;
    const y = event.nativeEvent.clientY;
    drag.current = {
      pointer: event.nativeEvent.pointerId,
      y,
      height: heights[position],
      lastY: y,
      lastTime: event.timeStamp,
      speed: 0,
    };
    (event.currentTarget as unknown as HTMLElement).setPointerCapture(event.nativeEvent.pointerId);
  };
  const onPointerMove = (event: PointerEvent) => {
    const now = drag.current;
    const element = node();
    if (!now || now.pointer !== event.nativeEvent.pointerId || !element) return;
    if (Math.abs(event.nativeEvent.clientY - now.y) > SLOP) dragged.current = true;
    if (!dragged.current) return;
    const time = Math.max(1, event.timeStamp - now.lastTime);
    drag.current = {
      ...now,
      lastY: event.nativeEvent.clientY,
      lastTime: event.timeStamp,
      speed: (now.lastY - event.nativeEvent.clientY) / time,
    };
    element.style.transition = 'none';
    element.style.height = `${draggedHeight(now.height, event.nativeEvent.clientY - now.y, heights)}px`;
  };
  const settle = (next: SheetPosition | 'closed') => {
    const element = node();
    drag.current = null;
    if (element) {
      element.style.transition = '';
      element.style.height = `${heights[next === 'closed' ? position : next]}px`;
    }
    if (next === 'closed') onClose?.();
    else if (next !== position) onPosition(next);
  };
  const onPointerUp = (event: PointerEvent) => {
    const now = drag.current;
    drag.current = null;
    if (!now || !dragged.current) return;
    const height = draggedHeight(now.height, event.nativeEvent.clientY - now.y, heights);
    settle(restingPosition(height, now.speed, heights, onClose !== undefined));
  };

  return (
    <Press
      aria-label={position === 'full' ? `Lower ${label}` : `Raise ${label}`}
      aria-expanded={position !== 'peek'}
      onPress={() => {
        // The click that ends a drag is not a press.
        if (!dragged.current) onPosition(afterPress(position));
      }}
      onPointerDown={onPointerDown}
      onPointerMove={onPointerMove}
      onPointerUp={onPointerUp}
      onPointerCancel={() => dragged.current && settle(position)}
      style={[styles.hit, styles.still]}
    >
      <View style={styles.bar} />
    </Press>
  );
}

const styles = StyleSheet.create({
  // Reaches over the sheet's edge and into its title, so that a finger finds it.
  hit: {
    alignSelf: 'center',
    width: 160,
    height: 44,
    marginTop: -16,
    marginBottom: -8,
    paddingTop: 24,
    alignItems: 'center',
    zIndex: 1,
  },
  still: webStyle({ touchAction: 'none', cursor: 'grab' }),
  bar: { width: 44, height: 5, borderRadius: 2.5, backgroundColor: color.edge },
});
