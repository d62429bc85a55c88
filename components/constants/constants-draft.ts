import { limits } from '../../shared/limits';
import { systemInFull } from '../../shared/system';
import { wellFormed } from '../fragment/well-formed';
import { plainDecimal } from '../ui/plain-decimal';
import type { SystemText } from './system-text';

/** A system while it is typed: anything may stand in its fields. */
export interface ConstantsDraft {
  readonly name: string;
  readonly charge: string;
  readonly pKa: readonly string[];
}

/** What to write instead, field by field. */
export interface DraftFaults {
  readonly name?: string;
  readonly charge?: string;
  readonly pKa: Readonly<Record<number, string>>;
}

type CheckedDraft =
  | { readonly ok: true; readonly system: SystemText }
  | { readonly ok: false; readonly faults: DraftFaults };

export const draftOf = ({ name, fullyProtonatedCharge, pKa }: SystemText): ConstantsDraft => ({
  name: name ?? '',
  charge: signed(fullyProtonatedCharge),
  pKa,
});

const signed = (charge: number) => String(charge).replace('-', '\u2212');
const range = ({ from, to }: { from: string | number; to: string | number }) =>
  `from ${from} to ${to}`.replace(/-(?=\d)/g, '\u2212');

/**
 * Checks a draft against the contract. Blank rows are not used; the shared schema decides, and its
 * faults are said in the words of the field they stand beside.
 */
export function checkDraft({ name, charge, pKa }: ConstantsDraft): CheckedDraft {
  const rows = pKa.flatMap((text, row) => {
    const value = plainDecimal(text);
    return value === '' ? [] : [{ row, value }];
  });
  const plainCharge = plainDecimal(charge).replace(/^\+/, '');
  const checked = systemInFull.safeParse({
    name: wellFormed(name.trim()) || undefined,
    fullyProtonatedCharge: /^-?\d+$/.test(plainCharge) ? Number(plainCharge) : undefined,
    pKa: rows.map(({ value }) => value),
  });
  if (checked.success) return { ok: true, system: checked.data };

  const faults: { name?: string; charge?: string; pKa: Record<number, string> } = { pKa: {} };
  for (const { path, code } of checked.error.issues) {
    const [field, index] = path;
    if (field === 'name') faults.name = 'Write a name of at most 200 characters.';
    else if (field === 'fullyProtonatedCharge') {
      faults.charge = `Write a whole number ${range(limits.fullyProtonatedCharge)}.`;
    } else if (typeof index === 'number') {
      const at = rows[index];
      if (at) faults.pKa[at.row] ??= constantFault(code);
    } else if (rows.length === 0) faults.pKa[0] = 'Write at least one constant.';
    else {
      faults.pKa[pKa.length - 1] =
        `At most ${limits.protons} constants are computed; there are ${rows.length}.`;
    }
  }
  return { ok: false, faults };
}

const constantFault = (code: string) =>
  code === 'custom'
    ? `Write a constant ${range(limits.pKa)}, with at most ${limits.pKa.decimals} decimals.`
    : 'Write a number such as 7.20.';
