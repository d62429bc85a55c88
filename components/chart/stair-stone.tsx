import { G, Line, Path, Rect } from 'react-native-svg';
import { useTheme } from '../ui/theme';
import { SeriesLine } from './series-line';
import type { Stair } from './stair';
import { stonePath, waterOf } from './stair';

interface StairStoneProps {
  readonly stair: Stair;
  readonly meanCharge: number;
  /** Index of the form that predominates at the cursor. */
  readonly strong: number;
}

/** The stone stair with the water that stands in it at the mean charge. */
export function StairStone({ stair, meanCharge, strong }: StairStoneProps) {
  const { colours, series } = useTheme();
  const water = waterOf(stair, meanCharge);
  return (
    <G>
      {water && (
        <Rect
          x={water.left}
          y={water.y}
          width={stair.right - water.left}
          height={stair.base - water.y}
          fill={colours.water}
        />
      )}
      <Path d={stonePath(stair)} fill={colours.stone} />
      {stair.treads.slice(1).map((tread, i) => (
        <Line
          key={tread.index}
          x1={tread.left}
          x2={tread.left}
          y1={stair.treads[i]?.y}
          y2={tread.y}
          stroke={colours.edge}
          strokeWidth={1}
        />
      ))}
      {water && (
        <Line
          x1={water.left}
          x2={stair.right}
          y1={water.y}
          y2={water.y}
          stroke={colours.well}
          strokeWidth={2}
        />
      )}
      {stair.treads.map((tread) => {
        const style = series(tread.index);
        const current = tread.index === strong;
        return (
          <SeriesLine
            key={tread.index}
            d={`M${tread.left} ${tread.y}H${tread.right}`}
            style={current ? { ...style, dash: undefined } : style}
            width={current ? 4 : 2.25}
            casing={colours.page}
          />
        );
      })}
    </G>
  );
}
