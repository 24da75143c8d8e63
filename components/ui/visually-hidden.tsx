import { type ReactNode } from 'react';
import { Text as RawText, type TextProps } from 'react-native';
import { webStyle } from './web-style';

/** Text for screen readers only. `selectable` is off so that copying a line takes what is drawn. */
export function VisuallyHidden({ children, ...rest }: TextProps & { children: ReactNode }) {
  return (
    <RawText {...rest} style={hidden}>
      {children}
    </RawText>
  );
}

const hidden = webStyle({
  position: 'absolute',
  width: 1,
  height: 1,
  margin: -1,
  overflow: 'hidden',
  clipPath: 'inset(50%)',
  whiteSpace: 'nowrap',
  userSelect: 'none',
});
