import { z } from 'zod';
import { limits, pointsWorth } from './limits';

const { mixture, capacityMaxima, root } = pointsWorth;
const costFormula =
  'cost = sum over systems of points × (protons + 1) × (digits + 20); ' +
  `maxima of a buffer capacity count as ${capacityMaxima} more points, an isoelectric point or a pH for a fraction as ${root}. ` +
  `A solution of a mixture, or an isoionic point, counts as (${mixture.points} + ${mixture.pointsPerProton} × most protons of a system) points × (species and ions + ${mixture.water}) × (digits, at least ${mixture.leastDigits}, + 20), ` +
  `by specific-ion-interaction × (1 + species and ions / ${mixture.interactionIons}), by pitzer × (1 + species and ions / ${mixture.pitzerIons}); ` +
  `where dpH/dT is known, four solutions with ${mixture.leastDigits} digits are added`;
const unitFormula = `computeUnits = ceil(cost / ${limits.costOfOneUnit})`;

const count = (description: string, example: number) => z.int().meta({ description, example });
const decimal = (description: string, example: string) =>
  z.string().meta({ description, example, 'x-unit': '1' });

const decimalRange = (
  id: string,
  description: string,
  { from, to, decimals }: typeof limits.pKa | typeof limits.pH,
) =>
  z
    .strictObject({
      from: decimal('Smallest value.', from),
      to: decimal('Greatest value.', to),
      decimals: count('Decimals at most.', decimals),
    })
    .meta({ id, description });

/** Answer of GET /v1/limits. */
export const limitsAnswer = z
  .strictObject({
    bodyBytes: count('Bytes of a request body.', limits.bodyBytes),
    systems: count('Systems in one call.', limits.systems),
    protons: count('Protons of one system.', limits.protons),
    pHPoints: count('pH points in one call.', limits.pHPoints),
    digits: z
      .strictObject({
        from: count('Fewest digits.', limits.digits.from),
        to: count('Most digits.', limits.digits.to),
        default: count('Digits where none are asked for.', limits.digits.default),
      })
      .meta({ id: 'DigitLimits', description: 'Digits of an answer.' }),
    pKa: decimalRange('PKaLimits', 'Stepwise constants.', limits.pKa),
    pH: decimalRange('PHLimits', 'pH values.', limits.pH),
    cost: z
      .strictObject({
        formula: z.string().meta({ description: 'How cost is counted.', example: costFormula }),
        most: count('Cost of one call with a key.', limits.cost),
        mostPublic: count('Cost of one public call.', limits.publicCost),
      })
      .meta({ id: 'CostLimits', description: 'Work of one call.' }),
    computeUnits: z
      .strictObject({
        formula: z.string().meta({ description: 'How units are counted.', example: unitFormula }),
        costOfOneUnit: count('Cost of one unit.', limits.costOfOneUnit),
      })
      .meta({ id: 'ComputeUnits', description: 'What a call counts.' }),
    callsPerMinute: z
      .strictObject({
        key: count(
          'Calls a minute of one operation by one key or person.',
          limits.keyedCallsPerMinute,
        ),
        address: count(
          'Calls a minute of one public operation from one address.',
          limits.publicCallsPerMinute,
        ),
      })
      .meta({ id: 'RateLimits', description: 'How often.' }),
  })
  .meta({ id: 'Limits', description: 'What one call may ask for.' });

export type LimitsAnswer = z.infer<typeof limitsAnswer>;

/** The limits as they stand. */
export const limitsInForce: LimitsAnswer = {
  bodyBytes: limits.bodyBytes,
  systems: limits.systems,
  protons: limits.protons,
  pHPoints: limits.pHPoints,
  digits: limits.digits,
  pKa: limits.pKa,
  pH: limits.pH,
  cost: { formula: costFormula, most: limits.cost, mostPublic: limits.publicCost },
  computeUnits: { formula: unitFormula, costOfOneUnit: limits.costOfOneUnit },
  callsPerMinute: { key: limits.keyedCallsPerMinute, address: limits.publicCallsPerMinute },
};
