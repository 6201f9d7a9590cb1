import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Text } from './Text';
import { color, radius } from './tokens';
import { useWide } from './use-wide';
import { webStyle } from './web-style';

export interface TooltipProps {
  /** The accessible name of what is inside; never more than that, as touch does not show it. */
  readonly text: string;
  readonly children: ReactNode;
}

/** Shows a sign's name beside it on wide screens, on hover and on keyboard focus. Escape puts it away. */
export function Tooltip({ text, children }: TooltipProps) {
  const wide = useWide();
  const [shown, setShown] = useState(false);
  return (
    <View
      style={styles.anchor}
      onMouseEnter={() => setShown(true)}
      onMouseLeave={() => setShown(false)}
      onFocus={(event) => setShown((event.target as unknown as HTMLElement).matches(':focus-visible'))}
      onBlur={() => setShown(false)}
      onKeyDown={(event) => event.key === 'Escape' && setShown(false)}
    >
      {children}
      {wide && shown && (
        <View style={[styles.bubble, styles.over]} aria-hidden>
          <Text kind="labelSmall" tone="paper" lines={1}>
            {text}
          </Text>
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  anchor: { position: 'relative' },
  bubble: {
    position: 'absolute',
    top: '100%',
    left: '50%',
    marginTop: 4,
    paddingVertical: 4,
    paddingHorizontal: 8,
    borderRadius: radius.control,
    backgroundColor: color.ink,
    zIndex: 50,
  },
  over: webStyle({ transform: 'translateX(-50%)', width: 'max-content', maxWidth: 240, pointerEvents: 'none' }),
});
