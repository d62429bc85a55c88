import { Line, Path } from 'react-native-svg';
import { useTheme } from '../ui/theme';
import { FigureText } from './figure-text';
import { clamp } from './geometry';

export const tab = { width: 58, height: 30, drop: 9 } as const;

interface FigureCursorProps {
  readonly x: number;
  readonly top: number;
  /** y of the axis that the tab hangs on, px. */
  readonly axis: number;
  /** Width of the drawing: the tab stays inside it while its tip stays true. */
  readonly width: number;
  readonly text: string;
  /** The tab is drawn over everything, the line under the markers. */
  readonly part: 'line' | 'tab';
}

/** Middle of the tab for a cursor at x. */
export const tabCentre = (x: number, width: number) =>
  clamp(x, tab.width / 2 + 1, width - tab.width / 2 - 1);

/** The cursor: a line through all panels and a tab on the axis. */
export function FigureCursor({ x, top, axis, width, text, part }: FigureCursorProps) {
  const { colours } = useTheme();
  if (part === 'line') {
    return <Line x1={x} x2={x} y1={top} y2={axis} stroke={colours.well} strokeWidth={1.75} />;
  }
  const centre = tabCentre(x, width);
  const left = centre - tab.width / 2;
  const y = axis + tab.drop;
  return (
    <>
      <Path
        d={`M${left + 6} ${y}H${x - 8}L${x} ${axis}L${x + 8} ${y}H${left + tab.width - 6}a6 6 0 0 1 6 6v${tab.height - 12}a6 6 0 0 1 -6 6H${left + 6}a6 6 0 0 1 -6 -6v-${tab.height - 12}a6 6 0 0 1 6 -6Z`}
        fill={colours.well}
      />
      <FigureText
        x={centre}
        y={y + 20}
        size={14}
        weight="700"
        anchor="middle"
        fill={colours.onWell}
      >
        {text}
      </FigureText>
    </>
  );
}
