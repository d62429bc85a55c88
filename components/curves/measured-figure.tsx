import { useState, type ReactNode, type Ref } from 'react';
import { View } from 'react-native';
import { Skeleton } from '../ui/skeleton';
import { conditionsInFigure } from './conditions';
import { CurvesFigure } from './curves-figure';
import type { Layer } from './curves-state';
import type { DrawnCurve } from './drawn-curve';
import type { FigureExtras } from './figure-extras';
import type { Reading } from './follow-curve';

interface MeasuredFigureProps {
  readonly drawn: DrawnCurve | undefined;
  readonly reading: Reading | undefined;
  readonly isFetching: boolean;
  readonly layers: readonly Layer[];
  readonly extras?: FigureExtras;
  /** mol/L. */
  readonly total?: number;
  readonly height: number;
  readonly compact: boolean;
  readonly onMove: (pH: string) => void;
  readonly figure?: Ref<View>;
  /** Stands in the figure's place, or over it. */
  readonly children?: ReactNode;
}

/** A figure that waits for its width and its curve: as wide as it finds, as high as it is told. */
export function MeasuredFigure(props: MeasuredFigureProps) {
  const { drawn, reading, isFetching, height, figure, children, ...rest } = props;
  const [width, setWidth] = useState(0);
  return (
    <View
      onLayout={({ nativeEvent }) => setWidth(Math.floor(nativeEvent.layout.width))}
      style={{ minHeight: height }}
    >
      {drawn && reading && width > 0 && rest.layers.length > 0 && (
        <CurvesFigure
          {...rest}
          {...(figure === undefined ? {} : { ref: figure })}
          drawn={drawn}
          reading={reading}
          width={width}
          height={height}
          caption={conditionsInFigure(drawn)}
        />
      )}
      {!drawn && isFetching && <Skeleton label="The curve is being computed" lines={6} />}
      {children}
    </View>
  );
}
