import type { Warning } from '../../../shared/model';
import { shownAs, sizeAssumed, sizeOf } from '../../chem';
import type { ConditionsUsed } from '../chemistry/conditions-used';
import { pairName } from './balance-of';
import type { Contents } from './contents';
import { systemOfIon } from './protolytes';

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

function protolytes({ inert }: Contents): Warning[] {
  return inert.flatMap(({ name }) => {
    const system = name === undefined ? undefined : systemOfIon(name);
    if (name === undefined || system === undefined) return [];
    const message = `${name} is taken as inert, and takes part in proton transfer: give it as a component of ${system}.`;
    return [{ code: 'ion-takes-part', message, pointer: '/ions' }] as const;
  });
}

/** What was weighed in of a system that a gas holds: it goes into the gas, or comes from it. */
function held({ components }: Contents): Warning[] {
  return components.flatMap((one) => {
    if (one.kind === 'held' || !one.isHeld) return [];
    const message = `${one.system.name ?? 'This system'} is held by the gas: of what was weighed in, only the counter-ion stays.`;
    return [{ code: 'held-by-gas', message, pointer: one.place }] as const;
  });
}

/** Notes of stored systems that were weighed in, each once. */
function notes({ components }: Contents): Warning[] {
  const told = new Set<string>();
  return components.flatMap((one) => {
    const { stored, name } = one.system;
    if (one.kind === 'held' || !stored?.note || told.has(stored.id)) return [];
    told.add(stored.id);
    const message = `${name ?? stored.id}: ${stored.note}`;
    return [{ code: 'note-of-system', message, pointer: `${one.place}/system/id` }] as const;
  });
}

/** What to know of ions that take no part, of gases and of pairs, before anything is computed. */
export function ionWarnings(contents: Contents, conditions: ConditionsUsed): Warning[] {
  const { activityModel } = conditions;
  const byName = activityModel === 'specific-ion-interaction' || activityModel === 'pitzer';
  return [
    ...notes(contents),
    ...held(contents),
    ...protolytes(contents),
    ...(activityModel === 'extended-debye-huckel' ? sizes(contents) : []),
    ...(byName ? names(contents) : []),
    ...pairConstants(contents, conditions),
  ];
}
