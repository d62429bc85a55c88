import { useWindowDimensions } from 'react-native';
import { breakpoints } from './theme';

export interface Layout {
  /** Width of the window in px. */
  readonly width: number;
  /** Navigation stands at the side, inputs left of the plot. */
  readonly rail: boolean;
  /** The read-out stands right of the plot. */
  readonly readOutAside: boolean;
}

/** Which of the three layouts the window's width asks for. */
export const useLayout = (): Layout => {
  const { width } = useWindowDimensions();
  return {
    width,
    rail: width >= breakpoints.rail,
    readOutAside: width >= breakpoints.readOutAside,
  };
};
