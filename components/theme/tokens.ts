/**
 * The names of the design's values. Colours are CSS variables, so that light and dark are one switch on the root
 * element (public/theme.css) and no component draws again when the theme changes.
 */
export type Part = 'rotor' | 'stator' | 'head' | 'stalk' | 'other';
export type Tone = 'ink' | 'soft' | 'faint' | 'inverse' | 'accent' | 'accentOn' | 'danger' | 'warn' | 'good';

export const color = {
  paper: 'var(--paper)',
  raised: 'var(--raised)',
  sunken: 'var(--sunken)',
  scrim: 'var(--scrim)',
  lineHair: 'var(--line-hair)',
  lineRule: 'var(--line-rule)',
  lineControl: 'var(--line-control)',
  lineFocus: 'var(--line-focus)',
  ink: 'var(--ink)',
  inkSoft: 'var(--ink-soft)',
  inkFaint: 'var(--ink-faint)',
  inkInverse: 'var(--ink-inverse)',
  accent: 'var(--accent)',
  accentPress: 'var(--accent-press)',
  accentSoft: 'var(--accent-soft)',
  accentOn: 'var(--accent-on)',
  danger: 'var(--danger)',
  dangerSoft: 'var(--danger-soft)',
  dangerOn: 'var(--danger-on)',
  warn: 'var(--warn)',
  warnSoft: 'var(--warn-soft)',
  warnOn: 'var(--warn-on)',
  good: 'var(--good)',
  goodSoft: 'var(--good-soft)',
  goodOn: 'var(--good-on)',
} as const;

/** The colour of words and icons, by what they mean. */
export const toneColor: Record<Tone, string> = {
  ink: color.ink,
  soft: color.inkSoft,
  faint: color.inkFaint,
  inverse: color.inkInverse,
  accent: color.accent,
  accentOn: color.accentOn,
  danger: color.danger,
  warn: color.warn,
  good: color.good,
};

/** The colours of one part of the motor: band, pale ground, and what may be written on the band. */
export const partColor = (part: Part) => ({
  strong: `var(--part-${part})`,
  soft: `var(--part-${part}-soft)`,
  on: `var(--part-${part}-on)`,
});

/** One of the five inks of conservation, 0 the palest. */
export const conservationColor = (step: 0 | 1 | 2 | 3 | 4): string => `var(--conservation-${step})`;

export const lift = {
  none: 'none',
  low: 'var(--lift-1)',
  float: 'var(--lift-2)',
  sheet: 'var(--lift-3)',
} as const;

export const radius = { none: 0, plate: 3, control: 4, dialog: 6, sheet: 12 } as const;
export const layer = { sticky: 10, rail: 20, popover: 40, sheet: 50, dialog: 60, toast: 70 } as const;

/** Fixed measures of the frame, in pixels. */
export const measure = {
  rail: 72,
  topBar: 56,
  bottomBar: 64,
  actionBar: 64,
  titleBlock: 34,
  contextStrip: 30,
  paneMin: 320,
  hit: 44,
} as const;
