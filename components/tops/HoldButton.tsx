import { useEffect, useRef, useState } from 'react';
import { StyleSheet } from 'react-native';

import { Icon } from '../ui/Icon';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, radius, space } from '../ui/tokens';

export interface HoldButtonProps {
  readonly label: string;
  readonly disabled?: boolean;
  /** True while it is held, by a finger, the mouse, or the space bar. */
  readonly onHold: (held: boolean) => void;
}

/** Something is so only while this is held down. */
export function HoldButton({ label, disabled, onHold }: HoldButtonProps) {
  const [held, setHeld] = useState(false);
  const latest = useRef(onHold);
  useEffect(() => {
    latest.current = onHold;
  });
  const hold = (next: boolean) => {
    if (next === held || disabled) return;
    setHeld(next);
    latest.current(next);
  };
  // Taken away while held, it lets go.
  useEffect(() => () => latest.current(false), []);
  const isKey = (key: string) => key === ' ' || key === 'Enter';
  const holdByKey = () => {
    hold(true);
    const letGo = (event: KeyboardEvent) => {
      if (!isKey(event.key)) return;
      document.removeEventListener('keyup', letGo);
      setHeld(false);
      latest.current(false);
    };
    document.addEventListener('keyup', letGo);
  };
  return (
    <Press
      disabled={disabled}
      aria-pressed={held}
      onPressIn={() => hold(true)}
      onPressOut={() => hold(false)}
      onBlur={() => hold(false)}
      onKeyDown={(event) => {
        if (!isKey(event.key)) return;
        event.preventDefault();
        if (!event.repeat) holdByKey();
      }}
      style={[styles.button, held && styles.held, disabled && styles.off]}
    >
      <Icon name="eye" tone={disabled ? 'ink2' : held ? 'chalk' : 'ink'} />
      <Text kind="strong" tone={disabled ? 'ink2' : held ? 'chalk' : 'ink'}>
        {label}
      </Text>
    </Press>
  );
}

const styles = StyleSheet.create({
  button: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: space.s,
    minHeight: 56,
    paddingHorizontal: space.l,
    borderWidth: 1.5,
    borderColor: color.ink,
    borderRadius: radius.control,
    backgroundColor: color.card,
  },
  held: { borderColor: color.chalk, backgroundColor: color.chalkT },
  off: { borderStyle: 'dashed', borderColor: color.edge, backgroundColor: 'transparent' },
});
