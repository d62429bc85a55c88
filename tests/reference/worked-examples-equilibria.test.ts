import Decimal from 'decimal.js';
import { approximations, unexplained } from '../support/book-approximations';
import { type Description, solved } from '../support/solutions';
import worked from './data/worked-examples-equilibria.json';

/**
 * Textbook examples with printed answers; each title names its source and says where the values were
 * recalled. Tolerance: half a unit in the last digit of the printed number, no more; the table has
 * lost trailing zeros, so a pH counts as printed to two decimals at least, a concentration to two
 * digits. Where a book prints what its own approximation gives, the row stands in `approximations`.
 */
const Wide = Decimal.clone({ defaults: true, precision: 80, rounding: Decimal.ROUND_HALF_EVEN });
type Written = string | number;

interface Row {
  problem: string;
  inputs: {
    systems?: { Ka?: Written[]; pKa?: Written[]; z0: number; C: Written }[];
    spectators?: (readonly [number, Written])[];
    V0?: number;
    strong_acid?: Written;
    titrant_NaOH?: Written;
    titrant_HCl?: Written;
  };
  printed: Record<string, Written> & { curve?: (readonly [Written, Written])[] };
  kind: string;
  source: string;
  provenance: string;
}

const rows = worked.rows as unknown as readonly Row[];
const titled = (list: readonly Row[]) =>
  list.map((row) => {
    const recalled = row.provenance.startsWith('memory') ? ', recalled' : '';
    return [row.problem, `${row.source}${recalled}`, row] as const;
  });

const pOf = (constant: Written) => new Wide(constant).log(10).negated().toFixed(30);

/** A row's solution, every amount times a share of the volume, with strong acid and base added. */
function solutionOf({ inputs }: Row, share: Decimal, added: Description['ions'] = {}): Description {
  const ions = new Map(Object.entries(added));
  for (const [charge, amount] of inputs.spectators ?? []) {
    ions.set(charge > 0 ? 'M^+' : 'X^-', new Wide(amount).times(share).toFixed());
  }
  return {
    acids: (inputs.systems ?? []).map(({ Ka, pKa, z0, C }) => ({
      pKa: pKa?.map(String) ?? Ka?.map(pOf) ?? [],
      z0,
      c: new Wide(C).times(share).toFixed(),
    })),
    ions: Object.fromEntries(ions),
    pKw: '14',
  };
}

/** The mixture after so many mL of titrant. */
function titrated(row: Row, volume: Written): Description {
  const { V0 = NaN, strong_acid: acid = 0, titrant_NaOH: base = 0 } = row.inputs;
  const sum = new Wide(V0).plus(volume);
  const [sample, titrant] = [new Wide(V0).dividedBy(sum), new Wide(volume).dividedBy(sum)];
  const strong = new Wide(acid).times(sample).plus(titrant.times(row.inputs.titrant_HCl ?? 0));
  return solutionOf(row, sample, {
    'M^+': titrant.times(base).toFixed(),
    'X^-': strong.toFixed(),
  });
}

/** Half a unit in the last place of a printed number. */
function halfUnit(quantity: string, written: Written): Decimal {
  const value = new Wide(written);
  const decimals = value.decimalPlaces();
  const least = quantity === 'pH' ? 2 : 1 - value.e;
  return new Wide(10).pow(-Math.max(decimals, least)).dividedBy(2);
}

/** Where a species of the printed concentration stands among those of its system. */
const places: Record<string, number> = { BH2: 0, BH: 1, HCO3: 1, CO3: 2, H2A: 0, HA: 1, A: 2 };

function quantityOf(description: Description, quantity: string): string {
  const { pH, hydrogen, hydroxide, acids } = solved(description, 20);
  const direct: Record<string, string> = { pH, H: hydrogen, OH: hydroxide };
  const species = acids[0]?.species[places[quantity] ?? NaN]?.concentration;
  return direct[quantity] ?? species ?? 'NaN';
}

const used = new Set<string>();

function compare(label: string, quantity: string, value: string, written: Written) {
  const off = (ours: Decimal.Value) =>
    new Wide(ours).minus(written).abs().lessThanOrEqualTo(halfUnit(quantity, written));
  const book = label === unexplained ? undefined : approximations[label];
  if (label === unexplained) {
    expect(Number(value)).toBeCloseTo(7.377, 3);
  } else if (book === undefined) {
    expect([label, value, off(value)]).toEqual([label, value, true]);
    return;
  } else {
    expect([label, book, off(book)]).toEqual([label, book, true]);
  }
  expect([label, value, off(value)]).toEqual([label, value, false]);
  used.add(label);
}

const mixtures = rows.filter(
  ({ kind, inputs }) => ['pH', 'conc'].includes(kind) && 'spectators' in inputs,
);
const titrations = rows.filter(({ kind }) => kind === 'titration');

describe('mixtures', () => {
  test.each(titled(mixtures))('%s (%s)', (problem, _, row) => {
    for (const [quantity, written] of Object.entries(row.printed)) {
      const value = quantityOf(solutionOf(row, new Wide(1)), quantity);
      compare(`${problem}: ${quantity}`, quantity, value, written as Written);
    }
  });
});

describe('titrations, as the mixture of every point', () => {
  test.each(titled(titrations))('%s (%s)', (problem, _, row) => {
    for (const [volume, written] of row.printed.curve ?? []) {
      const value = quantityOf(titrated(row, volume), 'pH');
      compare(`${problem}: pH ${Number(volume)}`, 'pH', value, written);
    }
  });
});

test('every approximation is needed, and no more', () => {
  expect([...used].sort()).toEqual([...Object.keys(approximations), unexplained].sort());
});

describe('rows without a composition of their own, made into mixtures', () => {
  const printedOf = (start: string) => {
    const row = rows.find(({ problem }) => problem.startsWith(start));
    if (row === undefined) throw new Error(`There is no example "${start}".`);
    return (quantity: string) => row.printed[quantity] ?? NaN;
  };
  const pH = (description: Description) => quantityOf({ pKw: '14', ...description }, 'pH');

  test('they are five', () => {
    expect(rows.length - mixtures.length - titrations.length).toBe(5);
  });

  test('0.27 mol of sodium acetate to 0.300 L of 0.50 M acetic acid make pH 5.00 (OpenStax)', () => {
    const amount = printedOf('mass of NaAc.3H2O')('mol');
    const half = halfUnit('mol', amount);
    const [low, high] = [half.negated(), half].map((off) => {
      const acetate = new Wide(amount).plus(off).dividedBy('0.300');
      const acid = { pKa: [pOf('1.8e-5')], z0: 0, c: acetate.plus('0.50').toFixed() };
      return Number(pH({ acids: [acid], ions: { 'Na^+': acetate.toFixed() } }));
    });
    expect(low).toBeLessThan(5);
    expect(high).toBeGreaterThan(5);
  });

  test('25.00 mL of 0.100 M HCl and 37.50 mL of 0.100 M NaOH (OpenStax)', () => {
    const ions = { 'Cl^-': '0.04', 'Na^+': '0.06' };
    compare('HCl, 37.50 mL', 'pH', pH({ ions }), printedOf('HCl titration point')('pH'));
  });

  test('pure water at 80 °C, where [H₃O⁺] is 4.9 × 10⁻⁷ (OpenStax)', () => {
    const pKw = new Wide(pOf('4.9e-7')).times(2).toFixed();
    compare('water at 80 °C', 'pH', pH({ pKw }), printedOf('pure water at 80 C')('pH'));
  });

  test('0.042 M NaH₂PO₄ and 0.058 M Na₂HPO₄, pKa 6.86 (Lehninger, recalled)', () => {
    const acids = [{ pKa: ['6.86'], z0: -1, c: '0.100' }];
    const written = printedOf('0.042 M NaH2PO4')('pH');
    compare('phosphate', 'pH', pH({ acids, ions: { 'Na^+': '0.158' } }), written);
  });

  test('a buffer value of 0.115 for 0.2 mol/L of a half-neutralized acid (Van Slyke 1922, recalled)', () => {
    const acids = [{ pKa: ['7'], z0: 0, c: '0.2' }];
    const { bufferCapacity } = solved({ acids, ions: { 'Na^+': '0.1' }, pKw: '14' });
    compare('capacity', 'beta', bufferCapacity, printedOf('maximum buffer value')('beta'));
  });
});
