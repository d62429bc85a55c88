import { Formula } from '../ui/formula';

const ion = /([A-Z][A-Za-z0-9()]*\^\d?[+-])/;

/** A sentence of an answer, its ions set as formulas and its numbers with true minus signs. */
export function WithFormulas({ text }: { readonly text: string }) {
  return text
    .split(ion)
    .map((part, index) =>
      index % 2 === 1 ? <Formula key={index} formula={part} /> : part.replace(/-(?=\d)/g, '\u2212'),
    );
}
