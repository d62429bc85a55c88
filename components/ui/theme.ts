import { useColorScheme } from 'react-native';
import { colours as schemes, type Colours } from './colours';

export type { Colours };

/** One series of a chart: its colour, its dash pattern in px, its marker. */
export interface SeriesStyle {
  readonly colour: string;
  readonly dash: string | undefined;
  readonly marker:
    'disc' | 'square' | 'triangle' | 'diamond' | 'triangle-down' | 'cross' | 'plus' | 'bar';
  /** From the ninth series on the colours repeat, drawn heavier. */
  readonly heavy: boolean;
}

/** Members of the Okabe–Ito and Tol sets with 3:1 on the surface they are drawn on. */
const seriesColours = {
  light: ['#332288', '#D55E00', '#009988', '#AA4499', '#0072B2', '#882255', '#117733', '#CC6677'],
  dark: ['#99DDFF', '#E69F00', '#009E73', '#CC79A7', '#56B4E9', '#FFAABB', '#BBCC33', '#EE8866'],
} as const;
const dashes = [
  undefined,
  '10 4',
  '2.5 4',
  '11 4 2.5 4',
  '6 3',
  '16 4',
  '12 3 2.5 3 2.5 3',
  '4 2.5',
] as const;
const markers = [
  'disc',
  'square',
  'triangle',
  'diamond',
  'triangle-down',
  'cross',
  'plus',
  'bar',
] as const;

export interface Theme {
  readonly scheme: 'light' | 'dark';
  readonly colours: Colours;
  /** Style of the species that has lost `index` protons. */
  readonly series: (index: number) => SeriesStyle;
}

const themeOf = (scheme: 'light' | 'dark', colours: Colours): Theme => ({
  scheme,
  colours,
  series: (index) => {
    const place = index % 8;
    return {
      colour: seriesColours[scheme][place] ?? colours.ink,
      dash: dashes[place],
      marker: markers[place] ?? 'disc',
      heavy: index >= 8,
    };
  },
});

const themes = {
  light: themeOf('light', schemes.light),
  dark: themeOf('dark', schemes.dark),
};

/** The theme of the reader's system. */
export const useTheme = (): Theme => themes[useColorScheme() === 'dark' ? 'dark' : 'light'];

/** Spacing in 4-px steps. */
export const space = { 1: 4, 2: 8, 3: 12, 4: 16, 5: 20, 6: 24, 8: 32, 10: 40, 14: 56 } as const;
export const radius = 6;

/** Font families, declared by the static fonts.css; the app never waits for them. */
export const fonts = {
  words: '"Hanken Grotesk", system-ui, sans-serif',
  numbers: '"JetBrains Mono", ui-monospace, monospace',
} as const;

/** Widths at which the layout changes. */
export const breakpoints = { rail: 900, readOutAside: 1200 } as const;
