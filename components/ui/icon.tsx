import Svg, { Path } from 'react-native-svg';
import { useTheme, type Colours } from './theme';

/** Paths on a 24 grid, drawn with a 1.75 stroke. */
const paths = {
  curves: 'M3 18h1.5C11 18 13 6 19.5 6H21M3 6h1.5C11 6 13 18 19.5 18H21',
  mixture:
    'M12 3.5c3.7 4.2 5.75 7.2 5.75 10.5a5.75 5.75 0 0 1-11.5 0C6.25 10.7 8.3 7.7 12 3.5ZM6.5 13.5h11',
  systems: 'M4.5 4.5h15v15h-15ZM4.5 9.5h15M4.5 14.5h15M9.5 9.5v10',
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
  key: 'M8 10.5a4.25 4.25 0 1 1 0 8.5 4.25 4.25 0 0 1 0-8.5ZM11 11.75 19 4M16 7l3 3M13.5 9.5l2 2',
  person:
    'M12 4a3.75 3.75 0 1 1 0 7.5A3.75 3.75 0 0 1 12 4ZM4.5 20c.6-3.6 3.6-5.5 7.5-5.5s6.9 1.9 7.5 5.5',
  clock: 'M12 3.5a8.5 8.5 0 1 1 0 17 8.5 8.5 0 0 1 0-17ZM12 7.5V12l3 2',
  eye: 'M2.5 12C5 8 8.2 6 12 6s7 2 9.5 6c-2.5 4-5.7 6-9.5 6s-7-2-9.5-6ZM12 9.25a2.75 2.75 0 1 1 0 5.5 2.75 2.75 0 0 1 0-5.5Z',
  'eye-off':
    'M4 4l16 16M9.5 6.3A9.8 9.8 0 0 1 12 6c3.8 0 7 2 9.5 6a17 17 0 0 1-2.6 3.2M6 7.8A16 16 0 0 0 2.5 12C5 16 8.2 18 12 18a10 10 0 0 0 4-.8M10 10.2a2.75 2.75 0 0 0 3.8 3.9',
  'arrow-up': 'M12 19V5.5M6.5 11 12 5.5l5.5 5.5',
  'arrow-down': 'M12 5v13.5M6.5 13l5.5 5.5 5.5-5.5',
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
