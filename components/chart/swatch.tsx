import Svg from 'react-native-svg';
import type { SeriesStyle } from '../ui/theme';
import { useTheme } from '../ui/theme';
import { Marker } from './marker';
import { SeriesLine } from './series-line';

const width = 30;
const height = 14;

/** The line, dash and marker of a series, to stand beside its formula. */
export function Swatch({
  style,
  strong,
}: {
  readonly style: SeriesStyle;
  readonly strong?: boolean;
}) {
  const { colours } = useTheme();
  return (
    <Svg width={width} height={height} aria-hidden>
      <SeriesLine d={`M0 ${height / 2}H${width}`} style={style} strong={strong ?? false} />
      <Marker
        shape={style.marker}
        x={width / 2}
        y={height / 2}
        colour={style.colour}
        ring={colours.page}
        scale={0.85}
      />
    </Svg>
  );
}
