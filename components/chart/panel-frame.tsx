import type { ReactNode } from 'react';
import { G, Line } from 'react-native-svg';
import { useTheme } from '../ui/theme';
import { FigureText } from './figure-text';
import type { Rect } from './geometry';
import { right } from './geometry';
import type { Scale } from './scale';

export interface GridLine {
  readonly value: number;
  /** Empty for a line without a numeral. */
  readonly label: string;
  /** `axis` is the line values are counted from, `bound` one they never pass. */
  readonly kind: 'axis' | 'bound' | 'grid';
}

interface PanelFrameProps {
  readonly rect: Rect;
  readonly y: Scale;
  readonly lines: readonly GridLine[];
  /** Symbol, then words and unit; a compact panel goes without. */
  readonly head?: ReactNode;
  /** Distance of the head's baseline above the panel, px. */
  readonly headRise?: number;
  /** Numerals stand inside the panel, on their lines, where there is no room beside it. */
  readonly inside?: boolean;
}

/** What a panel is drawn on: head, lines, numerals. */
export function PanelFrame({
  rect,
  y,
  lines,
  head,
  inside = false,
  // Over the numeral that stands on the topmost line.
  headRise = inside ? 24 : 12,
}: PanelFrameProps) {
  const { colours } = useTheme();
  const stroke = { axis: colours.edge, bound: colours.rule, grid: colours.rule };
  return (
    <G>
      {head !== undefined && (
        <FigureText x={rect.x} y={rect.y - headRise} fill={colours.inkSoft} face="words">
          {head}
        </FigureText>
      )}
      {lines.map(({ value, label, kind }) => (
        <G key={value}>
          <Line
            x1={rect.x}
            x2={right(rect)}
            y1={y(value)}
            y2={y(value)}
            stroke={stroke[kind]}
            strokeWidth={1}
            strokeDasharray={kind === 'grid' ? '1 5' : undefined}
          />
          {label !== '' && (
            <FigureText
              x={inside ? rect.x + 1 : rect.x - 8}
              y={y(value) + (inside ? -4 : 4)}
              anchor={inside ? 'start' : 'end'}
              fill={colours.inkSoft}
              halo={inside ? colours.page : undefined}
            >
              {label}
            </FigureText>
          )}
        </G>
      ))}
    </G>
  );
}
