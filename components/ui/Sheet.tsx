import { useEffect, useRef, useState, type ReactNode } from 'react';
import { createPortal } from 'react-dom';
import { ScrollView, StyleSheet, View } from 'react-native';

import { useBackCloses } from './back-layers';
import { useFocusTrap } from './focus-trap';
import { GrabBar } from './GrabBar';
import { sheetHeights, type SheetPosition } from './sheet-drag';
import { color, motion, space } from './tokens';
import { webStyle } from './web-style';

export interface SheetProps {
  /** What it holds, for screen readers. */
  readonly label: string;
  readonly position: SheetPosition;
  readonly onPosition: (next: SheetPosition) => void;
  /** Back, Escape, or pulled down. Without it the sheet cannot be closed, only lowered to peek. */
  readonly onClose?: () => void;
  /** Covers the page with a scrim and keeps the focus inside. Else the page behind stays usable (a canvas). */
  readonly modal?: boolean;
  /** px of half, where the content needs a certain height (the pad: 472). */
  readonly half?: number;
  /** The line over the sheet: ink, or red when it asks for a re-take. */
  readonly edge?: 'ink' | 'red';
  /** px the sheet covers at the foot of the page, so that a canvas can keep its selection in sight. */
  readonly onCovers?: (px: number) => void;
  /** Stays at the foot while the content scrolls. */
  readonly foot?: ReactNode;
  readonly children: ReactNode;
}

/**
 * A sheet at the foot of the page. It lies over its nearest positioned parent (PageFrame's content), or over the whole
 * window when modal. The grab bar drags it and is a button too.
 */
export function Sheet(props: SheetProps) {
  if (!props.modal) return <SheetBody {...props} />;
  return createPortal(
    <View style={[StyleSheet.absoluteFill, styles.window]}>
      <View style={[StyleSheet.absoluteFill, styles.scrim]} onClick={props.onClose} aria-hidden />
      <SheetBody {...props} />
    </View>,
    document.body,
  );
}

function SheetBody(props: SheetProps) {
  const { label, position, onPosition, onClose, modal = false, half, edge = 'ink', onCovers, foot, children } = props;
  const sheet = useRef<View>(null);
  const [available, setAvailable] = useState(() => window.innerHeight);
  const heights = sheetHeights(available, half);
  const height = heights[position];

  useFocusTrap(sheet, modal);
  useBackCloses(onClose !== undefined, () => onClose?.());
  useEffect(() => onCovers?.(height), [onCovers, height]);
  useEffect(() => watchParent(sheet.current as unknown as HTMLElement | null, setAvailable), []);

  return (
    <View
      ref={sheet}
      role={modal ? 'dialog' : 'region'}
      aria-modal={modal || undefined}
      aria-label={label}
      tabIndex={modal ? -1 : undefined}
      dataSet={{ ring: 'none' }}
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || event.defaultPrevented) return;
        event.stopPropagation();
        if (onClose) onClose();
        else onPosition('peek');
      }}
      style={[styles.sheet, { height, borderTopColor: color[edge] }, styles.moves]}
    >
      <GrabBar
        label={label}
        position={position}
        heights={heights}
        sheet={sheet}
        onPosition={onPosition}
        onClose={onClose}
      />
      <ScrollView style={styles.body} contentContainerStyle={styles.content} keyboardShouldPersistTaps="handled">
        {children}
      </ScrollView>
      {foot && <View style={styles.foot}>{foot}</View>}
    </View>
  );
}

/** Reports the height of what the sheet lies in, now and whenever it changes. */
function watchParent(sheet: HTMLElement | null, report: (px: number) => void): (() => void) | undefined {
  const parent = sheet?.offsetParent ?? sheet?.parentElement;
  if (!parent || typeof ResizeObserver === 'undefined') return undefined;
  const observer = new ResizeObserver(() => parent.clientHeight > 0 && report(parent.clientHeight));
  observer.observe(parent);
  return () => observer.disconnect();
}

const styles = StyleSheet.create({
  window: { zIndex: 190, ...webStyle({ position: 'fixed' }) },
  scrim: { backgroundColor: color.scrim },
  sheet: {
    position: 'absolute',
    left: 0,
    right: 0,
    bottom: 0,
    maxWidth: 640,
    marginHorizontal: 'auto',
    backgroundColor: color.card,
    borderTopWidth: 2,
    boxShadow: '0 -6px 24px rgba(20, 32, 46, 0.12)',
    zIndex: 10,
  },
  moves: webStyle({ transition: `height ${motion.sheet}ms ease-out`, willChange: 'height' }),
  body: { flex: 1, minHeight: 0 },
  content: { paddingHorizontal: space.m, paddingBottom: space.m },
  foot: { paddingHorizontal: space.l, paddingVertical: space.m },
});
