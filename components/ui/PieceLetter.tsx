import { StyleSheet, View } from 'react-native';

import { Text } from './Text';
import { color } from './tokens';

export interface PieceLetterProps {
  readonly letter: string;
  /** Show face underneath: a dark square instead of a ring. */
  readonly faceDown?: boolean;
  /** px */
  readonly size?: number;
}

/** The letter of a piece as it stands on drawings and sheets. */
export function PieceLetter({ letter, faceDown = false, size = 24 }: PieceLetterProps) {
  return (
    <View
      role="img"
      aria-label={faceDown ? `${letter}, face down` : letter}
      style={[
        styles.base,
        { minWidth: size, height: size },
        faceDown ? styles.square : [styles.ring, { borderRadius: size / 2 }],
      ]}
    >
      <Text kind="rowTitle" size={size * 0.66} tone={faceDown ? 'paper' : 'ink'} hidden>
        {letter}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  base: { alignItems: 'center', justifyContent: 'center', paddingHorizontal: 3 },
  ring: { borderWidth: 1.5, borderColor: color.ink, backgroundColor: color.card },
  square: { backgroundColor: color.ink },
});
