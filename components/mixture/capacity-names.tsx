import { useMemo } from 'react';
import { Line } from 'react-native-svg';
import { FigureText } from '../chart/figure-text';
import { bottom, type Rect } from '../chart/geometry';
import { Marker } from '../chart/marker';
import { placeNames } from '../chart/place-names';
import type { Scale } from '../chart/scale';
import { useTheme } from '../ui/theme';
import type { DrawnCapacity } from './drawn-capacity';

interface CapacityNamesProps {
  readonly drawn: DrawnCapacity;
  readonly rect: Rect;
  readonly x: Scale;
  readonly y: Scale;
  /** x of the answer's pH, px: names keep out of its way. */
  readonly cursor: number;
  /** What is already written in the panel. */
  readonly taken: readonly Rect[];
}

const size = 12;
const height = 16;
/** Mean advance of the face of words, em. */
const advance = 0.53;
/** A part that stays below this share of the axis has no curve to stand at. */
const worthNaming = 0.03;
const longest = 26;

/** The whole where it is the components’, and not that of water: there its name may stand. */
const buffered = ({ whole: values, parts }: DrawnCapacity) =>
  values.map((value, i) => {
    const own = parts.reduce((sum, part) => sum + (part.values[i] ?? 0), 0);
    return own > mostly * value ? value : Infinity;
  });
const mostly = 0.7;

const whole = -1;
const shortened = (title: string) =>
  title.length > longest ? `${title.slice(0, longest - 1)}…` : title;

/** Names at their curves, as words. */
export function CapacityNames({ drawn, rect, x, y, cursor, taken }: CapacityNamesProps) {
  const { colours, series } = useTheme();
  const named = useMemo(() => {
    const { pH, top, parts } = drawn;
    const wanted = [
      {
        key: whole,
        // Alone, a part is all there is; its name needs no second one.
        title: parts.length > 1 ? 'all together' : '',
        values: buffered(drawn),
      },
      ...parts.map(({ title, series: key, values }) => ({
        key,
        title: shortened(title),
        values,
      })),
    ].filter(({ values }) => values.some((value) => value < top && value > top * worthNaming));
    const places = placeNames(
      wanted.map(({ key, title, values }) => ({
        key,
        width: title.length * advance * size,
        height,
        points: values.flatMap((value, i) =>
          value <= top ? { x: x(pH[i] ?? 0), y: y(value) } : [],
        ),
      })),
      { bounds: rect, zero: bottom(rect), cursor, taken },
    );
    return places.map((place) => ({
      ...place,
      title: wanted.find(({ key }) => key === place.key)?.title ?? '',
    }));
  }, [drawn, rect, x, y, cursor, taken]);
  return (
    <>
      {named.map(
        ({ key, leader }) =>
          leader && (
            <Line
              key={`leader ${key}`}
              x1={leader[0].x}
              y1={leader[0].y}
              x2={leader[1].x}
              y2={leader[1].y}
              stroke={colours.inkSoft}
              strokeWidth={1}
            />
          ),
      )}
      {named.map(({ key, box, title }) => (
        <FigureText
          key={`name ${key}`}
          x={box.x}
          y={box.y + 12}
          size={size}
          face="words"
          fill={colours.ink}
          halo={colours.page}
        >
          {title}
        </FigureText>
      ))}
      {named.map(
        ({ key, anchor }) =>
          key !== whole && (
            <Marker
              key={`marker ${key}`}
              shape={series(key).marker}
              x={anchor.x}
              y={anchor.y}
              colour={series(key).colour}
              ring={colours.page}
            />
          ),
      )}
    </>
  );
}
