import { useId, useRef, type ReactNode } from 'react';
import { createPortal } from 'react-dom';
import { ScrollView, StyleSheet, View } from 'react-native';

import { useBackCloses } from './back-layers';
import { useFocusTrap } from './focus-trap';
import { IconButton } from './IconButton';
import { Text } from './Text';
import { color, radius, space } from './tokens';
import { webStyle } from './web-style';

export interface DialogProps {
  readonly open: boolean;
  readonly title: string;
  /** Escape, Back, the cross, or a click beside it. */
  readonly onClose: () => void;
  readonly children: ReactNode;
  /** Buttons, the primary one last. */
  readonly actions?: ReactNode;
  /** px */
  readonly width?: number;
}

/** A question or a short form over the page. The focus stays inside and goes back where it was. */
export function Dialog(props: DialogProps) {
  return props.open ? createPortal(<OpenDialog {...props} />, document.body) : null;
}

function OpenDialog({ title, onClose, children, actions, width = 480 }: DialogProps) {
  const card = useRef<View>(null);
  const titleId = useId();
  useFocusTrap(card, true);
  useBackCloses(true, onClose);
  return (
    <View style={[styles.cover, styles.fixed]}>
      <View style={styles.scrim} onClick={onClose} aria-hidden />
      <View
        ref={card}
        role="dialog"
        aria-modal
        aria-labelledby={titleId}
        tabIndex={-1}
        dataSet={{ ring: 'none' }}
        onKeyDown={(event) => {
          if (event.key !== 'Escape') return;
          event.stopPropagation();
          onClose();
        }}
        style={[styles.card, { maxWidth: width }]}
      >
        <View style={styles.head}>
          <View style={styles.title}>
            <Text kind="sheetTitle" level={2} id={titleId}>
              {title}
            </Text>
          </View>
          <IconButton icon="close" label="Close" onPress={onClose} />
        </View>
        <ScrollView style={styles.body} contentContainerStyle={styles.content}>
          {children}
        </ScrollView>
        {actions && <View style={styles.actions}>{actions}</View>}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  cover: { inset: 0, alignItems: 'center', justifyContent: 'center', padding: space.l, zIndex: 200 },
  fixed: webStyle({ position: 'fixed' }),
  scrim: { ...StyleSheet.absoluteFill, backgroundColor: color.scrim },
  card: { width: '100%', maxHeight: '100%', backgroundColor: color.card, borderRadius: radius.card },
  head: {
    flexDirection: 'row',
    alignItems: 'center',
    paddingLeft: space.l,
    paddingRight: space.s,
    paddingTop: space.s,
  },
  title: { flex: 1 },
  body: { flexShrink: 1 },
  content: { paddingHorizontal: space.l, paddingBottom: space.l, gap: space.m },
  actions: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    justifyContent: 'flex-end',
    gap: space.s,
    padding: space.l,
    borderTopWidth: 1,
    borderTopColor: color.line,
  },
});
