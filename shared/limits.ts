/** What one call may ask for. Published at GET /v1/limits and enforced before work starts. */
export const limits = {
  bodyBytes: 1_000_000,
  systems: 100,
  protons: 64,
  pHPoints: 5_001,
  digits: { from: 1, to: 60, default: 16 },
  pKa: { from: '-50', to: '70', decimals: 60 },
  pH: { from: '-20', to: '40', decimals: 60 },
  fullyProtonatedCharge: { from: -100, to: 100 },
  cost: 12_000_000,
  costOfOneUnit: 10_000,
  publicCost: 800_000,
  publicCallsPerMinute: 240,
  keyedCallsPerMinute: 1_200,
} as const;

/**
 * Work of one system: points × species × (digits + 20). The 20 is what a number costs beside its
 * digits, in time and in memory; without it a call for millions of one-digit numbers looks cheap.
 * A call's cost is the sum over its systems.
 */
export const costOf = (points: number, species: number, digits: number) =>
  points * species * (digits + 20);

/** Compute units of a cost: one for each 10,000 begun. */
export const computeUnitsOf = (cost: number) => Math.ceil(cost / limits.costOfOneUnit);
