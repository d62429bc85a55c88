import type { Constant } from '../../../shared/constant';

type Provenance = Pick<Constant, 'provenance' | 'provenanceNote'>;

const recalled = (text: string): Provenance => ({
  provenance: 'recalled',
  provenanceNote: /memory \((.+)\)$/.exec(text)?.[1] ?? null,
});

/**
 * Whether a step's value was read or is recalled, by the words of its row: "memory (sure)", "read in
 * a public copy (…)", or, of one row, "read (pK1 only) … pK2, pK3 memory (sure)".
 */
export function provenanceOf(text: string, step: number): Provenance {
  if (text.startsWith('memory')) return recalled(text);
  const onlyStep = /^read \(pK(\d) only\)/.exec(text)?.[1];
  if (onlyStep !== undefined && Number(onlyStep) !== step) return recalled(text);
  if (text.startsWith('read')) {
    const note = onlyStep === undefined ? text.replace(/^read in /, '') : 'a public copy';
    return { provenance: 'read', provenanceNote: note };
  }
  throw new Error(`A provenance in other words: ${text}`);
}
