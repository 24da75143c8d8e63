import { Link as RouterLink, type Href } from 'expo-router';
import { type ReactNode } from 'react';
import { Text as RawText } from 'react-native';
import { textStyle, useInsideText, type TextStyleProps } from './text';
import { colour } from './tokens';
import { VisuallyHidden } from './visually-hidden';
import { webStyle } from './web-style';

export interface LinkProps extends Omit<TextStyleProps, 'tone'> {
  /** A route (`/plans/shooting-board`), or an address with https:, http: or mailto:. */
  href: string;
  children: ReactNode;
  /** `ink` on coloured grounds. */
  tone?: 'blue' | 'ink';
  /** Accessible name where the words alone don't say where it goes. */
  label?: string;
  /** Saves the file instead of opening it. */
  download?: boolean | string;
  replace?: boolean;
}

/** Outside addresses and files of the server are plain anchors; everything else goes through the router. */
const isExternal = (href: string) => /^(https?:|mailto:)/i.test(href);

/** A link in running text. An outside one opens a new tab and says so. */
export function Link({
  href,
  children,
  tone = 'blue',
  label,
  download,
  replace,
  ...text
}: LinkProps) {
  const inside = useInsideText();
  const own = textStyle(inside ? text : { size: 'body', ...text });
  const style = [own, look, { color: colour[tone] }, inside && !text.mono && inherit];
  if (download !== undefined || href.startsWith('/api/') || isExternal(href)) {
    const newTab = isExternal(href) && !/^mailto:/i.test(href);
    const file = download === true ? '' : download === false ? undefined : download;
    return (
      <RawText
        href={href}
        hrefAttrs={newTab ? { target: '_blank', rel: 'noopener noreferrer' } : { download: file }}
        aria-label={label}
        style={style}
      >
        {children}
        {newTab ? <VisuallyHidden>{'\u00a0(opens in a new tab)'}</VisuallyHidden> : null}
      </RawText>
    );
  }
  return (
    <RouterLink href={href as Href} replace={replace} aria-label={label} style={style}>
      {children}
    </RouterLink>
  );
}

const inherit = webStyle({ fontFamily: 'inherit' });

const look = webStyle({
  textDecorationLine: 'underline',
  textUnderlineOffset: 3,
  textDecorationThickness: 1,
  cursor: 'pointer',
});
