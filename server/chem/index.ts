/** The model's version, raised whenever a digit of an answer changes. */
export const engineVersion = '1';

export { decimals } from './decimals/arithmetic';
export { significant } from './decimals/settle-all';
export { type AcidBaseSystem, effectivePKa, invertedNeighbours, speciesOf } from './forms/system';
export { effectiveSystem, type SystemInMedium } from './forms/effective-system';
export type { PHPoints } from './forms/ph-points';
export { type FractionPoint, fractionPoints, fractionRows } from './forms/fraction-points';
export { predominanceRanges } from './forms/predominance';

export type { ConstantKind } from './constants/constant-kind';
export { pKAtTemperature } from './constants/pk-at-temperature';
export { pKAt, waterAt, type WaterProperties } from './water/water-at';
export { ionProductExponent } from './water/ion-product';
export { debyeHuckel } from './water/debye-huckel';
export { henryExponent } from './water/carbon-dioxide';
export { kelvinOf } from './water/kelvin';

export { type ActivityModel, largestCharge, usableTo } from './activity/ranges';
export type { ActivityChoice, SizedIon } from './activity/coefficients';
export { sizeAssumed } from './activity/coefficients';
export { sizeOf } from './activity/ion-sizes';
export { canonicalIon } from './activity/ion-names';
export { shownAs } from './activity/ion';
export { specificInteractionAmong } from './activity/specific-interaction';
export { pitzerAmong } from './activity/pitzer';

export { type Acid, type Balance, ionsOf } from './mixture/balance';
export { type Equilibrium, equilibrium } from './mixture/equilibrium';
export type { BalanceNumbers } from './mixture/numbers';

export { type BufferSolution, waterExponents } from './capacity/solution';
export { bufferCapacityPoints } from './capacity/buffer-capacity';
export { capacityMaxima } from './capacity/capacity-maxima';
export { isoelectricPoint } from './points/isoelectric-point';
export { pHForFraction } from './points/ph-for-fraction';
