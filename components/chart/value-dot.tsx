import { useTheme } from '../ui/theme';
import { FigureText } from './figure-text';
import type { Rect } from './geometry';
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

/** Where the value stands: which side of the dot, and its baseline. */
function placeOf({ x, y, top = 0, limit, text }: ValueDotProps) {
  const width = gap + numeralsWidth(text, size);
  return {
    fits: x + width <= limit,
    width,
    baseline: Math.max((y ?? top) - 7, top + size),
  };
}

/** The room that the value takes beside its dot. */
export function valueBox(dot: ValueDotProps): Rect {
  const { fits, width, baseline } = placeOf(dot);
  return { x: fits ? dot.x : dot.x - width, y: baseline - size, width, height: size + 7 };
}

/** The value of a single line at the cursor. */
export function ValueDot(props: ValueDotProps) {
  const { x, y, text } = props;
  const { colours } = useTheme();
  const { fits, baseline } = placeOf(props);
  return (
    <>
      {y !== undefined && (
        <Marker shape="disc" x={x} y={y} colour={colours.ink} ring={colours.page} />
      )}
      <FigureText
        x={fits ? x + gap : x - gap}
        y={baseline}
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
