import { Line, TSpan } from 'react-native-svg';
import { FigureText } from '../chart/figure-text';
import { bottom } from '../chart/geometry';
import { Marker } from '../chart/marker';
import { numeralsWidth } from '../chart/text-width';
import { fonts, useTheme } from '../ui/theme';
import { chargeScale } from '../chart/charge-panel';
import { endCharges, type DrawnCurve } from './drawn-curve';
import type { FigureLayout } from './figure-layout';
import { shownPH } from './rounded';

interface IsoelectricMarkProps {
  readonly pH: string;
  readonly drawn: DrawnCurve;
  readonly layout: FigureLayout;
  readonly x: number;
}

const size = 12;
const gap = 6;

/** Where the mean charge is zero: a line through all panels, named in the lowest that suits. */
export function IsoelectricMark({ pH, drawn, layout, x }: IsoelectricMarkProps) {
  const { colours } = useTheme();
  const { charge, fractions } = layout.panels;
  const panel = charge ?? fractions ?? Object.values(layout.panels)[0];
  if (!panel) return null;
  const text = shownPH(pH);
  const y = charge ? chargeScale(endCharges(drawn), charge)(0) : bottom(panel);
  // Under the zero line at the left: the mean charge falls from above left to below right.
  const fits = x - gap - numeralsWidth(`pI ${text}`, size) >= panel.x;
  return (
    <>
      <Line
        x1={x}
        x2={x}
        y1={4}
        y2={layout.axis}
        stroke={colours.clay}
        strokeWidth={1.25}
        strokeDasharray="6 3 1.5 3"
      />
      {charge && <Marker shape="diamond" x={x} y={y} colour={colours.clay} ring={colours.page} />}
      <FigureText
        x={fits ? x - gap : x + gap}
        y={charge ? y + size + 3 : y - 7}
        anchor={fits ? 'end' : 'start'}
        size={size}
        weight="600"
        fill={colours.ink}
        halo={colours.page}
      >
        p
        <TSpan fontFamily={fonts.numbers} fontStyle="italic">
          I
        </TSpan>
        {` ${text}`}
      </FigureText>
    </>
  );
}
