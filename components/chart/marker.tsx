import { G, Path } from 'react-native-svg';
import type { SeriesStyle } from '../ui/theme';

type Shape = SeriesStyle['marker'];

/** Outlines about the origin, for a marker that fits a circle of radius 5. */
const outlines: Readonly<Record<Shape, string>> = {
  disc: 'M-4.2 0a4.2 4.2 0 1 0 8.4 0a4.2 4.2 0 1 0 -8.4 0Z',
  square: 'M-4 -4H4V4H-4Z',
  triangle: 'M0 -5L5 3.8H-5Z',
  diamond: 'M0 -5.4L5.4 0L0 5.4L-5.4 0Z',
  'triangle-down': 'M0 5L5 -3.8H-5Z',
  cross: 'M-3.8 -3.8L3.8 3.8M3.8 -3.8L-3.8 3.8',
  plus: 'M0 -4.8V4.8M-4.8 0H4.8',
  bar: 'M-5 -2H5V2H-5Z',
};
const open: ReadonlySet<Shape> = new Set(['cross', 'plus']);

interface MarkerProps {
  readonly shape: Shape;
  readonly x: number;
  readonly y: number;
  readonly colour: string;
  /** Colour of the ring that parts it from its line: that of the surface. */
  readonly ring: string;
  readonly scale?: number;
}

/** The sign of one series on its curve. */
export function Marker({ shape, x, y, colour, ring, scale = 1 }: MarkerProps) {
  const d = outlines[shape];
  return (
    <G transform={`translate(${x.toFixed(2)} ${y.toFixed(2)}) scale(${scale})`}>
      {open.has(shape) ? (
        <>
          <Path d={d} stroke={ring} strokeWidth={5.5} strokeLinecap="square" fill="none" />
          <Path d={d} stroke={colour} strokeWidth={2.5} strokeLinecap="square" fill="none" />
        </>
      ) : (
        <>
          <Path d={d} stroke={ring} strokeWidth={3} strokeLinejoin="round" fill={ring} />
          <Path d={d} fill={colour} />
        </>
      )}
    </G>
  );
}
