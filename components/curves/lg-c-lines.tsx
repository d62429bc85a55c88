import { useMemo } from 'react';
import { Path, TSpan } from 'react-native-svg';
import { clipCurve } from '../chart/clip-curve';
import { CurveNames, nameHeight, nameSize } from '../chart/curve-names';
import { FormulaText } from '../chart/formula-text';
import type { Rect } from '../chart/geometry';
import { bottom } from '../chart/geometry';
import { linePath } from '../chart/line-path';
import { PanelFrame } from '../chart/panel-frame';
import { placeNames } from '../chart/place-names';
import type { Scale } from '../chart/scale';
import { linearScale } from '../chart/scale';
import { SeriesLine } from '../chart/series-line';
import { concentrationSign } from '../chart/symbols';
import { formulaWidth } from '../chart/text-width';
import { fonts, useTheme } from '../ui/theme';
import type { Capacity } from './capacity';
import { hydrogenAt, hydroxideAt } from './capacity';
import type { DrawnCurve } from './drawn-curve';
import { lgConcentration, lgRange } from './lg-c';
import { totalInWords } from './total-in-words';

export const lgScale = (rect: Rect) => linearScale(lgRange, [bottom(rect), rect.y]);

const gridLines = [0, -2, -4, -6, -8, -10, -12, -14];
/** Every other numeral where the panel is low. */
const numeralRoom = 14;
/** Keys of the lines of water, which are no forms of the system. */
const water = { hydrogen: -1, hydroxide: -2 } as const;
const waterFormulas = { [water.hydrogen]: 'H^+', [water.hydroxide]: 'OH^-' } as const;

const isWater = ({ key }: { readonly key: number }) => key < 0;
const nameOf = ({ formulas }: DrawnCurve, key: number) =>
  key === water.hydrogen || key === water.hydroxide ? waterFormulas[key] : (formulas[key] ?? '');

interface LgCLinesProps {
  readonly drawn: DrawnCurve;
  /** mol/L. */
  readonly total: number;
  /** Brings c(H⁺) and c(OH⁻); without it they are not drawn. */
  readonly capacity: Capacity | undefined;
  readonly rect: Rect;
  readonly x: Scale;
  readonly strong: number;
  readonly cursor: number;
  readonly placing: number;
  readonly compact: boolean;
}

/** lg(c/(mol/L)) of each form, of H⁺ and of OH⁻ over pH: the logarithmic diagram. */
export function LgCLines(props: LgCLinesProps) {
  const { drawn, total, capacity, rect, x, strong, cursor, placing, compact } = props;
  const { colours, series } = useTheme();
  const y = useMemo(() => lgScale(rect), [rect]);

  const lines = useMemo(() => {
    const pHs = drawn.curve.pH;
    const line = (key: number, lgAt: (i: number, pH: number) => number) => {
      const values = pHs.map((pH, i) => ({ x: x(pH), y: lgAt(i, pH) }));
      const points = clipCurve(values, lgRange).map((point) => ({ ...point, y: y(point.y) }));
      return { key, points, d: linePath(points) };
    };
    const forms = drawn.shown.map((index) =>
      line(index, (i) => lgConcentration(drawn.answer.points[i]?.fractions[index] ?? '0', total)),
    );
    if (!capacity) return { forms, ions: [] };
    return {
      forms,
      ions: [
        line(water.hydrogen, (_, pH) => Math.log10(hydrogenAt(capacity, pH))),
        line(water.hydroxide, (_, pH) => Math.log10(hydroxideAt(capacity, pH))),
      ],
    };
  }, [drawn, total, capacity, x, y]);

  const names = useMemo(
    () =>
      placeNames(
        [...lines.forms, ...lines.ions]
          .filter(({ d }) => d !== '')
          .map(({ key, points }) => ({
            key,
            width: formulaWidth(nameOf(drawn, key), nameSize),
            height: nameHeight,
            points: points.filter((point) => point.drawn),
          })),
        { bounds: rect, zero: bottom(rect), cursor: placing },
      ),
    [lines, drawn, rect, placing],
  );
  const every = rect.height / 7 >= numeralRoom ? 2 : 4;
  return (
    <>
      <PanelFrame
        rect={rect}
        y={y}
        inside={compact}
        head={
          <>
            {'lg '}
            {concentrationSign}
            {compact ? ' in mol/L, at ' : ' of each form and of the ions of water, in mol/L, at '}
            <TSpan fontFamily={fonts.numbers}>{totalInWords(total)}</TSpan>
            {' mmol/L in all'}
          </>
        }
        lines={gridLines.map((value) => ({
          value,
          label: value % every === 0 ? String(value).replace('-', '\u2212') : '',
          kind: value === lgRange[0] ? 'axis' : 'grid',
        }))}
      />
      {lines.ions.map(({ key, d }) => (
        <Path key={key} d={d} stroke={colours.inkSoft} strokeWidth={1.25} fill="none" />
      ))}
      {lines.forms.map(({ key, d }) => (
        <SeriesLine key={key} d={d} style={series(key)} strong={key === strong} />
      ))}
      <CurveNames
        names={names.filter((name) => !isWater(name))}
        formulas={drawn.formulas}
        strong={strong}
        cursor={cursor}
      />
      {names.filter(isWater).map(({ key, box }) => (
        <FormulaText
          key={key}
          formula={nameOf(drawn, key)}
          x={box.x}
          y={box.y + 13}
          size={nameSize}
          fill={colours.inkSoft}
          halo={colours.page}
        />
      ))}
    </>
  );
}
