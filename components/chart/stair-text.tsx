import type { ReactNode } from 'react';
import { Line } from 'react-native-svg';
import { useTheme } from '../ui/theme';
import { FigureText } from './figure-text';
import { FormulaText } from './formula-text';
import type { Stair } from './stair';
import type { StairLabel } from './stair-labels';
import { stairMarks, stairNames } from './stair-labels';
import { formulaWidth, numeralsWidth } from './text-width';

export interface StairMark {
  /** Place of the value on the axis, px. */
  readonly x: number;
  readonly text: string;
}

interface StairTextProps {
  readonly stair: Stair;
  readonly formulas: readonly string[];
  readonly marks: readonly StairMark[];
  /** Names the row of marks, at its start. */
  readonly caption: ReactNode;
  readonly captionWidth: number;
  readonly strong: number;
  /** x of the cursor, px. */
  readonly cursor: number;
}

const size = 12;
const markSize = 12;

/** Names in the stone and the constants along its base. */
export function StairText(props: StairTextProps) {
  const { stair, formulas, marks, caption, captionWidth, strong, cursor } = props;
  const { colours } = useTheme();
  const names = stairNames(stair, {
    widthOf: (index) => formulaWidth(formulas[index] ?? '', size),
    current: strong,
    cursor,
  });
  const values = stairMarks(stair, {
    marks: marks.map(({ x, text }, key) => ({ key, x, width: numeralsWidth(text, markSize) })),
    cursor,
    after: stair.left,
  });
  const first = Math.min(...values.map(({ x }) => x), ...marks.map(({ x }) => x), stair.right);
  const halo = (label: StairLabel) => (label.halo ? colours.stone : undefined);
  return (
    <>
      {first - stair.left > captionWidth + 8 && (
        <FigureText x={stair.left + 6} y={stair.base - 5} fill={colours.inkSoft}>
          {caption}
        </FigureText>
      )}
      {marks.map(({ x }) => (
        <Line
          key={x}
          x1={x}
          x2={x}
          y1={stair.base}
          y2={stair.base - 14}
          stroke={colours.edge}
          strokeWidth={1}
        />
      ))}
      {values.map((label) => (
        <FigureText
          key={label.key}
          x={label.x}
          y={label.y}
          size={markSize}
          fill={colours.ink}
          halo={halo(label)}
        >
          {marks[label.key]?.text}
        </FigureText>
      ))}
      {names.map((label) => (
        <FormulaText
          key={label.key}
          formula={formulas[label.key] ?? ''}
          x={label.x}
          y={label.y}
          size={size}
          fill={colours.ink}
          bold={label.key === strong}
          halo={halo(label)}
        />
      ))}
    </>
  );
}
