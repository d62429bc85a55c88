import { isCasNumber } from './handbook/cas-number';
import { hillFormula } from './handbook/formulas';
import type { HandbookEntry } from './handbook/handbook';

export interface Term {
  readonly kind: 'name' | 'formula' | 'cas';
  readonly term: string;
}

/** One spelling of what can be written in several: H₂PO₄⁻ is h2po4-. */
const folded = (text: string) => text.normalize('NFKC').toLowerCase().replaceAll('\u2212', '-');

/** A name as it is compared: letters and digits, whatever stands between them. */
const nameTerm = (text: string) =>
  folded(text)
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim();

/** A formula as it is compared: without spaces and the sign before a charge. */
const formulaTerm = (text: string) => folded(text).replace(/[\s^]/g, '');

/** What a query is compared with, by kind; an empty one finds nothing. */
export const queryTerms = (query: string): Record<Term['kind'], string> => ({
  name: nameTerm(query),
  formula: formulaTerm(query),
  cas: folded(query).trim(),
});

/** What a system is found by: names, id, formulas of compound and forms, CAS numbers. */
export function termsOf(entry: HandbookEntry): Term[] {
  const { id, name, aliases, formula, cas, species } = entry;
  const names = [name, ...aliases.filter((alias) => !isCasNumber(alias)), id];
  const formulas = [formula, formula && hillFormula(formula), ...species.map((one) => one.formula)];
  const terms = [
    ...names.map((text) => ({ kind: 'name' as const, term: nameTerm(text) })),
    ...formulas.map((text) => ({ kind: 'formula' as const, term: formulaTerm(text ?? '') })),
    ...[cas, ...aliases.filter(isCasNumber)].map((text) => ({
      kind: 'cas' as const,
      term: text ?? '',
    })),
  ].filter(({ term }) => term !== '');
  return [...new Map(terms.map((one) => [`${one.kind} ${one.term}`, one])).values()];
}
