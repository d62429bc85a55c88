import { Path } from 'react-native-svg';
import type { SeriesStyle } from '../ui/theme';

interface SeriesLineProps {
  readonly d: string;
  readonly style: SeriesStyle;
  /** Drawn heavier: the form that predominates at the cursor. */
  readonly strong?: boolean;
  readonly width?: number;
  /** Surface colour; keeps the line legible on stone, water and wash. */
  readonly casing?: string | undefined;
}

const regular = 2.25;
const heavy = 3.25;

/** One series in its colour and dash. */
export function SeriesLine({ d, style, strong, width, casing }: SeriesLineProps) {
  const stroke = width ?? (strong || style.heavy ? heavy : regular);
  // Short dashes have round ends and read as dots.
  const dotted = style.dash?.startsWith('2.5') ?? false;
  return (
    <>
      {casing !== undefined && <Path d={d} stroke={casing} strokeWidth={stroke + 3} fill="none" />}
      <Path
        d={d}
        stroke={style.colour}
        strokeWidth={stroke}
        strokeDasharray={style.dash}
        strokeLinecap={dotted ? 'round' : 'butt'}
        strokeLinejoin="round"
        fill="none"
      />
    </>
  );
}
