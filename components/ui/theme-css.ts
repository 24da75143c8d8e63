import { palettes, type Palette } from './palette.data';
import { breakpoint } from './tokens';

const faces = [
  ['Atkinson Hyperlegible Next', 400, 'normal', 'atkinson-hyperlegible-next-400'],
  ['Atkinson Hyperlegible Next', 600, 'normal', 'atkinson-hyperlegible-next-600'],
  ['Atkinson Hyperlegible Next', 700, 'normal', 'atkinson-hyperlegible-next-700'],
  ['Atkinson Hyperlegible Next', 400, 'italic', 'atkinson-hyperlegible-next-400-italic'],
  ['Atkinson Hyperlegible Mono', 400, 'normal', 'atkinson-hyperlegible-mono-400'],
  ['Atkinson Hyperlegible Mono', 600, 'normal', 'atkinson-hyperlegible-mono-600'],
  ['Atkinson Hyperlegible Mono', 700, 'normal', 'atkinson-hyperlegible-mono-700'],
] as const;

/** File names carry a version, so they may be cached for good: raise it when a file changes. */
const fontFile = (name: string) => `/fonts/${name}.v1.woff2`;

/** The two files every page uses first. */
export const preloadedFonts = [
  fontFile('atkinson-hyperlegible-next-400'),
  fontFile('atkinson-hyperlegible-next-700'),
];

const fontFaces = faces
  .map(
    ([family, weight, style, name]) =>
      `@font-face{font-family:'${family}';font-weight:${weight};font-style:${style};` +
      `font-display:swap;src:url(${fontFile(name)}) format('woff2')}`,
  )
  .join('\n');

const variables = (palette: Record<keyof Palette, string>) =>
  Object.entries(palette)
    .map(([role, value]) => `--${role}:${value}`)
    .join(';');

const day = `${variables(palettes.day)};color-scheme:light`;
const night = `${variables(palettes.night)};color-scheme:dark`;

/* `data-theme` on the root is the person's choice (set by /theme.js before the first paint); on any
   other element it makes a sample in that theme. Without it the system decides. */
const themes = `
:root,[data-theme="day"]{${day}}
@media (prefers-color-scheme:dark){:root:not([data-theme="day"]){${night}}}
[data-theme="night"]{${night}}
[data-theme]:not(html){background-color:var(--film) !important;color:var(--ink)}`;

const base = `
*,*::before,*::after{box-sizing:border-box}
html,body{background:var(--film);color:var(--ink)}
html{-webkit-text-size-adjust:100%;text-size-adjust:100%}
body{margin:0;font-family:'Atkinson Hyperlegible Next',system-ui,sans-serif;font-size:17px;line-height:25px;
font-variant-numeric:tabular-nums;-webkit-font-smoothing:antialiased;-moz-osx-font-smoothing:grayscale;overflow-wrap:anywhere}
svg{display:block;flex:none}
::placeholder{color:var(--ink3);opacity:1}
:focus{outline:none}
:focus-visible,[data-focus="yes"]{outline:2.5px solid var(--focus) !important;outline-offset:2px}
[data-focus-inside]:focus-visible,[data-focus-inside][data-focus="yes"]{outline-offset:-2.5px}
[tabindex="-1"]:focus-visible:not(button):not(a):not(input):not([role]){outline:none !important}
[data-control]:focus-within{outline:2.5px solid var(--focus);outline-offset:-2.5px}
[data-control] input:focus-visible,[data-control] textarea:focus-visible,[data-control] select:focus-visible{outline:none !important}
@media (pointer:coarse){[data-small="yes"],[data-small="square"]{min-height:48px !important}[data-small="square"]{min-width:48px !important}}
h1:focus-visible{outline:none !important}
@media (prefers-reduced-motion:reduce){*,*::before,*::after{animation:none !important;transition:none !important;scroll-behavior:auto !important}}
@media (forced-colors:active){svg [stroke]{stroke:CanvasText}}`;

/* Layout that depends on the width is here and not in script, so the first paint is right. */
const widths = `
@media (max-width:${breakpoint.wide - 0.02}px){[data-show="wide"]{display:none !important}}
@media (min-width:${breakpoint.wide}px){[data-show="below-wide"]{display:none !important}}
@media (max-width:${breakpoint.phone - 0.02}px){[data-show="above-phone"]{display:none !important}}
@media (min-width:${breakpoint.phone}px){[data-show="phone"]{display:none !important}}
@media print{[data-show]:not([data-show="print"]),[data-print="no"]{display:none !important}}
@media screen{[data-show="print"]{display:none !important}}`;

const frames = `
[data-skip-link]{position:absolute;left:16px;top:-100px;z-index:30;padding:12px 18px;background:var(--blue);color:var(--onBlue);font-weight:600}
[data-skip-link]:focus{top:8px}
#root{min-height:100vh;min-height:100dvh;display:flex;flex-direction:column}
[data-rail="full"],[data-rail="narrow"]{position:sticky !important;top:0;height:100vh;height:100dvh;flex:none !important}
[data-rail="full"]{width:200px}
[data-rail="narrow"]{width:56px}
[data-rail="narrow"] [data-rail="words"]{position:absolute !important;width:1px;height:1px;overflow:hidden;clip-path:inset(50%)}
[data-rail="link"]:hover{background-color:var(--well) !important}
@media (max-width:${breakpoint.wide - 0.02}px){[data-rail="full"]{width:56px}[data-rail="link"]{min-height:48px !important}
[data-rail="full"] [data-rail="words"]{position:absolute !important;width:1px;height:1px;overflow:hidden;clip-path:inset(50%)}}
@media (max-width:${breakpoint.phone - 0.02}px){[data-rail="full"],[data-rail="narrow"]{display:none !important}}
[data-page]{padding:16px 16px 32px !important}
@media (max-width:${breakpoint.phone - 0.02}px){[data-page]>[data-show="phone"]:first-of-type{margin:-16px -16px 0 !important}}
@media (min-width:${breakpoint.phone}px){[data-page]{padding:20px 28px 40px !important}}
[data-pane="aside"]{border-top:1.5px solid var(--ink) !important}
[data-head]{padding:16px 16px 0 !important}
[data-page] [data-head]{padding:0 !important}
@media (min-width:${breakpoint.phone}px){[data-head]{padding:20px 28px 0 !important}}
[data-panes="work"]>[data-pane]{border-top:1px solid var(--ink) !important}
[data-press]{cursor:pointer}
[data-press]:hover{background-color:var(--well) !important}
@media (min-width:${breakpoint.wide}px){
[data-panes="yes"]{flex-direction:row !important;align-items:stretch !important}
[data-pane="content"]{flex:1 1 0px !important}
[data-pane="aside"]{flex:0 0 var(--aside) !important;border-top:0 !important;border-left:1.5px solid var(--ink) !important;
position:sticky !important;top:0;height:100vh;height:100dvh;overflow-y:auto}
[data-panes="work"]{flex-direction:row !important;height:calc(100vh - var(--below));height:calc(100dvh - var(--below))}
[data-panes="work"]>[data-pane]{flex:var(--pane) !important;min-width:0;overflow-y:auto;border-top:0 !important}
[data-panes="work"]>[data-pane]+[data-pane]{border-left:1.5px solid var(--ink) !important}
}`;

/** A table becomes stacked rows on a phone: each cell says its column's name. */
const tables = `
@media (max-width:${breakpoint.phone - 0.02}px){
[data-table="stack"]{display:block !important}
[data-table="stack"] [data-part="head"]{position:absolute !important;width:1px;height:1px;overflow:hidden;clip-path:inset(50%)}
[data-table="stack"] [data-part="row"]{display:block !important;padding:8px 0}
[data-table="stack"] [data-part="cell"]{display:flex !important;flex-direction:row !important;justify-content:space-between !important;
align-items:baseline;gap:16px;padding:3px 0 3px 8px !important;border:0 !important;text-align:right}
[data-table="stack"] [data-part="cell"][data-first="yes"]{justify-content:flex-start !important;text-align:left}
}
@media (min-width:${breakpoint.phone}px){[data-table="stack"] [data-part="label"]{display:none !important}}`;

/** The style sheet of the whole application, put into the page's head by app/+html.tsx. */
export const themeCss = [fontFaces, themes, base, frames, widths, tables].join('\n');
