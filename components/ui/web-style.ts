import { type CSSProperties } from 'react';
import { type ViewStyle } from 'react-native';

/**
 * CSS that React Native has no type for (grid, position: sticky, cursor, outline). React Native
 * Web passes it on; elsewhere it is ignored. Also fits where a TextStyle is wanted.
 */
export function webStyle(style: CSSProperties): ViewStyle {
  return style as unknown as ViewStyle;
}
