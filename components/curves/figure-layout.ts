import type { Rect } from '../chart/geometry';
import { clamp } from '../chart/geometry';
import type { Layer } from './curves-state';

/** Where the panels of the figure lie, px. */
export interface FigureLayout {
  readonly width: number;
  readonly left: number;
  readonly right: number;
  readonly fractions?: Rect;
  readonly stair?: Rect;
  readonly charge?: Rect;
  readonly axis: number;
  readonly height: number;
}

interface FigureSize {
  readonly width: number;
  readonly height: number;
  readonly layers: readonly Layer[];
  /** On a phone: no heads, numerals inside, the stair at its own height. */
  readonly compact: boolean;
}

/** Room above a panel for its head and, over the fractions, for names; below all for the axis. */
const room = {
  wide: { fractions: 42, predominance: 0, charge: 32, axis: 58, left: 36, right: 14 },
  compact: { fractions: 26, predominance: 0, charge: 24, axis: 42, left: 16, right: 16 },
} as const;
const compactStair = 118;

/** Stacks the layers over one pH axis; the fractions take at least twice any other's height. */
export function figureLayout({ width, height, layers, compact }: FigureSize): FigureLayout {
  const own = room[compact ? 'compact' : 'wide'];
  const heads = layers.reduce((sum, layer) => sum + own[layer], 0);
  const free = height - own.axis - heads;
  const shares = compact ? compactShares(layers, free) : wideShares(layers, free);
  const rects: Partial<Record<Layer, Rect>> = {};
  let y = 0;
  for (const layer of layers) {
    y += own[layer];
    rects[layer] = {
      x: own.left,
      y,
      width: width - own.left - own.right,
      height: shares[layer],
    };
    y += shares[layer];
  }
  return {
    width,
    left: own.left,
    right: width - own.right,
    ...(rects.fractions && { fractions: rects.fractions }),
    ...(rects.predominance && { stair: rects.predominance }),
    ...(rects.charge && { charge: rects.charge }),
    axis: y,
    height: y + own.axis,
  };
}

type Shares = Readonly<Record<Layer, number>>;

function wideShares(layers: readonly Layer[], free: number): Shares {
  const has = (layer: Layer) => layers.includes(layer);
  if (!has('fractions')) {
    const half = Math.min(free / layers.length, 260);
    return { fractions: 0, predominance: half, charge: half };
  }
  const predominance = has('predominance') ? clamp(free * 0.22, 72, 150) : 0;
  const charge = has('charge') ? clamp(free * 0.17, 48, 120) : 0;
  return { fractions: free - predominance - charge, predominance, charge };
}

function compactShares(layers: readonly Layer[], free: number): Shares {
  const predominance = layers.includes('predominance') ? compactStair : 0;
  return { fractions: free - predominance, predominance, charge: free - predominance };
}
