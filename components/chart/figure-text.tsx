import type { ReactNode } from 'react';
import { Text as SvgText } from 'react-native-svg';
import { fonts } from '../ui/theme';

interface FigureTextProps {
  readonly x: number;
  /** Baseline, px. */
  readonly y: number;
  readonly fill: string;
  readonly size?: number;
  readonly face?: keyof typeof fonts;
  readonly weight?: '400' | '500' | '600' | '700';
  readonly anchor?: 'start' | 'middle' | 'end';
  /** Colour of the halo that parts the text from a line behind it. */
  readonly halo?: string | undefined;
  readonly children: ReactNode;
}

/** Words or a number in a drawing. Numbers by default. */
export function FigureText({
  x,
  y,
  fill,
  size = 12,
  face = 'numbers',
  weight = '400',
  anchor = 'start',
  halo,
  children,
}: FigureTextProps) {
  const shared = {
    x,
    y,
    fontFamily: fonts[face],
    fontSize: size,
    fontWeight: weight,
    textAnchor: anchor,
  } as const;
  return (
    <>
      {halo !== undefined && (
        <SvgText {...shared} fill={halo} stroke={halo} strokeWidth={4} strokeLinejoin="round">
          {children}
        </SvgText>
      )}
      <SvgText {...shared} fill={fill}>
        {children}
      </SvgText>
    </>
  );
}
