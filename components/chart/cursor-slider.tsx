import { StyleSheet, View } from 'react-native';
import { radius } from '../ui/theme';
import { webStyle } from '../ui/web-style';
import type { CursorMove } from './cursor-keys';
import { cursorMove } from './cursor-keys';
import { tab, tabCentre } from './figure-cursor';

interface CursorSliderProps {
  readonly label: string;
  readonly x: number;
  readonly axis: number;
  readonly width: number;
  readonly min: number;
  readonly max: number;
  readonly now: number;
  /** The value in words, with what it shows. */
  readonly text: string;
  readonly onKey: (move: CursorMove) => void;
}

/** The tab as a control: one Tab stop that the keys move. The pointer drags the whole plot. */
export function CursorSlider(props: CursorSliderProps) {
  const { label, x, axis, width, min, max, now, text, onKey } = props;
  return (
    <View
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-orientation="horizontal"
      aria-valuemin={min}
      aria-valuemax={max}
      aria-valuenow={now}
      aria-valuetext={text}
      onKeyDown={(event) => {
        const move = cursorMove(event.key, event.shiftKey);
        if (!move || event.ctrlKey || event.metaKey || event.altKey) return;
        event.preventDefault();
        onKey(move);
      }}
      style={[
        styles.slider,
        {
          left: tabCentre(x, width) - tab.width / 2,
          top: axis + tab.drop,
        },
      ]}
    />
  );
}

const styles = StyleSheet.create({
  slider: {
    position: 'absolute',
    width: tab.width,
    height: tab.height,
    borderRadius: radius,
    ...webStyle({ pointerEvents: 'none' }),
  },
});
