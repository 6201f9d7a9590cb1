import { StyleSheet, View } from 'react-native';

import { Icon } from './Icon';
import type { IconName } from './icon-shapes';
import { Press } from './Press';
import { Text } from './Text';
import { color, radius, space, target, type ColorName } from './tokens';

export type ButtonLook = 'primary' | 'secondary' | 'danger' | 'ghost';

export interface ButtonProps {
  /** Says what will happen: "Tape wall A". */
  readonly label: string;
  readonly onPress?: () => void;
  /** Goes to an address instead; `onPress` should then navigate there. */
  readonly href?: string;
  /** primary (chalk, one a screen), secondary (outlined), danger (red outline), ghost (words only). */
  readonly look?: ButtonLook;
  readonly icon?: IconName;
  readonly iconAfter?: IconName;
  /** Something is being done: it cannot be pressed again, shows a clock and says so. Nothing turns round. */
  readonly busy?: boolean;
  /** Not possible yet: dashed outline. Give `describedBy` the id of the sentence that says why. */
  readonly disabled?: boolean;
  /** Takes the whole width. */
  readonly wide?: boolean;
  /** 48 is usual; 56 for the main act of a phone screen, 84 at the saw. Never under 44. */
  readonly height?: number;
  /** Read out instead of the label, when the label alone is too short to say what it is about. */
  readonly spoken?: string;
  readonly describedBy?: string;
  readonly expanded?: boolean;
  readonly pressed?: boolean;
  readonly testID?: string;
}

const inks: Readonly<Record<ButtonLook, ColorName>> = {
  primary: 'onchalk',
  secondary: 'ink',
  danger: 'red',
  ghost: 'chalk',
};

/** A button with words. 44 px or more, whatever is asked. */
export function Button(props: ButtonProps) {
  const { label, look = 'secondary', icon, iconAfter, busy = false, disabled = false, height = 48 } = props;
  const ink = disabled ? 'ink2' : inks[look];
  return (
    <Press
      onPress={props.onPress}
      href={props.href}
      disabled={disabled || busy}
      aria-busy={busy || undefined}
      aria-label={props.spoken}
      aria-describedby={props.describedBy}
      aria-expanded={props.expanded}
      aria-pressed={props.pressed}
      testID={props.testID}
      hoverGround={disabled || busy ? undefined : grounds[look]}
      style={[
        styles.base,
        { minHeight: Math.max(height, target.least) },
        styles[look],
        disabled && styles.disabled,
        props.wide && styles.wide,
      ]}
    >
      {(busy || icon) && <Icon name={busy || !icon ? 'clock' : icon} tone={ink} size={22} />}
      <View style={styles.words}>
        <Text kind="strong" tone={ink} size={height >= 56 ? 18 : 17} align="center">
          {label}
        </Text>
      </View>
      {iconAfter && <Icon name={iconAfter} tone={ink} size={22} />}
    </Press>
  );
}

const grounds: Readonly<Record<ButtonLook, string>> = {
  primary: color.chalkDeep,
  secondary: color.chalkT,
  danger: color.redT,
  ghost: color.chalkT,
};

const styles = StyleSheet.create({
  base: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: space.s + 2,
    paddingHorizontal: space.l,
    paddingVertical: space.s,
    borderRadius: radius.control,
    borderWidth: 1.5,
    borderColor: 'transparent',
  },
  words: { flexShrink: 1 },
  primary: { backgroundColor: color.chalk },
  secondary: { backgroundColor: color.card, borderColor: color.ink },
  danger: { backgroundColor: color.card, borderColor: color.red },
  ghost: {},
  disabled: { backgroundColor: 'transparent', borderColor: color.edge, borderStyle: 'dashed' },
  wide: { alignSelf: 'stretch', flexGrow: 1 },
});
