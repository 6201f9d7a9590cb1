import { StyleSheet, View } from 'react-native';
import { Path, Svg } from 'react-native-svg';

import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color } from '../ui/tokens';

/** Within this many degrees of 90 a corner counts as square. */
const SQUARE_WITHIN = 0.1;

export interface CornerBadgeProps {
  /** Which corner: "A-B". Read out before the angle. */
  readonly corner: string;
  /** Interior angle in degrees; null while unchecked. */
  readonly angleDeg: number | null;
  /** What it was meant to be; 90 when left out. */
  readonly nominalDeg?: number;
  /** It disagrees with the rest. */
  readonly retake?: boolean;
  readonly onPress?: () => void;
  readonly testID?: string;
}

const WIDTH = 72;
const HEIGHT = 44;
const CLIP = 10;

/** A tag with one clipped corner that says how far a corner is off. */
export function CornerBadge({ corner, angleDeg, nominalDeg = 90, retake = false, onPress, testID }: CornerBadgeProps) {
  const look = retake ? looks.retake : angleDeg === null ? looks.unchecked : looks.checked;
  const word = retake ? 're-take' : angleDeg === null ? 'check' : cornerWord(angleDeg, nominalDeg);
  const number = angleDeg === null ? '?' : `${angleDeg.toFixed(1)}°`;
  const spoken = `Corner ${corner}, ${angleDeg === null ? 'not checked' : `${angleDeg.toFixed(1)} degrees, ${word}`}`;
  const body = (
    <>
      <Svg width={WIDTH} height={HEIGHT} style={StyleSheet.absoluteFill} aria-hidden>
        <Path
          d={`M1 1H${WIDTH - 1}V${HEIGHT - CLIP}L${WIDTH - CLIP} ${HEIGHT - 1}H1z`}
          fill={color[look.ground]}
          stroke={color[look.frame]}
          strokeWidth={retake ? 2 : 1.6}
          strokeDasharray={look.dash}
        />
      </Svg>
      <Text kind="number" size={16} tone={look.ink} hidden style={styles.tight}>
        {number}
      </Text>
      <Text kind="label" size={14} tone={look.ink} hidden style={styles.tight}>
        {word}
      </Text>
    </>
  );
  if (!onPress) {
    return (
      <View style={styles.badge} role="img" aria-label={spoken} testID={testID}>
        {body}
      </View>
    );
  }
  return (
    <Press onPress={onPress} style={styles.badge} aria-label={spoken} testID={testID}>
      {body}
    </Press>
  );
}

/** "open 0.9", "tight 1.3" or "square": open means more than meant, tight less. */
export function cornerWord(angleDeg: number, nominalDeg: number): string {
  const off = Math.round((angleDeg - nominalDeg) * 10) / 10;
  if (Math.abs(off) <= SQUARE_WITHIN + 1e-9) return nominalDeg === 90 ? 'square' : 'true';
  return `${off > 0 ? 'open' : 'tight'} ${Math.abs(off).toFixed(1)}`;
}

const looks = {
  checked: { ground: 'card', frame: 'ink', ink: 'ink', dash: undefined },
  unchecked: { ground: 'card', frame: 'ink2', ink: 'ink2', dash: '5 4' },
  retake: { ground: 'redT', frame: 'red', ink: 'red', dash: undefined },
} as const;

const styles = StyleSheet.create({
  badge: { width: WIDTH, height: HEIGHT, alignItems: 'center', justifyContent: 'center', paddingBottom: 1 },
  tight: { lineHeight: 18 },
});
