import { nth } from '../decimals/nth';
import type { Balance } from './balance';
import type { DoubleBalance } from './double-balance';

/** Ionic strengths that fit a composition, in doubles, from the smallest on. */
export type FittingStrengths =
  | { readonly ok: true; readonly values: readonly number[] }
  | { readonly ok: false; readonly reason: 'no-ionic-strength' };

/**
 * An ionic strength that no composition of this balance exceeds: every ion at its highest charge,
 * and as much H⁺ or OH⁻ beside them as their charges could call for.
 */
function bound({ acids, inert }: Balance): number {
  let charge = 0;
  let strength = 0;
  for (const { amount, species } of acids) {
    const most = Math.max(...species.map((one) => Math.abs(one.charge)));
    strength += Number(amount) * most * most;
    charge += Number(amount) * (most + species.length);
  }
  for (const { ion, concentration } of inert) {
    strength += Number(concentration) * ion.charge ** 2;
    charge += Number(concentration) * Math.abs(ion.charge);
  }
  const highest = Math.max(1, ...acids.map(({ species }) => species.length));
  return (strength + (1 + highest) * charge) / 2 + 1e-3;
}

/** Points a scan has, and more for systems of many protons, whose charge can turn more often. */
const scanPoints = 150;
const pointsPerProton = 12;
/** Smallest ionic strength of the scan as a part of the bound. */
const depth = 1e-18;
const mostDoublings = 60;

/** The root between two strengths at which the sign of G(I) − I differs: Illinois, bisection. */
function between(excess: (I: number) => number, from: number, to: number): number {
  let [low, high, atLow, atHigh] = [from, to, excess(from), excess(to)];
  for (let i = 0; i < 120 && high - low > 4e-16 * high; i++) {
    const secant = high - (atHigh * (high - low)) / (atHigh - atLow);
    const middle = i % 3 === 2 || !(secant > low && secant < high) ? (low + high) / 2 : secant;
    const there = excess(middle);
    if (there === 0) return middle;
    if (there > 0 === atLow > 0) [low, atLow, atHigh] = [middle, there, atHigh / 2];
    else [high, atHigh, atLow] = [middle, there, atLow / 2];
  }
  return (low + high) / 2;
}

interface Point {
  readonly I: number;
  /** G(I) − I. */
  readonly over: number;
}

/** Whether G/I − 1 keeps its sign from point to point, and is nearest to 0 in the middle. */
function turns(before: Point, middle: Point, after: Point): boolean {
  const [left, here, right] = [before, middle, after].map(({ I, over }) => over / I);
  if (left === undefined || here === undefined || right === undefined) return false;
  const sameSign = left > 0 === here > 0 && here > 0 === right > 0;
  return sameSign && Math.abs(here) < Math.abs(left) && Math.abs(here) < Math.abs(right);
}

const golden = (Math.sqrt(5) - 1) / 2;
/** Golden sections of a turn: its place is known to a millionth then, its height far better. */
const mostSections = 30;

/**
 * A strength between two others at which G(I) − I has the other sign, where G/I turns between them:
 * two roots close together are no change of sign from one point of a scan to the next.
 */
function across(excess: (I: number) => number, from: number, to: number): number | undefined {
  const positive = excess(from) > 0;
  const [start, span] = [Math.log(from), Math.log(to / from)];
  const probe = (x: number) => {
    const I = Math.exp(start + x * span);
    return { I, distance: ((positive ? 1 : -1) * excess(I)) / I };
  };
  let [low, high] = [0, 1];
  let [left, right] = [probe(1 - golden), probe(golden)];
  for (let i = 0; i < mostSections; i++) {
    if (left.distance < 0) return left.I;
    if (right.distance < 0) return right.I;
    if (left.distance < right.distance) {
      [high, right] = [low + golden * (high - low), left];
      left = probe(high - golden * (high - low));
    } else {
      [low, left] = [high - golden * (high - low), right];
      right = probe(low + golden * (high - low));
    }
  }
  return undefined;
}

/**
 * All ionic strengths I = G(I), where G is that of the composition whose activity coefficients
 * belong to I. Continued from I = 0, where G ≥ I, upwards: the first change of sign is the smallest
 * root, further ones are the others.
 */
export function fittingStrengths(balance: Balance, doubles: DoubleBalance): FittingStrengths {
  let near: number | undefined;
  const excess = (I: number): number => {
    const { state, solution } = doubles.next([I], near);
    near = solution.lnU;
    return nth(state, 0) - I;
  };
  let end = bound(balance);
  for (let i = 0; excess(end) > 0; i++, end *= 2) {
    if (i === mostDoublings) return { ok: false, reason: 'no-ionic-strength' };
  }
  near = undefined;
  const protons = Math.max(0, ...balance.acids.map(({ pKa }) => pKa.length));
  const points = scanPoints + pointsPerProton * protons;
  const ratio = depth ** (-1 / points);
  const values: number[] = [];
  let before: Point | undefined;
  let last: Point = { I: 0, over: excess(0) };
  if (last.over <= 0) values.push(0);
  for (let i = 0; i <= points; i++) {
    const I = end * depth * ratio ** i;
    const here: Point = { I, over: excess(I) };
    if (!Number.isFinite(here.over)) return { ok: false, reason: 'no-ionic-strength' };
    if (before && before.I > 0 && turns(before, last, here)) {
      const middle = across(excess, before.I, I);
      if (middle !== undefined) {
        values.push(between(excess, before.I, middle), between(excess, middle, I));
      }
    }
    if (here.over > 0 !== last.over > 0) values.push(between(excess, last.I, I));
    [before, last] = [last, here];
  }
  return values.length === 0 ? { ok: false, reason: 'no-ionic-strength' } : { ok: true, values };
}
