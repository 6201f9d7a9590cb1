import type { ReactNode } from 'react';
import { Text as NativeText, StyleSheet, type StyleProp, type TextStyle } from 'react-native';

import { color, fontStack, typeRoles, type ColorName, type TypeRoleName } from './tokens';

export interface TextProps {
  readonly children: ReactNode;
  /** Type role; 'body' when left out. Inside another Text it is inherited unless given. */
  readonly kind?: TypeRoleName;
  /** Colour by job; 'ink' when left out, 'ink2' for `second` and `small`. */
  readonly tone?: ColorName;
  /** 1 to 6: makes it a heading of that level. */
  readonly level?: 1 | 2 | 3 | 4 | 5 | 6;
  readonly align?: 'left' | 'center' | 'right';
  /** px, where a role's size has to bend (a number on a blade). The line height follows. */
  readonly size?: number;
  /** Cut off with an ellipsis after so many lines. */
  readonly lines?: number;
  /** Digits of one width, for columns. */
  readonly tabular?: boolean;
  readonly id?: string;
  /** Only for the eye: the same is said to a screen reader elsewhere. */
  readonly hidden?: boolean;
  /** Read out when it changes. */
  readonly live?: 'polite' | 'assertive';
  readonly style?: StyleProp<TextStyle>;
  readonly testID?: string;
}

/** Every word on a screen. Margins are the parent's business. */
export function Text({
  children,
  kind = 'body',
  tone,
  level,
  align,
  size,
  lines,
  tabular,
  hidden,
  live,
  ...rest
}: TextProps) {
  const role = typeRoles[kind];
  const fallbackTone = kind === 'second' || kind === 'small' ? 'ink2' : 'ink';
  return (
    <NativeText
      id={rest.id}
      testID={rest.testID}
      role={level ? 'heading' : undefined}
      aria-level={level}
      aria-hidden={hidden}
      aria-live={live}
      numberOfLines={lines}
      style={[
        styles[kind],
        { color: color[tone ?? fallbackTone] },
        size !== undefined && { fontSize: size, lineHeight: Math.round((size * role.line) / role.size) },
        (tabular ?? role.tabular) && styles.tabular,
        align && { textAlign: align },
        rest.style,
      ]}
    >
      {children}
    </NativeText>
  );
}

/** Said by a screen reader, shown to nobody. */
export function HiddenText({ children, id, live }: Pick<TextProps, 'children' | 'id' | 'live'>) {
  return (
    <NativeText id={id} aria-live={live} style={styles.offScreen}>
      {children}
    </NativeText>
  );
}

const roleStyle = (name: TypeRoleName): TextStyle => ({
  fontFamily: fontStack(typeRoles[name].family),
  fontSize: typeRoles[name].size,
  lineHeight: typeRoles[name].line,
});

const roleNames = Object.keys(typeRoles) as TypeRoleName[];

const roleStyles = Object.fromEntries(roleNames.map((name) => [name, roleStyle(name)])) as Record<
  TypeRoleName,
  TextStyle
>;

const styles = StyleSheet.create({
  ...roleStyles,
  tabular: { fontVariant: ['tabular-nums'] },
  offScreen: { position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0.01 },
});
