import type { ReactNode } from 'react';
import { useTheme } from '../ui/theme';
import { FigureText } from './figure-text';
import type { Stair } from './stair';
import { waterOf } from './stair';

interface WaterLabelProps {
  readonly stair: Stair;
  readonly meanCharge: number;
  /** x of the cursor, px: the label keeps clear of it. */
  readonly cursor: number;
  readonly width: number;
  readonly children: ReactNode;
}

const inset = 4;
const cursorGap = 6;

/** The reading on the water, at its right end. */
export function WaterLabel({ stair, meanCharge, cursor, width, children }: WaterLabelProps) {
  const { colours } = useTheme();
  const water = waterOf(stair, meanCharge);
  if (!water) return null;
  const end = stair.right - inset;
  const crossed = cursor > end - width - cursorGap;
  return (
    <FigureText
      x={crossed ? Math.min(end, cursor - cursorGap) : end}
      y={water.y - 6}
      size={13}
      weight="700"
      anchor="end"
      fill={colours.well}
    >
      {children}
    </FigureText>
  );
}
