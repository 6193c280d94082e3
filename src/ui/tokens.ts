/** Colours of the drawing: ink on drafting film, one warm hue for oxygen and one cool hue for water, nothing else. */
export interface Colors {
  ground: string;
  sheet: string;
  ink: string;
  inkSecond: string;
  inkThird: string;
  line: string;
  lineFaint: string;
  oxygen: string;
  oxygenTint: string;
  water: string;
  waterTint: string;
}

export type Scheme = 'light' | 'dark';

export const COLORS: Record<Scheme, Colors> = {
  light: {
    ground: '#EDF1EE',
    sheet: '#FAFCFA',
    ink: '#16201C',
    inkSecond: '#4E5C55',
    inkThird: '#58645E',
    line: '#C3CEC7',
    lineFaint: '#DDE5E0',
    oxygen: '#A8400C',
    oxygenTint: '#F6E6DC',
    water: '#1766A6',
    waterTint: '#DEEAF4',
  },
  dark: {
    ground: '#0E1412',
    sheet: '#161D1A',
    ink: '#E7EEEA',
    inkSecond: '#A9B7B0',
    inkThird: '#8D9B94',
    line: '#36433D',
    lineFaint: '#26302B',
    oxygen: '#F2935A',
    oxygenTint: '#33231A',
    water: '#6DB6F0',
    waterTint: '#182836',
  },
};

/** One file per weight, so a family name stands for a weight and fontWeight is never set beside it. */
export const FONT_FILES = {
  regular: 'SplineSans_400Regular',
  medium: 'SplineSans_500Medium',
  semibold: 'SplineSans_600SemiBold',
  mono: 'SplineSansMono_400Regular',
  monoMedium: 'SplineSansMono_500Medium',
} as const;

export type FontName = keyof typeof FONT_FILES;

export const FONTS: Record<FontName, string> = {
  regular: `${FONT_FILES.regular}, system-ui, sans-serif`,
  medium: `${FONT_FILES.medium}, system-ui, sans-serif`,
  semibold: `${FONT_FILES.semibold}, system-ui, sans-serif`,
  mono: `${FONT_FILES.mono}, ui-monospace, monospace`,
  monoMedium: `${FONT_FILES.monoMedium}, ui-monospace, monospace`,
};

/** Font sizes in px. */
export const SIZES = { label: 11, small: 12.5, body: 14.5, heading: 15, title: 21, display: 28 } as const;

export const TITLE_LINE_HEIGHT = 1.2;
export const TEXT_LINE_HEIGHT = 1.4;

/** Spacing in px, in fours. */
export const SPACE = { x1: 4, x2: 8, x3: 12, x4: 16, x5: 20, x6: 24, x8: 32, x10: 40, x12: 48 } as const;

export const RADIUS_PX = 2;
export const HAIRLINE_PX = 1;
/** The least a finger hits reliably, and the least height of a row. */
export const ROW_MIN_PX = 44;
/** From here on a side rail and panes side by side. */
export const WIDE_FROM_PX = 900;
/** Below this a table stacks its cells under their titles. */
export const TABLE_STACKS_BELOW_PX = 420;
