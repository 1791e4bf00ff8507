import type { ThemeChoice } from '@/shared/user';

/** The looks that are drawn; `system` is a choice that becomes light or dark. */
export type ThemeName = Exclude<ThemeChoice, 'system'>;

/**
 * Colours of the light theme. Red, orange, yellow and green appear only with
 * their ANSI Z535 meaning; blue is everything that can be pressed and nothing else.
 */
const light = {
  /** Ground of every page. */
  paper: '#F6F1E6',
  /** Inside of a control. */
  field: '#FFFDF8',
  /** A row that is chosen or still open, and an unused cell. */
  tone: '#ECE5D5',
  ink: '#1B1916',
  ink2: '#494339',
  hair: '#CFC6B3',
  blue: '#0A4A94',
  onBlue: '#FFFFFF',
  red: '#A6081C',
  onRed: '#FFFFFF',
  redTone: '#F7E3DC',
  redText: '#960518',
  yellow: '#FFCF1A',
  onYellow: '#1B1916',
  green: '#005A35',
  onGreen: '#FFFFFF',
  /** Hatch of the restricted zone. */
  zRed: '#B00A20',
  /** Hatch of the limited and the arc flash zones. */
  zOrange: '#C25700',
};

export type Colors = Readonly<typeof light>;
export type ColorName = keyof Colors;

const dark: Colors = {
  paper: '#15130F',
  field: '#211E18',
  tone: '#2A261F',
  ink: '#F4EEE1',
  ink2: '#CBC2B0',
  hair: '#4B453A',
  blue: '#A5CBFA',
  onBlue: '#0B1B30',
  red: '#AE0A1F',
  onRed: '#FFFFFF',
  redTone: '#341614',
  redText: '#FF9F98',
  yellow: '#FFCF1A',
  onYellow: '#1B1916',
  green: '#7FD3A4',
  onGreen: '#0A1F14',
  zRed: '#FF6B62',
  zOrange: '#FF9A3D',
};

const sunlight: Colors = {
  paper: '#FFFFFF',
  field: '#FFFFFF',
  tone: '#FFFFFF',
  ink: '#000000',
  ink2: '#000000',
  hair: '#000000',
  blue: '#00338A',
  onBlue: '#FFFFFF',
  red: '#8F0012',
  onRed: '#FFFFFF',
  redTone: '#FFFFFF',
  redText: '#8F0012',
  yellow: '#FFCF1A',
  onYellow: '#000000',
  green: '#00502F',
  onGreen: '#FFFFFF',
  zRed: '#8F0012',
  zOrange: '#A34400',
};

export const themes: Readonly<Record<ThemeName, Colors>> = { light, dark, sunlight };

/** Steps of the unit 4, in px. */
export const space = { xxs: 4, xs: 8, sm: 12, md: 16, lg: 20, xl: 28, xxl: 40 } as const;

/** Line weights in px: heavy red over a stop, strong ink, middle around a control, fine between rows. */
export const rule = { heavy: 6, strong: 2, button: 2, middle: 1.5, fine: 1 } as const;

/** Corners: 3 on controls, 0 on everything printed. */
export const radius = { control: 3, printed: 0 } as const;

/** Heights of what is touched: the least, buttons and choices, and what signs, stops or jumps. */
export const touch = { least: 48, control: 52, act: 60, gap: 10 } as const;

/** Widths of the layout, px. */
export const layout = {
  numberColumn: 36,
  labelColumn: 104,
  column: 756,
  helper: 480,
  aside: 424,
  record: 440,
  sections: 236,
} as const;

/** Milliseconds; 0 where the person asked for less motion. */
export const motion = { state: 120, fold: 160, slide: 240 } as const;
