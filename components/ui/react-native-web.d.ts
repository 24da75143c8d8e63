/** What React Native Web accepts beyond React Native's own types. */
import { type KeyboardEvent, type MouseEvent } from 'react';

interface WebProps {
  /** Becomes data-* attributes; the style sheet in theme-css.ts hangs on them. */
  dataSet?: Record<string, string | undefined>;
  href?: string;
  hrefAttrs?: { rel?: string; target?: string; download?: string };
  lang?: string;
  onKeyDown?: (event: KeyboardEvent<HTMLElement>) => void;
  onKeyUp?: (event: KeyboardEvent<HTMLElement>) => void;
  onClick?: (event: MouseEvent<HTMLElement>) => void;
  inert?: boolean;
}

declare module 'react-native' {
  interface ViewProps extends WebProps {
    onMouseEnter?: (event: MouseEvent<HTMLElement>) => void;
    onMouseLeave?: (event: MouseEvent<HTMLElement>) => void;
  }
  interface TextProps extends WebProps {
    tabIndex?: 0 | -1;
  }
  interface TextInputProps {
    rows?: number;
  }
  interface PressableStateCallbackType {
    readonly hovered?: boolean;
    readonly focused?: boolean;
  }
}
