import { useMemo } from 'react';
import { nameHeight } from '../chart/curve-names';
import { FigureText } from '../chart/figure-text';
import type { Point, Rect } from '../chart/geometry';
import { bottom } from '../chart/geometry';
import { placeNames } from '../chart/place-names';
import { numeralsWidth } from '../chart/text-width';
import { useTheme } from '../ui/theme';
import { besideNameInFigure } from './beside-name';

interface BesideNamesProps {
  readonly rect: Rect;
  /** The first curve, px. */
  readonly first: readonly Point[];
  readonly others: readonly { readonly name: string; readonly points: readonly Point[] }[];
  readonly placing: number;
}

const size = 12;
/** Where a curve has moved by this part of its largest move, its name tells them apart best. */
const farEnough = 0.6;

/** The room that the value at the cursor takes, right of its dot. */
function valueAt(line: readonly Point[], x: number): Rect[] {
  const at = line.find((point) => point.x >= x);
  return at ? [{ x, y: at.y - 20, width: 56, height: 18 }] : [];
}

/** Names of single lines that are compared, each where it stands farthest from the first. */
export function BesideNames({ rect, first, others, placing }: BesideNamesProps) {
  const { colours } = useTheme();
  const placed = useMemo(() => {
    const isIn = ({ y }: Point) => y >= rect.y && y <= bottom(rect);
    return placeNames(
      others.map(({ name, points }, key) => {
        const moves = points.map((point, i) =>
          isIn(point) ? Math.abs(point.y - (first[i]?.y ?? point.y)) : 0,
        );
        const least = Math.max(...moves) * farEnough;
        return {
          key,
          width: numeralsWidth(name, size),
          height: nameHeight,
          points: points.filter((point, i) => isIn(point) && (moves[i] ?? 0) >= least),
        };
      }),
      {
        bounds: rect,
        zero: bottom(rect),
        cursor: placing,
        lines: [first.filter(isIn)],
        taken: valueAt(first, placing),
      },
    );
  }, [rect, first, others, placing]);
  return placed.map(({ key, box }) => (
    <FigureText
      key={key}
      x={box.x}
      y={box.y + 13}
      size={size}
      fill={colours.inkSoft}
      halo={colours.page}
    >
      {besideNameInFigure(others[key]?.name ?? '')}
    </FigureText>
  ));
}
