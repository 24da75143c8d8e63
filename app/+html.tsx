import { type PropsWithChildren } from 'react';
import { palettes } from '../components/ui/palette.data';
import { preloadedFonts, themeCss } from '../components/ui/theme-css';

/** The document around every pre-rendered page. Runs in Node at export only. */
export default function Html({ children }: PropsWithChildren) {
  return (
    <html lang="en">
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1, viewport-fit=cover" />
        <script src="/theme.js" />
        {preloadedFonts.map((file) => (
          <link key={file} rel="preload" href={file} as="font" type="font/woff2" crossOrigin="" />
        ))}
        <style dangerouslySetInnerHTML={{ __html: themeCss }} />
        <meta
          name="theme-color"
          media="(prefers-color-scheme: light)"
          content={palettes.day.film}
        />
        <meta
          name="theme-color"
          media="(prefers-color-scheme: dark)"
          content={palettes.night.film}
        />
        <link rel="icon" href="/icons/mark.v1.svg" type="image/svg+xml" />
        <link rel="icon" href="/icons/mark-32.v1.png" sizes="32x32" type="image/png" />
        <link rel="apple-touch-icon" href="/icons/mark-180.v1.png" />
        <link rel="manifest" href="/manifest.webmanifest" />
      </head>
      <body>{children}</body>
    </html>
  );
}
