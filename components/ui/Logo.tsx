import { View } from 'react-native';
import { Path, Svg } from 'react-native-svg';

import { Text } from './Text';
import { color, type ColorName } from './tokens';

/** px; smaller than this the arc and the square run together. */
const LEAST = 24;

export interface LogoProps {
  /** px, at least 24. */
  readonly size?: number;
  /** One ink for everything, for print and for a dark ground without colours. */
  readonly oneColour?: ColorName;
  /** Ink of the frame; the mark and the arc keep their colours. */
  readonly frame?: ColorName;
  /** Colours of the mark and the arc on a ground that stays dark in both themes. */
  readonly onDark?: boolean;
}

/** A room out of square: the square mark sits in the true corner, the arc in the one that is off. */
export function Logo({ size = 40, oneColour, frame = 'ink', onDark = false }: LogoProps) {
  const side = Math.max(size, LEAST);
  const frameInk = onDark ? '#F3EEE2' : color[oneColour ?? frame];
  const markInk = onDark ? '#86BDF7' : color[oneColour ?? 'chalk'];
  const arcInk = onDark ? '#FF8F78' : color[oneColour ?? 'red'];
  return (
    <Svg width={side} height={side} viewBox="1 0 46.5 47.5" aria-hidden>
      <Path d="M4 11.5L43.2 3.6 38 44.5H4z" fill="none" stroke={frameInk} strokeWidth={5} strokeLinejoin="miter" />
      <Path d="M6.5 31.5H16v10.5" fill="none" stroke={markInk} strokeWidth={4} />
      <Path d="M28.8 8.8C30.4 14.2 34.5 17.6 39 18.2" fill="none" stroke={arcInk} strokeWidth={4} />
    </Svg>
  );
}

/** The logo with its name and line, for sign-in and for papers. */
export function Wordmark({ size = 52, line = true }: { readonly size?: number; readonly line?: boolean }) {
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', gap: size * 0.4 }}>
      <Logo size={size} />
      <View>
        <Text kind="wordmark" level={1} size={size * 0.88}>
          Offsquare
        </Text>
        {line && <Text kind="second">{"Tops for rooms that aren't square."}</Text>}
      </View>
    </View>
  );
}
