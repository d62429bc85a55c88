import { numberParts, spokenNumber } from '../ui/number';
import type { DrawnCapacity } from './drawn-capacity';
import type { Answered } from './mixture-queries';
import { shownAmount, shownCapacity, shownPH } from './rounded';

/** A number as it should be said. */
const said = (text: string) => {
  const parts = numberParts(text);
  return parts ? spokenNumber(parts) : text;
};

/** The answer in one short sentence. */
export const describeAnswer = ({ answer }: Answered): string =>
  `pH ${said(shownPH(answer.pH))}, ` +
  `ionic strength ${said(shownAmount(answer.ionicStrengthUsed))} moles per litre, ` +
  `buffer capacity ${said(shownCapacity(answer.bufferCapacity))} millimoles per litre and pH`;

/** The figure in words: what it shows, over which range, and what it says at the answer's pH. */
export function describeCapacity(drawn: DrawnCapacity, answered: Answered): string {
  const { range, parts } = drawn;
  const names = parts.map(({ title }) => title).join(', ');
  return (
    `Buffer capacity of the mixture over pH ${said(String(range[0]))} to ${range[1]}` +
    `${names === '' ? '' : `, with the parts of ${names}`}. ${describeAnswer(answered)}.`
  );
}
