import { useTheme } from '../ui/theme';
import { FigureText } from './figure-text';
import { Marker } from './marker';
import { numeralsWidth } from './text-width';

interface ValueDotProps {
  readonly x: number;
  /** Undefined where the line has left the panel: the value then stands alone, at the top. */
  readonly y: number | undefined;
  /** Top of the panel, px: values do not stand over it. */
  readonly top?: number;
  /** Right edge of the panel, px: the value goes left of the dot where it would pass it. */
  readonly limit: number;
  readonly text: string;
}

const size = 13;
const gap = 9;

/** The value of a single line at the cursor. */
export function ValueDot({ x, y, top = 0, limit, text }: ValueDotProps) {
  const { colours } = useTheme();
  const fits = x + gap + numeralsWidth(text, size) <= limit;
  return (
    <>
      {y !== undefined && (
        <Marker shape="disc" x={x} y={y} colour={colours.ink} ring={colours.page} />
      )}
      <FigureText
        x={fits ? x + gap : x - gap}
        y={Math.max((y ?? top) - 7, top + size)}
        size={size}
        weight="700"
        anchor={fits ? 'start' : 'end'}
        fill={colours.ink}
        halo={colours.page}
      >
        {text}
      </FigureText>
    </>
  );
}
