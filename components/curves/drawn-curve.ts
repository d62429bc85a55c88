import type { StairRange } from '../chart/stair';
import type { FractionsAnswer } from '../../shared/fractions';
import type { Constant } from '../../shared/constant';
import type { SystemText } from '../constants/system-text';
import type { CurveAsked } from './curve-asked';
import type { Curve } from './follow-curve';
import { curveOf } from './follow-curve';
import { gridOf, type CurveGrid } from './curve-grid';
import { shownConstant } from './rounded';
import type { PHRange } from './ph-steps';
import { formulasOf } from './species-formulas';

/**
 * A fetched curve with what it is a curve of. They stay together, so that an old curve keeps its
 * own formulas and range until the new one is there.
 */
export interface DrawnCurve {
  readonly asked: CurveAsked;
  readonly grid: CurveGrid;
  readonly answer: FractionsAnswer;
  readonly curve: Curve;
  /** The system as it was computed. */
  readonly system: SystemText;
  /** What is known of each of its constants; nothing of typed ones. */
  readonly constants: readonly Constant[];
  readonly formulas: readonly string[];
  readonly range: PHRange;
  readonly stair: readonly StairRange[];
  readonly meetings: readonly Meeting[];
  /** Indices of the forms worth a line. */
  readonly shown: readonly number[];
}

/** Two forms that predominate one after the other, and the pH at which they are equal. */
export interface Meeting {
  readonly before: number;
  readonly after: number;
  readonly pH: number;
  /**
   * The constant as given where nothing moved it, else pK′; where a form between them never
   * predominates, the mean of several.
   */
  readonly text: string;
}

/** A constant for reading: as given, or pK′ where conditions moved it. */
const constantText = (given: string, effective: string) =>
  Number(given) === Number(effective) ? shownConstant(given) : Number(effective).toFixed(3);

function meetingsOf(
  { predominance, effectivePKa }: FractionsAnswer,
  pKa: readonly string[],
): Meeting[] {
  return predominance.flatMap(({ species, from }, i) => {
    const before = predominance[i - 1]?.species;
    if (from === null || before === undefined) return [];
    const given = species === before + 1 ? pKa[before] : undefined;
    const text =
      given === undefined
        ? shownConstant(String(Number(from)))
        : constantText(given, effectivePKa[before] ?? given);
    return [{ before, after: species, pH: Number(from), text }];
  });
}

/** With more forms than series colours, only those that reach this fraction are drawn. */
const worthDrawing = 0.05;
const seriesCount = 8;

/** What to draw of an answer, over the grid that it was asked for. */
export function drawnCurve(
  asked: CurveAsked,
  answer: FractionsAnswer,
  grid?: CurveGrid,
): DrawnCurve {
  const { choice } = asked;
  const curve = curveOf(answer);
  const [used] = answer.model.constantsUsed;
  if (!used) throw new Error('The answer names no system.');
  const { name, fullyProtonatedCharge, pKa, constants = [] } = used;
  const system = choice.kind === 'typed' ? choice.system : { name, fullyProtonatedCharge, pKa };
  const drawnOver = grid ?? gridOf(pKa);
  const bound = (end: string | null) => (end === null ? null : Number(end));
  return {
    asked,
    grid: drawnOver,
    answer,
    curve,
    system,
    constants,
    formulas: formulasOf(answer.species, system),
    range: [Number(drawnOver.from), Number(drawnOver.to)],
    stair: answer.predominance.map(({ species, from, to }) => ({
      index: species,
      charge: curve.charges[species] ?? 0,
      from: bound(from),
      to: bound(to),
    })),
    meetings: meetingsOf(answer, system.pKa),
    shown: curve.fractions.flatMap((alpha, index) =>
      curve.fractions.length <= seriesCount || Math.max(...alpha) >= worthDrawing ? [index] : [],
    ),
  };
}

/** Whether the conditions moved any constant: else pK′ is what was given. */
export const isMoved = ({ answer, system }: DrawnCurve): boolean =>
  answer.effectivePKa.some((effective, i) => Number(effective) !== Number(system.pKa[i]));

/** Charges of the fully protonated and of the fully deprotonated form. */
export const endCharges = ({ curve: { charges } }: DrawnCurve): readonly [number, number] => [
  charges[0] ?? 0,
  charges[charges.length - 1] ?? 0,
];
