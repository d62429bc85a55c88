/**
 * The model: speciation of polyprotic acid–base systems. Pure, and exact to every digit returned.
 * Raised whenever a digit of an answer changes.
 */
export const engineVersion = '1';

export { type AcidBaseSystem, effectivePKa, invertedNeighbours, speciesOf } from './system';
export type { Species } from './system';
export type { PHPoints } from './ph-points';
export { type FractionPoint, fractionPoints, fractionRows } from './fraction-points';
export { type PredominanceRange, predominanceRanges } from './predominance';
