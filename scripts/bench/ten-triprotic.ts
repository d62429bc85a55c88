import { type Balance, equilibrium } from '../../server/chem';
import { measure } from './measure';

const digits = 24;
const A = 0.509;
const pKw = 14;

/** Ten triprotic systems, each shifted by 0.17 against the last, half of each weighed in as form 1. */
const systems = Array.from({ length: 10 }, (_, k) => ({
  pKa: [2.148, 7.198, 12.35].map((pK) => (pK + 0.17 * k).toFixed(3)),
  concentration: (0.002 + 0.001 * k).toFixed(3),
  form: k % 3,
}));

const balanceOf = (model: 'ideal' | 'davies'): Balance => ({
  acids: systems.map(({ pKa, concentration, form }) => ({
    pKa,
    kinds: pKa.map(() => 'thermodynamic'),
    species: [0, -1, -2, -3].map((charge) => ({ name: undefined, charge })),
    reference: form,
    amount: concentration,
    held: false,
  })),
  inert: systems
    .filter(({ form }) => form > 0)
    .map(({ concentration, form }) => ({
      ion: { name: 'Na^+', charge: 1 },
      concentration: (Number(concentration) * form).toFixed(3),
    })),
  pKw: String(pKw),
  activity: { model, A: String(A), B: '0', linear: '0.3', ionicStrength: 'self-consistent' },
});

const numbers = systems.map(({ pKa, concentration, form }) => ({
  pKa: pKa.map(Number),
  c: Number(concentration),
  form,
}));
const sodium = numbers.reduce((sum, { c, form }) => sum + c * form, 0);

const davies = (I: number) => A * (Math.sqrt(I) / (1 + Math.sqrt(I)) - 0.3 * I);

/** Σ_j (weight of charge) c α_j at a pH as a textbook computes it: a power for each term. */
function textbook(pH: number, I: number) {
  const f = davies(I);
  let charge = sodium;
  let strength = sodium;
  for (const { pKa, c } of numbers) {
    const terms = [1];
    let exponent = 0;
    pKa.forEach((pK, j) => {
      // pK′ = pK° + f (2 z_{j−1} − 1).
      exponent += pH - (pK + f * (-2 * j - 1));
      terms.push(10 ** exponent);
    });
    const total = terms.reduce((sum, term) => sum + term, 0);
    terms.forEach((term, j) => {
      charge -= (c * j * term) / total;
      strength += (c * j * j * term) / total;
    });
  }
  const hydrogen = 10 ** (f - pH);
  const hydroxide = 10 ** (pH - pKw + f);
  return {
    charge: charge + hydrogen - hydroxide,
    strength: (strength + hydrogen + hydroxide) / 2,
  };
}

/** Bisection until neighbouring doubles. */
function bisected(I: number): number {
  let [low, high] = [-2, 16];
  for (;;) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) return middle;
    if (textbook(middle, I).charge > 0) low = middle;
    else high = middle;
  }
}

/** Bisection inside repetition on the ionic strength, until it stands still. */
function repeated(): number {
  let I = 0;
  for (;;) {
    const pH = bisected(I);
    const next = textbook(pH, I).strength;
    if (Math.abs(next - I) < 1e-14) return pH;
    I = next;
  }
}

function solved(model: 'ideal' | 'davies'): string {
  const found = equilibrium(balanceOf(model));
  const made = found.ok ? found.inDigits(digits) : found;
  if (!made.ok) throw new Error(made.reason);
  return made.numbers.pH;
}

/** Both must find the same pH before either is timed. */
function refuseDifferences() {
  const pairs = [
    [solved('ideal'), bisected(0)],
    [solved('davies'), repeated()],
  ] as const;
  for (const [ours, theirs] of pairs) {
    if (Math.abs(Number(ours) - theirs) > 1e-10) {
      throw new Error(`The engine says pH ${ours}, the bisection ${theirs}.`);
    }
  }
}

/** Ten triprotic systems to 24 digits, with everything in the flask, against doubles to 16. */
export function tenTriprotic(rounds: number) {
  refuseDifferences();
  const contenders = {
    'doubles: bisection, ideal': () => bisected(0),
    'engine: every number to 24 digits, ideal': () => solved('ideal'),
    'doubles: bisection in repetition, self-consistent': repeated,
    'engine: every number to 24 digits, self-consistent': () => solved('davies'),
  };
  const timings = measure(
    Object.entries(contenders).map(([name, run]) => ({ name, run, repeats: 40 })),
    rounds,
  );
  const [doubles, ideal, nested, consistent] = timings.map(({ milliseconds }) => milliseconds);
  return {
    title: 'ten triprotic components',
    timings,
    ratios: [
      { name: 'ideal: engine / doubles', ratio: (ideal ?? NaN) / (doubles ?? NaN) },
      { name: 'self-consistent: engine / doubles', ratio: (consistent ?? NaN) / (nested ?? NaN) },
    ],
  };
}
