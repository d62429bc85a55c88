import { Exact } from '../../../shared/decimal';
import { significant } from '../../chem';

/** Digits of a quotient that has no end: far beyond any that an answer could show. */
const quotientDigits = 150;

const plain = (value: InstanceType<typeof Exact>) => value.toString();

export const sumOf = (a: string, b: string): string => plain(new Exact(a).plus(b));
export const differenceOf = (a: string, b: string): string => plain(new Exact(a).minus(b));
export const times = (a: string, b: string | number): string => plain(new Exact(a).times(b));
export const quotient = (a: string, b: string): string =>
  plain(new Exact(a).dividedBy(b).toSignificantDigits(quotientDigits));

/** An exact decimal as an answer writes it. */
export const written = (value: string, digits: number): string =>
  significant(digits).write(new Exact(value));
