interface Charged {
  readonly body: string;
  readonly charge: number;
}

/** A formula with its charge after `^` in two. */
function read(formula: string): Charged {
  const [body = '', written = ''] = formula.split('^', 2);
  const [, size = '', sign] = /^(\d*)([+-])$/.exec(written) ?? [];
  return { body, charge: sign === undefined ? 0 : Number(`${sign}${size || 1}`) };
}

/** Charge number of a species or ion by its formula: `HPO4^2-` is −2. */
export const chargeOf = (formula: string): number => read(formula).charge;

const greatestCommon = (a: number, b: number): number => (b === 0 ? a : greatestCommon(b, a % b));

/** One atom, or atoms that an index behind them would not tear apart. */
const isOneAtom = (body: string) => /^[A-Z][a-z]?$/.test(body);

/** A part of a salt so many times over: `K`, `Na2`, `(NH4)2`, `[B(OH)4]2`. */
function times(body: string, count: number): string {
  if (count === 1) return body;
  if (isOneAtom(body)) return `${body}${count}`;
  return body.includes('(') ? `[${body}]${count}` : `(${body})${count}`;
}

/** Written out with its acid group last, as CH3COO^- is: the metal then follows. */
const endsInCarboxylate = (body: string) => /COO$/.test(body);

/** Each element once, so that nothing tells the groups of the molecule apart. */
const isMolecular = (body: string) => {
  const symbols = body.match(/[A-Z][a-z]?/g) ?? [];
  return !body.includes('(') && new Set(symbols).size === symbols.length;
};

/**
 * The formula of a salt as a bottle has it: `H2PO4^-` with `K^+` is `KH2PO4`, `CH3COO^-` with
 * `Na^+` is `CH3COONa`, `NH4^+` with `Cl^-` is `NH4Cl`. A form without a charge is itself.
 */
export function saltFormula(species: string, counterIon: string): string {
  const form = read(species);
  const ion = read(counterIon);
  if (form.charge === 0) return form.body;
  const common = greatestCommon(Math.abs(form.charge), Math.abs(ion.charge));
  const forms = Math.abs(ion.charge) / common;
  const ions = times(ion.body, Math.abs(form.charge) / common);
  if (form.charge > 0) {
    const plain = forms > 1 || isMolecular(form.body);
    return (plain ? times(form.body, forms) : `[${form.body}]`) + ions;
  }
  return forms === 1 && endsInCarboxylate(form.body)
    ? form.body + ions
    : ions + times(form.body, forms);
}
