import type { Rect } from '../chart/geometry';
import { clamp } from '../chart/geometry';
import type { Layer } from './curves-state';

/** A layer that has a panel of its own. */
export type Panel = Exclude<Layer, 'isoelectric-point'>;

/** Where the panels of the figure lie, px. */
export interface FigureLayout {
  readonly width: number;
  readonly left: number;
  readonly right: number;
  readonly panels: Readonly<Partial<Record<Panel, Rect>>>;
  readonly axis: number;
  readonly height: number;
}

interface FigureSize {
  readonly width: number;
  /** What there is; a figure with more panels than fit is higher. */
  readonly height: number;
  readonly layers: readonly Layer[];
  /** On a phone: no heads, numerals inside, the stair at its own height. */
  readonly compact: boolean;
}

type Heights = Readonly<Record<Panel, number>>;

/** Room above a panel for its head and, over the fractions, for names. */
const heads: Readonly<Record<'wide' | 'compact', Heights>> = {
  wide: { fractions: 42, predominance: 0, charge: 32, capacity: 32, 'lg-c': 34 },
  compact: { fractions: 26, predominance: 0, charge: 24, capacity: 40, 'lg-c': 40 },
};
/** Room below all for the axis, and beside the panels. */
const edges = {
  wide: { axis: 58, left: 36, right: 14 },
  compact: { axis: 42, left: 16, right: 16 },
} as const;

const isPanel = (layer: Layer): layer is Panel => layer !== 'isoelectric-point';

/** Stacks the layers over one pH axis; the fractions take at least twice any other's height. */
export function figureLayout({ width, height, layers, compact }: FigureSize): FigureLayout {
  const kind = compact ? 'compact' : 'wide';
  const [own, head] = [edges[kind], heads[kind]];
  const shown = layers.filter(isPanel);
  const free = height - own.axis - shown.reduce((sum, panel) => sum + head[panel], 0);
  const shares = compact ? compactShares(shown, free) : wideShares(shown, free);
  const panels: Partial<Record<Panel, Rect>> = {};
  let y = 0;
  for (const panel of shown) {
    y += head[panel];
    panels[panel] = { x: own.left, y, width: width - own.left - own.right, height: shares(panel) };
    y += shares(panel);
  }
  return {
    width,
    left: own.left,
    right: width - own.right,
    panels,
    axis: y,
    height: y + own.axis,
  };
}

type Shares = (panel: Panel) => number;

/** Share of the free height, and least and greatest height, px, of a panel under the fractions. */
const under = {
  predominance: [0.22, 72, 150],
  charge: [0.17, 48, 120],
  capacity: [0.18, 56, 120],
  'lg-c': [0.24, 96, 200],
} as const;
/** Most of the free height that they take together: the fractions keep twice the largest. */
const underTogether = 0.52;
/** Without fractions, px. */
const aloneAtMost = { predominance: 260, charge: 260, capacity: 260, 'lg-c': 420 } as const;

function wideShares(shown: readonly Panel[], free: number): Shares {
  if (!shown.includes('fractions')) {
    return (panel) => {
      const most = panel === 'fractions' ? free : aloneAtMost[panel];
      return Math.max(60, Math.min(free / shown.length, most));
    };
  }
  const others = shown.flatMap((panel) => (panel === 'fractions' ? [] : [panel]));
  const asked = others.reduce((sum, panel) => sum + under[panel][0], 0);
  const thinned = Math.min(1, underTogether / asked);
  const heightOf = (panel: keyof typeof under) => {
    const [share, least, most] = under[panel];
    return clamp(free * share * thinned, least, most);
  };
  const taken = others.reduce((sum, panel) => sum + heightOf(panel), 0);
  const highest = Math.max(0, ...others.map(heightOf));
  const fractions = Math.max(free - taken, 2 * highest);
  return (panel) => (panel === 'fractions' ? fractions : heightOf(panel));
}

const compactStair = 118;

function compactShares(shown: readonly Panel[], free: number): Shares {
  const stair = shown.includes('predominance') ? compactStair : 0;
  const others = shown.filter((panel) => panel !== 'predominance').length;
  return (panel) => (panel === 'predominance' ? stair : (free - stair) / others);
}
