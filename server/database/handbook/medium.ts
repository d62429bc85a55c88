import type { Constant } from '../../../shared/constant';
import type { TableRow } from './sources';

/** Conditions that a constant holds in. */
export type Medium = Pick<Constant, 'kind' | 'temperature' | 'ionicStrength'>;

const textOf = (pattern: RegExp, text: string) => pattern.exec(text)?.[1];

/** "boric acid (20 C)"; "hydrogen telluride (pK1 18 C)" says it of one step alone. */
function temperatureOf({ name, source }: TableRow, step: number): string {
  const ofOneStep = /\(pK(\d) ([\d.]+) C\)/.exec(name);
  if (ofOneStep) return Number(ofOneStep[1]) === step ? (ofOneStep[2] ?? '25') : '25';
  return (
    textOf(/\(([\d.]+) C\)/, name) ?? textOf(/mol\/L, ([\d.]+) C \(concentration/, source) ?? '25'
  );
}

/** "EGTA (0.1 M)", or "I=0.1 mol/L, 25 C (concentration constants)" in the source. */
const ofWholeRow = ({ name, source }: TableRow) =>
  textOf(/\b([\d.]+) M\)/, name) ?? textOf(/I=([\d.]+) mol\/L, .*concentration/, source);

/** "EDTA pK1-4 at I=1, pK5-6 at I=0.1": said in a source that other substances share. */
function ofSteps({ name, source }: TableRow, step: number): string | undefined {
  const [first = ''] = name.split(' ');
  const said = textOf(new RegExp(`\\b${first} (pK\\d-\\d at I=[^)]*)`), source) ?? '';
  const ranges = said.matchAll(/pK(\d)-(\d) at I=([\d.]+)/g);
  return [...ranges].find(([, from, to]) => Number(from) <= step && step <= Number(to))?.[3];
}

/** "… print 3.81 for pK2 of oxalic acid (I not 0)": in a medium that nobody states. */
const isUnstated = ({ source }: TableRow, step: number) =>
  Number(textOf(/ for pK(\d) of .*\(I not 0\)/, source)) === step;

/**
 * What the table says about the conditions of a step, in a row's name or its source. Its rule for
 * the rest is water, 25 °C, extrapolated to I = 0.
 */
export function mediumOf(row: TableRow, step: number): Medium {
  const temperature = temperatureOf(row, step);
  const ionicStrength = ofWholeRow(row) ?? ofSteps(row, step);
  if (ionicStrength !== undefined) return { kind: 'concentration', temperature, ionicStrength };
  if (isUnstated(row, step)) return { kind: 'concentration', temperature, ionicStrength: null };
  return { kind: 'thermodynamic', temperature, ionicStrength: '0' };
}
