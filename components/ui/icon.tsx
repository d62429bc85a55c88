import Svg, { Path } from 'react-native-svg';
import { useTheme, type Colours } from './theme';

/** Paths on a 24 grid, drawn with a 1.75 stroke. */
const paths = {
  curves: 'M3 18h1.5C11 18 13 6 19.5 6H21M3 6h1.5C11 6 13 18 19.5 18H21',
  code: 'M8.5 7 3.5 12l5 5M15.5 7l5 5-5 5M13.5 5l-3 14',
  notes: 'M6 3.5h8.5l4 4v13H6ZM14.5 3.5v4h4M9.5 12h5.5M9.5 16h5.5',
  'chevron-down': 'm6 9.5 6 6 6-6',
  share: 'M12 15V3.5M8 7.5l4-4 4 4M7.5 11h-2v9.5h13V11h-2',
  download: 'M12 4v11.5M7 11l5 5 5-5M4.5 20h15',
  copy: 'M9 9h10.5v10.5H9ZM6 15H4.5V4.5H15V6',
  check: 'm5 12.5 4.5 4.5L19 7.5',
  warning: 'M12 4 21 19.5H3ZM12 10v4.5M12 17h.01',
  error: 'M12 3.5a8.5 8.5 0 1 1 0 17 8.5 8.5 0 0 1 0-17ZM12 8v5M12 16h.01',
  close: 'M6.5 6.5l11 11M17.5 6.5l-11 11',
  plus: 'M12 5.5v13M5.5 12h13',
  minus: 'M5.5 12h13',
  more: 'M4 7h5M9.5 12h5M15 17h5',
} as const;

export type IconName = keyof typeof paths;

interface IconProps {
  readonly name: IconName;
  /** px; default 20. */
  readonly size?: number;
  readonly tone?: keyof Colours;
}

/** A picture beside a word; screen readers pass it by. */
export function Icon({ name, size = 20, tone = 'ink' }: IconProps) {
  const { colours } = useTheme();
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" fill="none" aria-hidden>
      <Path
        d={paths[name]}
        stroke={colours[tone]}
        strokeWidth={1.75}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </Svg>
  );
}
