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
  components: 24,
  ions: 24,
  temperature: { from: '0', to: '100', decimals: 20 },
  ionicStrength: { from: '0', to: '20', decimals: 40 },
  concentration: { from: '0', to: '50', decimals: 60 },
  pressure: { from: '0', to: '1e7', decimals: 40 },
  deltaH: { from: '-500', to: '500', decimals: 20 },
  deltaCp: { from: '-5000', to: '5000', decimals: 20 },
  ionSize: { from: '50', to: '5000', decimals: 10 },
  cost: 12_000_000,
  costOfOneUnit: 10_000,
  publicCost: 1_200_000,
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

/**
 * Points that a question without points is worth: a solution of a mixture’s charge balance, with
 * what it is counted by; the search for maxima of a capacity; a root of a system alone.
 */
export const pointsWorth = {
  mixture: {
    points: 35,
    pointsPerProton: 3,
    /** Species that the water and the search count as. */
    water: 20,
    leastDigits: 30,
    /** Ions by which each of these models’ work doubles. */
    interactionIons: 100,
    pitzerIons: 20,
  },
  capacityMaxima: 100,
  root: 60,
} as const;

/** Compute units of a cost: one for each 10,000 begun. */
export const computeUnitsOf = (cost: number) => Math.ceil(cost / limits.costOfOneUnit);
