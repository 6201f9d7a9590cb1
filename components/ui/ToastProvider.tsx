import { createContext, useCallback, useContext, useEffect, useMemo, useRef, useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { Icon } from './Icon';
import { IconButton } from './IconButton';
import { Press } from './Press';
import { Text } from './Text';
import { color, radius, space } from './tokens';
import { webStyle } from './web-style';

export interface Toast {
  /** "Undid wall C, 84 3/4" */
  readonly text: string;
  readonly action?: { readonly label: string; readonly onPress: () => void };
  /** A failure stays until it is closed. */
  readonly tone?: 'plain' | 'failure';
}

export type ShowToast = (toast: Toast) => void;

const ToastContext = createContext<ShowToast>(() => undefined);

/** Shows a short message at the foot of the screen and has it read out. */
export const useToast = (): ShowToast => useContext(ToastContext);

/** ms a plain toast stays; longer while the mouse or the focus is on it. */
const STAYS = 6000;

interface Shown extends Toast {
  readonly key: number;
}

/** Holds at most the last two toasts. */
export function ToastProvider({ children }: { readonly children: ReactNode }) {
  const [shown, setShown] = useState<readonly Shown[]>([]);
  const count = useRef(0);
  const show = useCallback<ShowToast>((toast) => {
    const key = ++count.current;
    setShown((now) => [...now, { ...toast, key }].slice(-2));
  }, []);
  const close = useCallback((key: number) => setShown((now) => now.filter((toast) => toast.key !== key)), []);
  const lines = useMemo(
    () => shown.map((toast) => <ToastLine key={toast.key} toast={toast} onClose={close} />),
    [shown, close],
  );
  return (
    <ToastContext.Provider value={show}>
      {children}
      <View role="status" aria-live="polite" style={[styles.stack, styles.fixed]}>
        {lines}
      </View>
    </ToastContext.Provider>
  );
}

function ToastLine({ toast, onClose }: { readonly toast: Shown; readonly onClose: (key: number) => void }) {
  const [held, setHeld] = useState(false);
  const failed = toast.tone === 'failure';
  useEffect(() => {
    if (held || failed) return;
    const timer = setTimeout(() => onClose(toast.key), STAYS);
    return () => clearTimeout(timer);
  }, [held, failed, onClose, toast.key]);
  return (
    <View
      onMouseEnter={() => setHeld(true)}
      onMouseLeave={() => setHeld(false)}
      onFocus={() => setHeld(true)}
      onBlur={() => setHeld(false)}
      style={[styles.toast, failed && styles.failed]}
    >
      {failed && <Icon name="warn" tone="red" size={20} />}
      <View style={styles.words}>
        <Text kind="second" tone={failed ? 'ink' : 'paper'}>
          {toast.text}
        </Text>
      </View>
      {toast.action && (
        <Press
          onPress={() => {
            toast.action?.onPress();
            onClose(toast.key);
          }}
          style={styles.action}
        >
          <Text kind="label" tone={failed ? 'chalk' : 'paper'} style={styles.underlined}>
            {toast.action.label}
          </Text>
        </Press>
      )}
      {failed && <IconButton icon="close" label="Close message" onPress={() => onClose(toast.key)} />}
    </View>
  );
}

const styles = StyleSheet.create({
  stack: {
    left: 0,
    right: 0,
    alignItems: 'center',
    gap: space.s,
    paddingHorizontal: space.l,
    zIndex: 300,
    pointerEvents: 'box-none',
  },
  // Above the primary buttons at the foot of a phone and the steps under them.
  fixed: webStyle({ position: 'fixed', bottom: 'calc(160px + env(safe-area-inset-bottom, 0px))' }),
  toast: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    maxWidth: 520,
    minHeight: 48,
    paddingHorizontal: space.l,
    paddingVertical: space.xs,
    borderRadius: radius.control,
    backgroundColor: color.ink,
    pointerEvents: 'auto',
  },
  failed: { backgroundColor: color.redT, borderWidth: 1.5, borderColor: color.red },
  words: { flexShrink: 1 },
  action: { minHeight: 44, minWidth: 44, justifyContent: 'center', alignItems: 'center' },
  underlined: { textDecorationLine: 'underline' },
});
