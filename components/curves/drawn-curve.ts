import type { StairRange } from '../chart/stair';
import type { FractionsAnswer } from '../../shared/fractions';
import type { Constant } from '../../shared/constant';
import type { Choice } from '../constants/choice';
import type { SystemText } from '../constants/system-text';
import { givenConstants } from './curves-state';
import type { Curve } from './follow-curve';
import { curveOf } from './follow-curve';
import { rangeOf } from './curve-grid';
import { shownConstant } from './rounded';
import type { PHRange } from './ph-steps';
import { formulasOf } from './species-formulas';

/**
 * A fetched curve with what it is a curve of. They stay together, so that an old curve keeps its
 * own formulas and range until the new one is there.
 */
export interface DrawnCurve {
  readonly choice: Choice;
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
  /** The constant as given; where a form between them never predominates, the mean of several. */
  readonly text: string;
}

function meetingsOf({ predominance }: FractionsAnswer, pKa: readonly string[]): Meeting[] {
  return predominance.flatMap(({ species, from }, i) => {
    const before = predominance[i - 1]?.species;
    if (from === null || before === undefined) return [];
    const given = species === before + 1 ? pKa[before] : undefined;
    const text = shownConstant(given ?? String(Number(from)));
    return [{ before, after: species, pH: Number(from), text }];
  });
}

/** With more forms than series colours, only those that reach this fraction are drawn. */
const worthDrawing = 0.05;
const seriesCount = 8;

export function drawnCurve(choice: Choice, answer: FractionsAnswer): DrawnCurve {
  const curve = curveOf(answer);
  const [used] = answer.model.constantsUsed;
  if (!used) throw new Error('The answer names no system.');
  const { name, fullyProtonatedCharge, pKa, constants = [] } = used;
  const system = choice.kind === 'typed' ? choice.system : { name, fullyProtonatedCharge, pKa };
  const bound = (end: string | null) => (end === null ? null : Number(end));
  return {
    choice,
    answer,
    curve,
    system,
    constants,
    formulas: formulasOf(answer.species, system),
    range: rangeOf(givenConstants(choice)),
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

/** Charges of the fully protonated and of the fully deprotonated form. */
export const endCharges = ({ curve: { charges } }: DrawnCurve): readonly [number, number] => [
  charges[0] ?? 0,
  charges[charges.length - 1] ?? 0,
];
