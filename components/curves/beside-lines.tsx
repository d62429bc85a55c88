import { Fragment, useMemo } from 'react';
import { nameHeight } from '../chart/curve-names';
import { FigureText } from '../chart/figure-text';
import { FormulaText } from '../chart/formula-text';
import type { Rect } from '../chart/geometry';
import { bottom } from '../chart/geometry';
import { linePath } from '../chart/line-path';
import { placeNames, type NamedCurve, type PlacedName } from '../chart/place-names';
import type { Scale } from '../chart/scale';
import { linearScale } from '../chart/scale';
import { SeriesLine } from '../chart/series-line';
import { formulaWidth, numeralsWidth } from '../chart/text-width';
import { useTheme } from '../ui/theme';
import { besideNameInFigure } from './beside-name';
import { haveSameForms, shiftOf } from './comparison';
import type { DrawnCurve } from './drawn-curve';
import type { BesideCurve } from './figure-extras';

interface BesideLinesProps {
  readonly drawn: DrawnCurve;
  readonly beside: readonly BesideCurve[];
  readonly rect: Rect;
  readonly x: Scale;
  readonly placing: number;
  /** Names that already stand. */
  readonly taken: readonly PlacedName[];
}

const thin = 1.25;
const size = 12;
/** The second curve beside is dotted whatever its forms, so that the two can be told apart. */
const dotted = '1 3';
const penDown = 0.003;
const worthNaming = 0.3;
/** Where a curve has moved by this part of its largest move, its name tells them apart best. */
const farEnough = 0.6;

interface Named extends NamedCurve {
  readonly text: string;
  readonly isFormula: boolean;
}

/** Names of one curve beside: what sets it apart where it has moved most, or each form's formula. */
function wanted(
  drawn: DrawnCurve,
  { drawn: other, name }: BesideCurve,
  pointsOf: PointsOf,
): Named[] {
  const { fractions } = other.curve;
  if (!haveSameForms(drawn, other)) {
    return other.shown
      .filter((index) => Math.max(...(fractions[index] ?? [])) >= worthNaming)
      .map((index) => ({
        key: index,
        text: other.formulas[index] ?? '',
        isFormula: true,
        width: formulaWidth(other.formulas[index] ?? '', size),
        height: nameHeight,
        points: pointsOf(other, index),
      }));
  }
  const { index, change } = shiftOf(drawn, other).largest;
  const moved = pointsOf(other, index).filter((_, i) => {
    const by = (fractions[index]?.[i] ?? 0) - (drawn.curve.fractions[index]?.[i] ?? 0);
    return by / change >= farEnough;
  });
  const points = change === 0 ? pointsOf(other, index) : moved;
  return [
    {
      key: 0,
      text: name,
      isFormula: false,
      width: numeralsWidth(name, size),
      height: nameHeight,
      points,
    },
  ];
}

type PointsOf = (curve: DrawnCurve, index: number) => { readonly x: number; readonly y: number }[];

/** The curves that are compared with: thin, each named where it stands apart. */
export function BesideLines(props: BesideLinesProps) {
  const { drawn, beside, rect, x, placing, taken } = props;
  const { colours, series } = useTheme();
  const sets = useMemo(() => {
    const y = linearScale([0, 1], [bottom(rect), rect.y]);
    const pointsOf: PointsOf = ({ curve }, index) =>
      (curve.fractions[index] ?? []).map((alpha, i) => ({ x: x(curve.pH[i] ?? 0), y: y(alpha) }));
    const written = taken.map(({ box }) => box);
    return beside.map((curve, place) => {
      const { drawn: other } = curve;
      const names = wanted(drawn, curve, pointsOf);
      const placed = placeNames(names, {
        bounds: { ...rect, y: rect.y - 26, height: rect.height + 26 },
        zero: bottom(rect),
        cursor: placing,
        taken: written,
        lines: drawn.shown.map((index) => pointsOf(drawn, index)),
      });
      written.push(...placed.map(({ box }) => box));
      return {
        key: `${place} ${curve.name}`,
        dash: place === 0 ? undefined : dotted,
        lines: other.shown.map((index) => ({
          index,
          d: linePath(
            pointsOf(other, index).map((point, i) => ({
              ...point,
              drawn: (other.curve.fractions[index]?.[i] ?? 0) >= penDown,
            })),
          ),
        })),
        labels: placed.flatMap(({ key, box }) => {
          const name = names.find((one) => one.key === key);
          return name ? [{ ...name, box }] : [];
        }),
      };
    });
  }, [drawn, beside, rect, x, placing, taken]);

  return sets.map(({ key, dash, lines, labels }) => (
    <Fragment key={key}>
      {lines.map(({ index, d }) => (
        <SeriesLine
          key={index}
          d={d}
          style={{ ...series(index), ...(dash === undefined ? {} : { dash }) }}
          width={thin}
        />
      ))}
      {labels.map(({ text, isFormula, box }) => {
        const place = { x: box.x, y: box.y + 13, fill: colours.inkSoft, size, halo: colours.page };
        return isFormula ? (
          <FormulaText key={text} formula={text} {...place} />
        ) : (
          <FigureText key={text} {...place}>
            {besideNameInFigure(text)}
          </FigureText>
        );
      })}
    </Fragment>
  ));
}
