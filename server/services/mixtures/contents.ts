import { chargeOfIon } from '../../../shared/ion';
import type { MixtureRequest } from '../../../shared/mixtures';
import { misfit } from '../chemistry/refuse';
import type { ResolvedSystem } from '../chemistry/resolved-system';
import { quotient, times } from './exact';
import { type InertContent, together } from './inert-content';
import { type PairContent, pairsOf } from './ion-pairs';

/** A component as it was weighed in. */
export interface WeighedContent {
  readonly kind: 'weighed';
  readonly system: ResolvedSystem;
  readonly place: string;
  readonly concentration: string;
  /** Index of the form weighed in. */
  readonly form: number;
  readonly counterIon: (InertContent & { readonly name: string }) | null;
  /** Whether a gas holds the same system: then of what was weighed in only the counter-ion stays. */
  readonly isHeld: boolean;
}

/** A component that a gas phase holds. */
export interface HeldContent {
  readonly kind: 'held';
  readonly system: ResolvedSystem;
  readonly place: string;
  /** Pa. */
  readonly partialPressure: string;
  /** mol/(kg atm); undefined where the temperature gives it. */
  readonly henryConstant: string | undefined;
  /** Index of the neutral form. */
  readonly form: number;
}

export type Content = WeighedContent | HeldContent;

/** Everything in the flask, its parts checked against each other. */
export interface Contents {
  readonly components: readonly Content[];
  readonly inert: readonly InertContent[];
  readonly pairs: readonly PairContent[];
}

type WithSystem<T> = T extends { system: unknown }
  ? Omit<T, 'system'> & { readonly system: ResolvedSystem }
  : never;
type ResolvedComponent = WithSystem<MixtureRequest['components'][number]>;

/** A request about a mixture in which every system is there in full. */
export type ResolvedMixture = Omit<MixtureRequest, 'components' | 'dryRun'> & {
  readonly components: readonly ResolvedComponent[];
  readonly dryRun?: boolean;
};

const lastForm = ({ pKa }: ResolvedSystem) => pKa.length;

type Weighed = Extract<ResolvedComponent, { form: unknown }>;

/** The index of the form weighed in. Refused with `no-such-form`. */
function formIndex({ system, form }: Weighed, place: string): number {
  const index = typeof form === 'number' ? form : system.fullyProtonatedCharge - form.charge;
  if (index >= 0 && index <= lastForm(system)) return index;
  const highest = system.fullyProtonatedCharge;
  const detail = `The forms are 0 to ${lastForm(system)}, of charges ${highest} to ${highest - lastForm(system)}.`;
  throw misfit('no-such-form', `${place}/form`, detail);
}

/** H⁺ and OH⁻ are what the answer is about. Refused with `ion-of-water`. */
function notOfWater(name: string, pointer: string): void {
  const field = { 'H^+': 'strongAcid', 'H3O^+': 'strongAcid', 'OH^-': 'strongBase' }[name];
  if (field === undefined) return;
  const detail = `${name} does not stand by as an inert ion: give what brings it under \`${field}\`, or the form that was weighed in.`;
  throw misfit('ion-of-water', pointer, detail);
}

const ordinaryCounterIon = (charge: number) => (charge > 0 ? 'Cl^-' : 'Na^+');

function counterIon(component: Weighed, charge: number, place: string) {
  const { concentration, counterIon: given } = component;
  if (charge === 0) {
    if (given === undefined) return null;
    const detail = 'The form weighed in is neutral: it brings no counter-ion.';
    throw misfit('counter-ion-not-needed', `${place}/counterIon`, detail);
  }
  const name = given ?? ordinaryCounterIon(charge);
  notOfWater(name, `${place}/counterIon`);
  const own = chargeOfIon(name);
  if (Math.sign(own) === Math.sign(charge)) {
    const detail = `The form weighed in has a charge of ${charge}: its counter-ion must have the other sign.`;
    throw misfit('counter-ion-charge', `${place}/counterIon`, detail);
  }
  const brought = quotient(times(concentration, Math.abs(charge)), String(Math.abs(own)));
  return { name, charge: own, concentration: brought };
}

function weighed(component: Weighed, place: string, isHeld: boolean): WeighedContent {
  const { system, concentration } = component;
  const form = formIndex(component, place);
  const charge = system.fullyProtonatedCharge - form;
  return {
    kind: 'weighed',
    system,
    place,
    concentration,
    form,
    counterIon: counterIon(component, charge, place),
    isHeld,
  };
}

/** What the solubility of a gas is known of. */
const knownGas = 'carbonic-acid';

function held(
  component: Extract<ResolvedComponent, { heldBy: unknown }>,
  place: string,
): HeldContent {
  const { system, heldBy } = component;
  const form = system.fullyProtonatedCharge;
  if (form < 0 || form > lastForm(system)) {
    const detail = 'A gas holds a neutral species, and this system has none.';
    throw misfit('no-neutral-form', `${place}/system`, detail);
  }
  if (heldBy.henryConstant === undefined && system.stored?.id !== knownGas) {
    const detail = 'Give the solubility of the gas: it is known here of carbonic-acid alone.';
    throw misfit('henry-constant-needed', `${place}/heldBy/henryConstant`, detail);
  }
  return { kind: 'held', system, place, form, ...heldBy, henryConstant: heldBy.henryConstant };
}

/** An ion as it is named under `ions`. Refused where its name has another charge. */
function ions({ ions: given }: ResolvedMixture): InertContent[] {
  return given.map(({ charge, concentration, ion }, i) => {
    const pointer = `/ions/${i}`;
    if (charge === 0) {
      throw misfit('ion-without-charge', `${pointer}/charge`, 'An ion has a charge.');
    }
    if (ion !== undefined && chargeOfIon(ion) !== charge) {
      const detail = `The name ${ion} says a charge of ${chargeOfIon(ion)}.`;
      throw misfit('ion-charge', `${pointer}/charge`, detail);
    }
    if (ion !== undefined) notOfWater(ion, `${pointer}/ion`);
    return { name: ion, charge, concentration };
  });
}

/** By which a system is told from another: its constants and charge, whatever it is called. */
const identityOf = ({ system }: ResolvedComponent) =>
  `${system.fullyProtonatedCharge} ${system.pKa.map(Number).join()}`;

/** What is in the flask. Refused with `invalid-request` where its parts do not fit each other. */
export function contentsOf(
  request: ResolvedMixture,
  placeOf = (index: number) => `/components/${index}`,
): Contents {
  const gases = request.components.flatMap((one) => ('heldBy' in one ? [identityOf(one)] : []));
  const components = request.components.map((component, i) => {
    const isHeld = gases.includes(identityOf(component));
    if (!('heldBy' in component)) return weighed(component, placeOf(i), isHeld);
    if (
      request.components.findIndex(
        (one) => 'heldBy' in one && identityOf(one) === identityOf(component),
      ) < i
    ) {
      throw misfit('given-twice', placeOf(i), 'One gas phase holds a system, not two.');
    }
    return held(component, placeOf(i));
  });
  const inert = together([
    ...components.flatMap((one) =>
      one.kind === 'weighed' && one.counterIon ? [one.counterIon] : [],
    ),
    ...(request.strongAcid === undefined
      ? []
      : [{ name: 'Cl^-', charge: -1, concentration: request.strongAcid }]),
    ...(request.strongBase === undefined
      ? []
      : [{ name: 'Na^+', charge: 1, concentration: request.strongBase }]),
    ...ions(request),
  ]);
  const paired = pairsOf(request.ionPairs, inert);
  return {
    components,
    inert: inert.filter(({ name }) => !paired.some(({ ion }) => ion === name)),
    pairs: paired,
  };
}
