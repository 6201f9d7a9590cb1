import type { CSSProperties } from 'react';
import type { ViewStyle } from 'react-native';

/** A style that only the web has (cursor, gradients, touch-action). react-native-web passes it on as it is. */
export const webStyle = (css: CSSProperties): ViewStyle => css as unknown as ViewStyle;
