/** `^2-`, `^+`, or nothing for a neutral form. */
const chargeSign = (charge: number) =>
  charge === 0 ? '' : `^${Math.abs(charge) === 1 ? '' : Math.abs(charge)}${charge < 0 ? '-' : '+'}`;

const written = (body: string, charge: number) => body + chargeSign(charge);

/** A formula as the table writes it: "NH4+", "C2H10N2 2+", "HSO4-", "CH3COOH". */
function read(formula: string): { body: string; charge: number } {
  const [, body = formula, size, sign] = /^(.*?)(?: (\d))?([+-])?$/.exec(formula) ?? [];
  return { body, charge: sign === undefined ? 0 : Number(`${sign}${size ?? 1}`) };
}

/** Molecular, each element once: C6H8O7, and not CH3COOH. */
const molecular = /^(C\d*)H(\d*)((?:[A-GI-Z][a-z]?\d*)*)$/;

const counted = (element: string, count: number) =>
  count === 0 ? '' : count === 1 ? element : `${element}${count}`;

/** A molecular formula with protons put on or taken off; undefined where the formula is none. */
function withProtons(body: string, more: number): string | undefined {
  const [, carbon = '', hydrogen = '', rest = ''] = molecular.exec(body) ?? [];
  const elements: readonly string[] = rest.match(/[A-Z][a-z]?/g) ?? [];
  if (carbon === '' || elements.includes('C') || new Set(elements).size < elements.length) {
    return undefined;
  }
  return carbon + counted('H', (hydrogen === '' ? 1 : Number(hydrogen)) + more) + rest;
}

const fewer = (count: string) => counted('H', (count === '' ? 1 : Number(count)) - 1);

/** Where a written-out formula loses its next proton, in order of acidity of what it shows. */
const losses: readonly (readonly [RegExp, (...groups: string[]) => string])[] = [
  [/COOH$/, () => 'COO'],
  [/^H([OS])(?=C)/, (_, atom = '') => atom],
  [/NH(\d?)$/, (_, count = '') => `N${fewer(count)}`],
  [/(?<=C\d*H\d*)OH$/, () => 'O'],
  [/^H(\d*)(?=[A-Z])/, (_, count = '') => fewer(count)],
];

function lessOneProton(body: string): string | null {
  const loss = losses.find(([place]) => place.test(body));
  return loss ? body.replace(loss[0], loss[1]) : null;
}

/**
 * The n + 1 forms of a substance, fully protonated first, each with its charge. A molecular formula
 * gains or loses protons from the charge it is written with; a written-out one must be that of the
 * fully protonated form. Null where a form cannot be written by these rules.
 */
export function formsOf(
  formula: string,
  fullyProtonatedCharge: number,
  steps: number,
): (string | null)[] {
  const { body, charge } = read(formula);
  const lost = Array.from({ length: steps + 1 }, (_, index) => index);
  if (withProtons(body, 0) !== undefined) {
    return lost.map((protons) => {
      const here = fullyProtonatedCharge - protons;
      return written(withProtons(body, here - charge) ?? '', here);
    });
  }
  if (charge !== fullyProtonatedCharge) return lost.map(() => null);
  const bodies: (string | null)[] = [body];
  while (bodies.length <= steps) {
    const last = bodies.at(-1) ?? null;
    bodies.push(last === null ? null : lessOneProton(last));
  }
  return bodies.map((one, protons) => one && written(one, fullyProtonatedCharge - protons));
}

/** The neutral compound's formula: among the forms, or the molecular formula without its charge. */
export function neutralFormula(formula: string, forms: readonly (string | null)[]): string | null {
  const { body, charge } = read(formula);
  return withProtons(body, -charge) ?? forms.find((form) => form && !form.includes('^')) ?? null;
}

/** How often each element stands in a formula, brackets multiplied out. */
export function atomsOf(formula: string): Map<string, number> {
  const [body = ''] = formula.split('^');
  const stack = [new Map<string, number>()];
  for (const [, element, count, open, times] of body.matchAll(/([A-Z][a-z]?)(\d*)|(\()|\)(\d*)/g)) {
    if (open) stack.push(new Map<string, number>());
    const inner = element
      ? new Map([[element, 1]])
      : open
        ? new Map<string, number>()
        : stack.pop();
    const outer = stack.at(-1);
    for (const [name, number] of inner ?? []) {
      const all = number * Number((element ? count : times) || 1);
      outer?.set(name, (outer.get(name) ?? 0) + all);
    }
  }
  return stack[0] ?? new Map<string, number>();
}

/** Molecular formula of a carbon compound in Hill's order, C2H4O2 for CH3COOH; null for others. */
export function hillFormula(formula: string): string | null {
  const atoms = atomsOf(formula);
  if (!atoms.has('C') || !atoms.has('H')) return null;
  const others = [...atoms.keys()].filter((name) => name !== 'C' && name !== 'H').sort();
  return ['C', 'H', ...others].map((name) => counted(name, atoms.get(name) ?? 0)).join('');
}
