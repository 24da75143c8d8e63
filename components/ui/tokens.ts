import { Platform } from 'react-native';
import { palettes, type ColourRole } from './palette.data';

export { type ColourRole, type ThemeName } from './palette.data';

const roles = Object.keys(palettes.day) as ColourRole[];

/**
 * Every colour role as a value to put in a style. On the web it is `var(--role)`, so a theme is a
 * change of variables and no component renders again; elsewhere it is the day value.
 */
export const colour = Object.fromEntries(
  roles.map((role) => [role, Platform.OS === 'web' ? `var(--${role})` : palettes.day[role]]),
) as Record<ColourRole, string>;

/** Families with fallbacks whose digits are tabular as well. */
export const font = {
  text: "'Atkinson Hyperlegible Next', system-ui, sans-serif",
  figures: "'Atkinson Hyperlegible Mono', ui-monospace, monospace",
} as const;

/** Size and line height in px by name; `tight` is the letter-spacing in em. */
export const typeScale = {
  small: { size: 13, line: 18, tight: 0 },
  note: { size: 15, line: 22, tight: 0 },
  body: { size: 17, line: 25, tight: 0 },
  lead: { size: 20, line: 27, tight: 0 },
  heading: { size: 25, line: 31, tight: -0.005 },
  title: { size: 32, line: 37, tight: -0.01 },
  bench: { size: 40, line: 44, tight: -0.012 },
  figure: { size: 72, line: 76, tight: -0.012 },
} as const;
export type TypeSize = keyof typeof typeScale;

/** Spacing in px: 4 8 12 16 24 32 48, by step 1–7. */
export const space = { s4: 4, s8: 8, s12: 12, s16: 16, s24: 24, s32: 32, s48: 48 } as const;

/** Line weights: rows and extension lines, objects and frames, the current place. */
export const line = { thin: 1, medium: 1.5, thick: 2.5 } as const;

export const radius = { control: 2, tag: 1, none: 0 } as const;

/** Durations in ms; with reduced motion the style sheet sets every one to 0. */
export const motion = { fast: 90, normal: 160, easing: 'ease-out' } as const;

/** Least heights of what is pressed, in px. */
export const touch = { min: 48, bench: 56, benchPrimary: 64, mouseSmall: 36 } as const;

export const layer = { base: 0, bar: 10, dialog: 20, toast: 30 } as const;

/** Widths where the layout changes, in px. */
export const breakpoint = { phone: 640, wide: 1024 } as const;

/** Prose runs to 66 characters at most. */
export const proseWidth = 620;
