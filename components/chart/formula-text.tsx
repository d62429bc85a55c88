import { Text as SvgText, TSpan } from 'react-native-svg';
import { parseFormula } from '../ui/formula-parts';
import { fonts } from '../ui/theme';
import { scriptSize, subDrop, supRise } from './text-width';

interface FormulaTextProps {
  readonly formula: string;
  /** Left edge and baseline, px. */
  readonly x: number;
  readonly y: number;
  readonly size: number;
  readonly fill: string;
  readonly bold?: boolean;
  /** Colour of the halo that parts the text from a line behind it. */
  readonly halo?: string | undefined;
}

/** A formula in a drawing: indices and charge in place, as wide as `formulaWidth` says. */
export function FormulaText({ formula, x, y, size, fill, bold, halo }: FormulaTextProps) {
  const rises = { base: 0, sub: subDrop * size, sup: -supRise * size };
  const runs = parseFormula(formula);
  const spans = runs.map(({ text, place }, i) => (
    <TSpan
      key={i}
      dy={rises[place] - rises[runs[i - 1]?.place ?? 'base']}
      fontSize={place === 'base' ? size : size * scriptSize}
    >
      {text}
    </TSpan>
  ));
  const shared = {
    x,
    y,
    fontFamily: fonts.numbers,
    fontSize: size,
    fontWeight: bold ? '700' : '500',
  } as const;
  return (
    <>
      {halo !== undefined && (
        <SvgText {...shared} fill={halo} stroke={halo} strokeWidth={4} strokeLinejoin="round">
          {spans}
        </SvgText>
      )}
      <SvgText {...shared} fill={fill}>
        {spans}
      </SvgText>
    </>
  );
}
