import { Path, Svg } from 'react-native-svg';

import { iconShapes, type IconName, type IconShape } from './icon-shapes';
import { color, type ColorName } from './tokens';

export interface IconProps {
  readonly name: IconName;
  /** px, 24 when left out. */
  readonly size?: number;
  readonly tone?: ColorName;
}

/** A drawn sign. It is never read out: the button or the words beside it carry the name. */
export function Icon({ name, size = 24, tone = 'ink' }: IconProps) {
  const shape: IconShape = iconShapes[name];
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" aria-hidden style={{ flexShrink: 0 }}>
      {shape.lines && (
        <Path
          d={shape.lines}
          fill="none"
          stroke={color[tone]}
          strokeWidth={2}
          strokeLinejoin="miter"
          strokeLinecap="butt"
        />
      )}
      {shape.solid && <Path d={shape.solid} fill={color[tone]} fillRule="evenodd" />}
    </Svg>
  );
}
