import { scaleLinear } from 'd3-scale';

/** Maps a value to px and back; linear. */
export interface Scale {
  (value: number): number;
  invert(px: number): number;
}

type Interval = readonly [from: number, to: number];

export const linearScale = (domain: Interval, range: Interval): Scale =>
  scaleLinear().domain(domain).range(range);
