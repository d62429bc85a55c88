import type { ReactNode } from 'react';
import { G, Line, TSpan } from 'react-native-svg';
import { useTheme } from '../ui/theme';
import { axisTicks } from './axis-ticks';
import { FigureText } from './figure-text';
import type { Scale } from './scale';
import { activitySign } from './symbols';

interface PhAxisProps {
  readonly x: Scale;
  readonly domain: readonly [number, number];
  readonly y: number;
  /** Middle of the cursor's tab, px: it replaces the numerals it would half hide. */
  readonly tab: number;
  /** Says which pH is meant, where there is room. */
  readonly titled?: boolean;
  /** Stands at the left of the title: the conditions. */
  readonly caption?: ReactNode;
}

/** Half the tab and half a numeral, px. */
const tabRoom = 38;
/** Title and caption stand clear of the tab, px. */
const titleDrop = 51;
const minus = '\u2212';

/** The one pH axis under the last panel. */
export function PhAxis({ x, domain, y, tab, titled = false, caption }: PhAxisProps) {
  const { colours } = useTheme();
  const [from, to] = domain;
  return (
    <G>
      <Line x1={x(from)} x2={x(to)} y1={y} y2={y} stroke={colours.edge} strokeWidth={1} />
      {axisTicks(domain, x(to) - x(from)).map(({ value, long, numeral }) => (
        <G key={value}>
          <Line
            x1={x(value)}
            x2={x(value)}
            y1={y}
            y2={y + (long ? 7 : 4)}
            stroke={colours.edge}
            strokeWidth={1}
          />
          {numeral && Math.abs(x(value) - tab) > tabRoom && (
            <FigureText x={x(value)} y={y + 20} anchor="middle" fill={colours.inkSoft}>
              {String(value).replace('-', minus)}
            </FigureText>
          )}
        </G>
      ))}
      {caption !== undefined && (
        <FigureText x={x(from)} y={y + titleDrop} fill={colours.inkSoft} face="words">
          {caption}
        </FigureText>
      )}
      {titled && (
        <FigureText x={x(to)} y={y + titleDrop} anchor="end" fill={colours.inkSoft} face="words">
          <TSpan fontWeight="600" fill={colours.ink}>
            pH
          </TSpan>
          {`  ${minus}lg `}
          {activitySign}
          {'(H'}
          <TSpan dy={-4} fontSize={9}>
            +
          </TSpan>
          <TSpan dy={4}>)</TSpan>
        </FigureText>
      )}
    </G>
  );
}
