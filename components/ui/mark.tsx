import Svg, { Path } from 'react-native-svg';
import { useTheme } from './theme';

interface MarkProps {
  /** px; from 16. */
  readonly size?: number;
  /** Drawn on a surface of the colour `well`. */
  readonly onWell?: boolean;
}

/** Three steps down to a line of water. */
export function Mark({ size = 24, onWell = false }: MarkProps) {
  const { colours } = useTheme();
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" fill="none" aria-hidden>
      <Path d="M2 2H8.6V7.5H15.3V13H22V16.8H2Z" fill={onWell ? colours.onWell : colours.ink} />
      <Path d="M2 20.6H22" stroke={onWell ? colours.onWell : colours.well} strokeWidth={2.8} />
    </Svg>
  );
}
