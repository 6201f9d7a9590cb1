import type { ReactNode, Ref } from 'react';
import { Pressable, type PressableProps, type StyleProp, type View, type ViewStyle } from 'react-native';

import { webStyle } from './web-style';

export interface PressProps extends Omit<PressableProps, 'style' | 'children' | 'onPress' | 'disabled'> {
  readonly onPress?: () => void;
  /** Makes it a link; the address shows, and a middle click or Ctrl click opens it elsewhere. */
  readonly href?: string;
  readonly disabled?: boolean;
  readonly style?: StyleProp<ViewStyle>;
  /** Ground while the mouse is over it or it is held; none when left out. */
  readonly hoverGround?: string;
  readonly children?: ReactNode;
  readonly ref?: Ref<View>;
}

/** The one thing that can be pressed; buttons, rows and links are made of it. */
export function Press({ onPress, href, disabled, style, hoverGround, children, role, ...rest }: PressProps) {
  return (
    <Pressable
      {...rest}
      href={disabled ? undefined : href}
      role={role ?? (href ? undefined : 'button')}
      disabled={disabled}
      aria-disabled={disabled || undefined}
      onPress={(event) => {
        // The address is for reading, copying and opening elsewhere; here the router goes there.
        if (href) event.preventDefault();
        onPress?.();
      }}
      style={(state) => {
        const lit = (state as { readonly hovered?: boolean }).hovered || state.pressed;
        return [
          styles.base,
          style,
          lit && hoverGround ? { backgroundColor: hoverGround } : null,
          disabled && styles.off,
        ];
      }}
    >
      {children}
    </Pressable>
  );
}

const styles = {
  base: webStyle({ cursor: 'pointer', touchAction: 'manipulation', userSelect: 'none', textDecorationLine: 'none' }),
  off: webStyle({ cursor: 'default' }),
};
