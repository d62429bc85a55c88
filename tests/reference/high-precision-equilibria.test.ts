import Decimal from 'decimal.js';
import { bufferCapacityPoints, isoelectricPoint, waterExponents } from '../../server/chem';
import { balanceOf, solved } from '../support/solutions';
import reference from './data/high-precision-equilibria.json';

/**
 * Source: `source` of data/high-precision-equilibria.json, computed with 90 digits from the defining
 * relations by a program that shares nothing with ours. All 40 digits are compared, as numbers.
 * Fractions and charges stand in high-precision.test.ts, pKw and moved constants in water.test.ts.
 * Constants from sites and the isoelectric point of sites (macro_from_4_sites, pI_polyArg30) wait for
 * the operation on sites.
 */
const Wide = Decimal.clone({ defaults: true, precision: 100, rounding: Decimal.ROUND_HALF_EVEN });
const number = (value: string) => new Wide(value).toString();

interface System {
  pKa: string[];
  z0: number;
  C: string;
}
type Spectators = readonly (readonly [charge: number, concentration: string])[];

interface Row {
  id: string;
  kind: string;
  inputs: {
    pKw?: string;
    pKa?: string[];
    z0?: number;
    pH?: string;
    systems?: System[];
    spectators?: Spectators;
    A?: string;
    b?: string;
    V0?: string;
    titrant_volumes?: string[];
    titrant_systems?: System[];
    titrant_spectators?: Spectators;
  };
  answer: string | string[] | { pH: string; I: string } | null;
}

const rows = reference.rows as unknown as readonly Row[];
const rowsOf = (kind: string) =>
  rows.filter((row) => row.kind === kind).map((row) => [row.id, row] as const);

/** A share of every amount, as of a solution in a mixture; 80 digits, where 40 are compared. */
const times = (amount: string, share: Decimal) => new Wide(amount).times(share).toFixed(80);

const acidsOf = (systems: readonly System[] = [], share = new Wide(1)) =>
  systems.map(({ pKa, z0, C }) => ({ pKa, z0, c: times(C, share) }));

/** Ions of no name: charges count alone. Amounts of one charge are added up. */
function ionsOf(parts: readonly { spectators: Spectators | undefined; share: Decimal }[]) {
  const total = new Map<string, Decimal>();
  for (const { spectators = [], share } of parts) {
    for (const [charge, amount] of spectators) {
      const name = charge > 0 ? 'M^+' : 'X^-';
      expect(Math.abs(charge)).toBe(1);
      total.set(name, (total.get(name) ?? new Wide(0)).plus(times(amount, share)));
    }
  }
  return Object.fromEntries([...total].map(([name, amount]) => [name, amount.toFixed()]));
}

const whole = new Wide(1);

/** The numbers of an answer: of a mixture with a model pH and I, of a titration every pH. */
const numbersOf = ({ answer }: Row): string[] =>
  answer === null
    ? []
    : typeof answer === 'object' && 'pH' in answer
      ? [answer.pH, answer.I].map(number)
      : [answer].flat().map(number);

test('the rows are those that this file compares', () => {
  const kinds = [...new Set(rows.map(({ kind }) => kind))];
  expect(kinds.map((kind) => [kind, rowsOf(kind).length])).toEqual([
    ['isoelectric_point', 7],
    ['buffer_capacity_ideal', 4],
    ['equilibrium_pH_ideal', 12],
    ['equilibrium_pH_davies', 9],
    ['titration_ideal', 2],
  ]);
});

describe('forty digits computed elsewhere', () => {
  test.each(rowsOf('equilibrium_pH_ideal'))('pH of an ideal mixture: %s', (_, row) => {
    const { systems, spectators, pKw = '' } = row.inputs;
    const ions = ionsOf([{ spectators, share: whole }]);
    const { pH } = solved({ acids: acidsOf(systems), ions, pKw }, 40);
    expect([number(pH)]).toEqual(numbersOf(row));
  });

  test.each(rowsOf('equilibrium_pH_davies'))(
    'pH and ionic strength by Davies’s equation: %s',
    (_, row) => {
      const { systems, spectators, pKw = '', A = '', b = '' } = row.inputs;
      const { pH, ionicStrengthUsed } = solved(
        {
          acids: acidsOf(systems),
          ions: ionsOf([{ spectators, share: whole }]),
          pKw,
          A,
          linear: b,
          model: 'davies',
        },
        40,
      );
      expect([pH, ionicStrengthUsed].map(number)).toEqual(numbersOf(row));
    },
  );

  test.each(rowsOf('buffer_capacity_ideal'))('buffer capacity: %s', (_, row) => {
    const { systems = [], pH = '', pKw = '' } = row.inputs;
    const solution = {
      components: systems.map(({ pKa, z0, C }) => ({
        system: { fullyProtonatedCharge: z0, pKa },
        concentration: C,
      })),
      water: waterExponents(pKw, balanceOf({}).activity),
    };
    const [point] = bufferCapacityPoints(solution, { kind: 'list', values: [pH] }, 40);
    expect([number(point?.total ?? 'NaN')]).toEqual(numbersOf(row));
  });

  test.each(rowsOf('isoelectric_point'))('isoelectric point: %s', (_, row) => {
    const { pKa = [], z0 = NaN } = row.inputs;
    const found = isoelectricPoint({ fullyProtonatedCharge: z0, pKa }, 40);
    if (row.answer === null) {
      expect(found).toEqual({ ok: false, reason: 'charge-stays-positive' });
    } else {
      expect([found.ok ? number(found.pH) : found.reason]).toEqual(numbersOf(row));
    }
  });

  test.each(rowsOf('titration_ideal'))(
    'a titration, as the mixture of every point: %s',
    (_, row) => {
      const { V0 = '', titrant_volumes: volumes = [], pKw = '' } = row.inputs;
      const points = volumes.map((volume) => {
        const sum = new Wide(V0).plus(volume);
        const [sample, titrant] = [V0, volume].map((part) => new Wide(part).dividedBy(sum));
        return solved(
          {
            acids: [
              ...acidsOf(row.inputs.systems, sample),
              ...acidsOf(row.inputs.titrant_systems, titrant),
            ],
            ions: ionsOf([
              { spectators: row.inputs.spectators, share: sample ?? whole },
              { spectators: row.inputs.titrant_spectators, share: titrant ?? whole },
            ]),
            pKw,
          },
          40,
        ).pH;
      });
      expect(points.map(number)).toEqual(numbersOf(row));
    },
  );
});
