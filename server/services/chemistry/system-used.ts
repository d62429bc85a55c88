import { Exact } from '../../../shared/decimal';
import type { Warning } from '../../../shared/model';
import { pKAt, type SizedIon, sizeAssumed, sizeOf, type SystemInMedium } from '../../chem';
import type { ConditionsUsed } from './conditions-used';
import { chargeWarnings } from './ranges';
import { noAnswer } from './refuse';
import type { ResolvedSystem, Step } from './resolved-system';
import { constantsInWords, systemWarnings } from './warnings';

/** A system as it is computed under conditions. */
export interface SystemUsed {
  readonly system: ResolvedSystem;
  /** Constants at the temperature, taken as exact. */
  readonly inMedium: SystemInMedium;
  /** Whether the temperature moved a constant. */
  readonly isMoved: boolean;
  readonly warnings: readonly Warning[];
}

const reference = '25';

const isAt = (one: string, other: string) => new Exact(one).equals(other);

/** A constant at a temperature: as written where nothing moves it. */
function moved(pK: string, { temperature, thermo }: Step, to: string): string {
  if (!thermo || isAt(temperature, to)) return pK;
  if (isAt(temperature, reference)) return pKAt(to, { pK, ...thermo });
  // ΔH° is that of 25 °C: from there to the one temperature and to the other.
  const shift = (celsius: string) => new Exact(pKAt(celsius, { pK: '0', ...thermo }));
  return new Exact(pK).plus(shift(to)).minus(shift(temperature)).toFixed();
}

/** Whether a constant of a medium is asked about in another one. */
const isOutside = ({ kind, ionicStrength, temperature }: Step, conditions: ConditionsUsed) =>
  kind !== 'thermodynamic' &&
  conditions.isAsked &&
  (ionicStrength === null ||
    conditions.ionicStrength === 'self-consistent' ||
    !isAt(ionicStrength, conditions.ionicStrength) ||
    !isAt(temperature, conditions.temperature));

function outsideMedium(
  system: ResolvedSystem,
  conditions: ConditionsUsed,
  pointer: string,
): Warning[] {
  const which = system.steps.flatMap((step, i) => (isOutside(step, conditions) ? [i] : []));
  const first = which[0] === undefined ? undefined : system.steps[which[0]];
  if (!first) return [];
  const { kind, ionicStrength, temperature } = first;
  const medium =
    ionicStrength === null ? 'an unstated ionic strength' : `I = ${ionicStrength} mol/L`;
  const here =
    conditions.ionicStrength === 'self-consistent'
      ? 'whatever ionic strength the mixture has'
      : `I = ${conditions.ionicStrength} mol/L`;
  const message =
    `${constantsInWords(system, which)}: ${kind} constants for ${medium} and ${temperature} °C, ` +
    `asked about at ${here} and ${conditions.temperature} °C.`;
  if (conditions.outOfRange === 'refuse') {
    const help =
      'Ask at their own medium, give constants for this one, or "outOfRange": "compute" to use them as they are.';
    throw noAnswer('constants-outside-medium', pointer, `${message} ${help}`);
  }
  return [{ code: 'constants-outside-medium', message: `${message} Used as they are.`, pointer }];
}

function sizeWarnings(
  { activityModel }: ConditionsUsed,
  species: readonly SizedIon[],
  pointer: string,
): Warning[] {
  if (activityModel !== 'extended-debye-huckel') return [];
  const assumed = species.filter(
    (ion) => ion.charge !== 0 && ion.size === undefined && sizeOf(ion) === undefined,
  );
  if (assumed.length === 0) return [];
  const which = assumed.map(({ name, charge }) => name ?? `charge ${charge}`).join(', ');
  const message = `No size is known of ${which}: ${sizeAssumed} pm is assumed.`;
  return [{ code: 'ion-size-assumed', message, pointer }];
}

/**
 * A system under conditions: constants moved to the temperature, kinds, ions. Refused with
 * `no-answer` where its constants belong to another medium or its charges to no model.
 */
export function systemUsed(
  system: ResolvedSystem,
  conditions: ConditionsUsed,
  place: string,
): SystemUsed {
  const pointer = system.stored ? `${place}/id` : `${place}/pKa`;
  const pKa = system.pKa.map((pK, i) => {
    const step = system.steps[i];
    return step ? moved(pK, step, conditions.temperature) : pK;
  });
  const species = system.ions.map((name, j) => ({
    name,
    charge: system.fullyProtonatedCharge - j,
    size: system.ionSizes?.[j],
  }));
  return {
    system,
    inMedium: {
      fullyProtonatedCharge: system.fullyProtonatedCharge,
      pKa,
      kinds: system.steps.map(({ kind }) => kind),
      species,
    },
    isMoved: pKa.some((pK, i) => pK !== system.pKa[i]),
    warnings: [
      ...systemWarnings(system, pKa, conditions, place),
      ...outsideMedium(system, conditions, pointer),
      ...chargeWarnings(conditions, species, pointer),
      ...sizeWarnings(conditions, species, pointer),
    ],
  };
}
