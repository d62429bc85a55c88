import { z } from 'zod';

const longest = 40;
const highestCharge = 6;

/** Symbols of the elements, by atomic number (IUPAC). */
const elements = new Set(
  `H He Li Be B C N O F Ne Na Mg Al Si P S Cl Ar K Ca Sc Ti V Cr Mn Fe Co Ni Cu Zn Ga Ge As Se Br Kr
  Rb Sr Y Zr Nb Mo Tc Ru Rh Pd Ag Cd In Sn Sb Te I Xe Cs Ba La Ce Pr Nd Pm Sm Eu Gd Tb Dy Ho Er Tm
  Yb Lu Hf Ta W Re Os Ir Pt Au Hg Tl Pb Bi Po At Rn Fr Ra Ac Th Pa U Np Pu Am Cm Bk Cf Es Fm Md No
  Lr Rf Db Sg Bh Hs Mt Ds Rg Cn Nh Fl Mc Lv Ts Og`.split(/\s+/),
);

/** Those whose anion with two charges is meant by a digit: S2- is sulfide, while I3- is no I^3-. */
const chalcogens = new Set(['O', 'S', 'Se', 'Te']);

const count = '(?:[1-9]\\d{0,2})?';
const atom = `[A-Z][a-z]?${count}`;
const formulaPattern = new RegExp(`^(?:${atom}|\\((?:${atom})+\\)${count})+$`);

/** Symbols and counts in an order that makes sense, every symbol that of an element. */
const isFormula = (formula: string) =>
  formulaPattern.test(formula) &&
  (formula.match(/[A-Z][a-z]?/g) ?? []).every((symbol) => elements.has(symbol));

const written = (formula: string, size: number, sign: string) =>
  `${formula}^${size === 1 ? '' : size}${sign}`;

/** With `^`, what follows it is the charge: "SO4^2-", "K^+". */
const marked = /^([^^]+)\^([1-6]?)([+-])$/;
/** One symbol, one digit: "Ca2+". */
const simple = /^([A-Z][a-z]?)([1-9])([+-])$/;
/** The sign alone: "NH4+". Two digits before it would be a charge run into a count: "SO42-". */
const plain = /^([^^]*[^^\d][1-9]?)([+-])$/;

/** Formula, size of the charge and its sign; undefined where it may be read in two ways, or none. */
function split(ion: string): readonly [string, number, string] | undefined {
  const [, formula, number, sign] = marked.exec(ion) ?? [];
  if (formula !== undefined && sign !== undefined) return [formula, Number(number || 1), sign];
  const [, symbol, digit, after] = simple.exec(ion) ?? [];
  if (symbol !== undefined && after !== undefined) {
    const size = Number(digit);
    const means = after === '+' ? size <= highestCharge : size === 2 && chalcogens.has(symbol);
    return means ? [symbol, size, after] : undefined;
  }
  const [, body, alone] = plain.exec(ion) ?? [];
  return body !== undefined && alone !== undefined ? [body, 1, alone] : undefined;
}

/**
 * The canonical name of an ion, its charge after `^`: "Ca2+" → "Ca^2+", "NH4+" → "NH4^+". Undefined
 * where it is no ion, or where its charge cannot be told from a count: "SO42-", "I3-".
 */
function canonicalName(ion: string): string | undefined {
  const [formula, size, sign] = (ion.length <= longest && split(ion)) || [];
  if (formula === undefined || size === undefined || sign === undefined) return undefined;
  return isFormula(formula) ? written(formula, size, sign) : undefined;
}

const words = `Write a formula of elements and its charge, such as "K+", "Ca2+", "NO3-" or "S2O3^2-", at most ${longest} characters: what follows ^ is the charge (up to ${highestCharge}), and it is needed where a count stands before a charge.`;

/** An ion as callers write it; the output is its canonical name. Code: `not-an-ion`. */
export const ionInput = z
  .string({ error: words })
  .transform((input, context) => {
    const name = canonicalName(input);
    if (name !== undefined) return name;
    context.addIssue({ code: 'custom', params: { code: 'not-an-ion' }, message: words });
    return z.NEVER;
  })
  .meta({
    description: 'An ion: formula and charge, the charge after `^` where a digit could be a count.',
    example: 'Ca2+',
    pattern: '^[A-Z(][A-Za-z0-9()]*(\\^[1-6]?)?[+-]$',
    maxLength: longest,
  });

/** The charge number of an ion by its canonical name: ±1 to ±6. Throws RangeError on other names. */
export function chargeOfIon(name: string): number {
  const [, , size, sign] = marked.exec(name) ?? [];
  if (sign === undefined) throw new RangeError(`Not a canonical name of an ion: ${name}`);
  return Number(`${sign}${size || 1}`);
}
