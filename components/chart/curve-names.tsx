import { Fragment } from 'react';
import { Line } from 'react-native-svg';
import { useTheme } from '../ui/theme';
import { FormulaText } from './formula-text';
import { Marker } from './marker';
import type { PlacedName } from './place-names';

export const nameSize = 13;
export const nameHeight = 18;

interface CurveNamesProps {
  readonly names: readonly PlacedName[];
  readonly formulas: readonly string[];
  /** Index of the form that predominates at the cursor, set bold. */
  readonly strong: number;
  /** x of the cursor, px: its own marker takes the place of one that it comes near. */
  readonly cursor: number;
}

const markerRoom = 14;

/** Names at their curves, each with its marker and, where it stands away, a leader. */
export function CurveNames({ names, formulas, strong, cursor }: CurveNamesProps) {
  const { colours, series } = useTheme();
  return (
    <>
      {names.map(({ key, anchor, box, leader }) => (
        <Fragment key={key}>
          {leader && (
            <Line
              x1={leader[0].x}
              y1={leader[0].y}
              x2={leader[1].x}
              y2={leader[1].y}
              stroke={colours.inkSoft}
              strokeWidth={1}
            />
          )}
          {Math.abs(anchor.x - cursor) > markerRoom && (
            <Marker
              shape={series(key).marker}
              x={anchor.x}
              y={anchor.y}
              colour={series(key).colour}
              ring={colours.page}
            />
          )}
          <FormulaText
            formula={formulas[key] ?? ''}
            x={box.x}
            y={box.y + 13}
            size={nameSize}
            fill={colours.ink}
            bold={key === strong}
            halo={colours.page}
          />
        </Fragment>
      ))}
    </>
  );
}
