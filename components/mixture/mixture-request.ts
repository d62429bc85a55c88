import type { z } from 'zod';
import type { component as componentSchema } from '../../shared/components';
import type { Conditions } from '../../shared/conditions';
import { Exact } from '../../shared/decimal';
import type { PublicMixtureRequestInput } from '../../shared/mixtures';
import { systemAsked, type Choice } from '../constants/choice';
import { ammonium, counterIonOf } from './counter-ions';
import { electrolyteOf } from './electrolytes';
import { formOf, unchargedForm, type KnownSystem } from './known-system';
import type { ElectrolytePart, MixtureState, WeighedPart } from './mixture-state';
import { chargeOf } from './salt-formula';

type ComponentAsked = z.input<typeof componentSchema>;

/** A component of the call, and what on the screen it came from. */
interface Asked {
  readonly component: ComponentAsked;
  readonly of: number | 'air';
}

/** A call, and the place on the screen that each of its lists’ entries came from. */
export interface MixtureAsked {
  readonly body: PublicMixtureRequestInput;
  /** By index of `components`. */
  readonly components: readonly (number | 'air')[];
  /** By index of `ions`. */
  readonly ions: readonly number[];
}

/** The handbook's systems as they were read; undefined for one that is not here yet. */
export type SystemOf = (choice: Choice) => KnownSystem | undefined;

const ammonia = { id: 'ammonia' } as const;
const ammoniaForm = 1;

const times = (concentration: string, count: number) =>
  count === 1 ? concentration : new Exact(concentration).times(count).toFixed();

/**
 * A part as the call asks for it; undefined where the forms of its system must be known for that,
 * and are not yet. The usual counter-ion is left to the contract.
 */
function weighed(part: WeighedPart, system: KnownSystem | undefined): ComponentAsked[] | undefined {
  const { choice, counterIon, concentration } = part;
  const asked = { system: systemAsked(choice), concentration };
  if (!system) {
    if (part.form === undefined || counterIon === ammonium) return undefined;
    return [{ ...asked, form: part.form, ...(counterIon !== undefined && { counterIon }) }];
  }
  const form = formOf(part.form, system);
  const charge = system.fullyProtonatedCharge - form;
  const uncharged = unchargedForm(system);
  if (counterIon === ammonium && charge < 0 && uncharged !== undefined) {
    return [
      { ...asked, form: uncharged },
      { system: ammonia, form: ammoniaForm, concentration: times(concentration, -charge) },
    ];
  }
  const isOwn = charge !== 0 && counterIonOf(charge, counterIon) === counterIon;
  return [{ ...asked, form, ...(isOwn && { counterIon }) }];
}

const ionsOf = ({ name, concentration }: ElectrolytePart) =>
  electrolyteOf(name).ions.map(({ ion, count }) => ({
    charge: chargeOf(ion),
    concentration: times(concentration, count),
    ion,
  }));

/** The conditions as the call says them: nothing is left to a default. */
export function conditionsAsked(state: MixtureState): Conditions {
  const { temperature, ionicStrength, model, beyond } = state;
  return {
    temperature,
    activityModel: model,
    ionicStrength: ionicStrength ?? 'self-consistent',
    ...(beyond && { outOfRange: 'compute' }),
  };
}

const amount = (key: 'strongAcid' | 'strongBase', value: string) =>
  Number(value) === 0 ? {} : { [key]: value };

/**
 * The call that answers the screen. Undefined while a system whose forms must be known for it is
 * not here yet.
 */
export function mixtureAsked(state: MixtureState, systemOf: SystemOf): MixtureAsked | undefined {
  const perPart = state.parts.map((part) => weighed(part, systemOf(part.choice)));
  if (perPart.includes(undefined)) return undefined;
  const asked: Asked[] = perPart.flatMap((some = [], of) =>
    some.map((component) => ({ component, of })),
  );
  if (state.air !== undefined) {
    const heldBy = { partialPressure: state.air };
    asked.push({ component: { system: { id: 'carbonic-acid' }, heldBy }, of: 'air' });
  }
  const ions = state.electrolytes.flatMap((one, of) => ionsOf(one).map((ion) => ({ ion, of })));
  const pairs = new Set(state.electrolytes.flatMap(({ name }) => electrolyteOf(name).pairs ?? []));
  return {
    body: {
      components: asked.map(({ component }) => component),
      ...amount('strongAcid', state.strongAcid),
      ...amount('strongBase', state.strongBase),
      ...(ions.length > 0 && { ions: ions.map(({ ion }) => ion) }),
      ...(pairs.size > 0 && { ionPairs: [...pairs].map((ion) => ({ ion })) }),
      conditions: conditionsAsked(state),
    },
    components: asked.map(({ of }) => of),
    ions: ions.map(({ of }) => of),
  };
}

/** What the flask is tried with, mol/L of strong acid. */
export const trialAcid = '0.005';

/** The same flask with a little more strong acid in it. */
export const withTrialAcid = (body: PublicMixtureRequestInput): PublicMixtureRequestInput => ({
  ...body,
  strongAcid: new Exact(body.strongAcid ?? '0').plus(trialAcid).toFixed(),
});

/** The places in a call's components of each system that was weighed in, once a system. */
export function systemsIn({ components = [] }: PublicMixtureRequestInput): number[][] {
  const found = new Map<string, number[]>();
  components.forEach((one, index) => {
    if (!('concentration' in one)) return;
    const key = JSON.stringify(one.system);
    found.set(key, [...(found.get(key) ?? []), index]);
  });
  return [...found.values()];
}
