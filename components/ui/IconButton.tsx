import { StyleSheet } from 'react-native';

import { Icon } from './Icon';
import type { IconName } from './icon-shapes';
import { Press } from './Press';
import { color, radius, target, type ColorName } from './tokens';
import { Tooltip } from './Tooltip';

export interface IconButtonProps {
  readonly icon: IconName;
  /** What it does, in words. Read out, and shown as a tooltip on wide screens. */
  readonly label: string;
  readonly onPress?: () => void;
  readonly href?: string;
  readonly disabled?: boolean;
  /** Outlined, like a secondary button; plain when left out. */
  readonly framed?: boolean;
  readonly tone?: ColorName;
  readonly pressed?: boolean;
  readonly expanded?: boolean;
  readonly testID?: string;
}

/** A 48 by 48 button with a sign and no words. */
export function IconButton({ icon, label, framed, tone = 'ink', disabled, ...rest }: IconButtonProps) {
  return (
    <Tooltip text={label}>
      <Press
        onPress={rest.onPress}
        href={rest.href}
        disabled={disabled}
        aria-label={label}
        aria-pressed={rest.pressed}
        aria-expanded={rest.expanded}
        testID={rest.testID}
        hoverGround={disabled ? undefined : color.chalkT}
        style={[
          styles.base,
          framed && styles.framed,
          framed && disabled && styles.disabled,
          rest.pressed && styles.pressed,
        ]}
      >
        <Icon name={icon} tone={disabled ? 'edge' : rest.pressed ? 'chalk' : tone} />
      </Press>
    </Tooltip>
  );
}

const styles = StyleSheet.create({
  base: {
    width: target.icon,
    height: target.icon,
    alignItems: 'center',
    justifyContent: 'center',
    borderRadius: radius.control,
  },
  framed: { borderWidth: 1.5, borderColor: color.ink, backgroundColor: color.card },
  disabled: { borderStyle: 'dashed', borderColor: color.edge },
  pressed: { backgroundColor: color.chalkT },
});
