import type { Answered } from './mixture-queries';
import { shownIons, shownSystems } from './shown-mixture';

const head = ['component', 'species', 'c/(mol/L)', 'fraction', 'activity coefficient'] as const;

/** Each species and ion of the mixture, digit for digit, in columns. */
export function mixtureRows(answered: Answered): string[][] {
  const systems = shownSystems(answered).flatMap(({ title, species }) =>
    species.map(({ formula, concentration, fraction, activityCoefficient }) => [
      title,
      formula,
      concentration,
      fraction,
      activityCoefficient,
    ]),
  );
  const ions = shownIons(answered).map(({ ion, concentration, activityCoefficient }) => [
    '',
    ion,
    concentration,
    '',
    activityCoefficient,
  ]);
  return [[...head], ...systems, ...ions];
}

/** What the answer says of the flask as a whole, digit for digit. */
export const mixtureFigures = ({ answer }: Answered): string[][] => [
  ['pH', answer.pH],
  ['-lg c(H+)', answer.pHOfConcentration],
  ['ionic strength used, mol/L', answer.ionicStrengthUsed],
  ['ionic strength of the ions, mol/L', answer.ionicStrengthOfComposition],
  ['buffer capacity, mol/L per pH', answer.bufferCapacity],
];
