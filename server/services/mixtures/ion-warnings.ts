import type { Warning } from '../../../shared/model';
import { shownAs, sizeAssumed, sizeOf } from '../../chem';
import type { ConditionsUsed } from '../chemistry/conditions-used';
import { pairName } from './balance-of';
import type { Contents } from './contents';

function sizes({ inert, pairs }: Contents): Warning[] {
  const ions = [
    ...inert,
    ...pairs.flatMap(({ ion, charge }) => [
      { name: ion, charge },
      { name: pairName(ion, charge), charge: charge - 1 },
    ]),
  ];
  const assumed = ions.filter((ion) => ion.charge !== 0 && sizeOf(ion) === undefined);
  if (assumed.length === 0) return [];
  const message = `No size is known of ${assumed.map(shownAs).join(', ')}: ${sizeAssumed} pm is assumed.`;
  return [{ code: 'ion-size-assumed', message }];
}

function names({ inert }: Contents): Warning[] {
  const unnamed = inert.filter(({ name }) => name === undefined);
  if (unnamed.length === 0) return [];
  const which = unnamed.map(shownAs).join(', ');
  const message = `Ions without a name (${which}): their ion-specific parameters count 0.`;
  return [{ code: 'unnamed-ion', message, pointer: '/ions' }];
}

function pairConstants({ pairs }: Contents, { temperature }: ConditionsUsed): Warning[] {
  const recalled = pairs.filter(({ isRecalled }) => isRecalled);
  if (recalled.length === 0 || Number(temperature) === 25) return [];
  const which = recalled.map(({ ion, charge, lgK }) => `lg K of ${pairName(ion, charge)} (${lgK})`);
  const message = `${which.join(', ')}: used as it is at 25 °C.`;
  return [{ code: 'pka-not-temperature-corrected', message, pointer: '/ionPairs' }];
}

/** What to know of ions that take no part, and of pairs, before anything is computed. */
export function ionWarnings(contents: Contents, conditions: ConditionsUsed): Warning[] {
  const { activityModel } = conditions;
  const byName = activityModel === 'specific-ion-interaction' || activityModel === 'pitzer';
  return [
    ...(activityModel === 'extended-debye-huckel' ? sizes(contents) : []),
    ...(byName ? names(contents) : []),
    ...pairConstants(contents, conditions),
  ];
}
