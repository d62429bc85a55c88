import { chargeOfIon } from '../../../shared/ion';
import type { MixtureRequest } from '../../../shared/mixtures';
import { misfit } from '../chemistry/refuse';
import type { ResolvedSystem } from '../chemistry/resolved-system';
import { quotient, sumOf, times } from './exact';

/** An ion that takes no part, with how it came here. */
export interface InertContent {
  readonly name: string | undefined;
  readonly charge: number;
  readonly concentration: string;
}

/** A component as it was weighed in. */
export interface WeighedContent {
  readonly kind: 'weighed';
  readonly system: ResolvedSystem;
  readonly place: string;
  readonly concentration: string;
  /** Index of the form weighed in. */
  readonly form: number;
  readonly counterIon: (InertContent & { readonly name: string }) | null;
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

/** A cation that pairs with hydroxide. */
export interface PairContent {
  readonly ion: string;
  readonly charge: number;
  readonly lgK: string;
  /** Whether it is ours, of 25 °C, and not the caller’s. */
  readonly isRecalled: boolean;
  readonly concentration: string;
}

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

const ordinaryCounterIon = (charge: number) => (charge > 0 ? 'Cl^-' : 'Na^+');

function counterIon(component: Weighed, charge: number, place: string) {
  const { concentration, counterIon: given } = component;
  if (charge === 0) {
    if (given === undefined) return null;
    const detail = 'The form weighed in is neutral: it brings no counter-ion.';
    throw misfit('counter-ion-not-needed', `${place}/counterIon`, detail);
  }
  const name = given ?? ordinaryCounterIon(charge);
  const own = chargeOfIon(name);
  if (Math.sign(own) === Math.sign(charge)) {
    const detail = `The form weighed in has a charge of ${charge}: its counter-ion must have the other sign.`;
    throw misfit('counter-ion-charge', `${place}/counterIon`, detail);
  }
  const brought = quotient(times(concentration, Math.abs(charge)), String(Math.abs(own)));
  return { name, charge: own, concentration: brought };
}

function weighed(component: Weighed, place: string): WeighedContent {
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
    return { name: ion, charge, concentration };
  });
}

/** Ions of one name are one entry; unnamed ones stay apart. */
function together(all: readonly InertContent[]): InertContent[] {
  const named = new Map<string, InertContent>();
  const unnamed: InertContent[] = [];
  for (const ion of all) {
    if (ion.name === undefined) unnamed.push(ion);
    else {
      const before = named.get(ion.name)?.concentration ?? '0';
      named.set(ion.name, { ...ion, concentration: sumOf(before, ion.concentration) });
    }
  }
  return [...named.values(), ...unnamed];
}

/** lg K of CaOH⁺ at 25 °C and I = 0: common practice, recalled from critical tables. */
const knownPairs: ReadonlyMap<string, string> = new Map([['Ca^2+', '1.3']]);

function pairs({ ionPairs }: ResolvedMixture, inert: readonly InertContent[]): PairContent[] {
  return ionPairs.map(({ ion, lgK }, i) => {
    const pointer = `/ionPairs/${i}`;
    const present = inert.find(({ name }) => name === ion);
    if (!present) {
      throw misfit('no-such-ion', `${pointer}/ion`, `There is no ${ion} in the mixture.`);
    }
    if (present.charge < 0) {
      throw misfit('ion-charge', `${pointer}/ion`, 'An anion does not pair with hydroxide.');
    }
    if (ionPairs.findIndex((other) => other.ion === ion) !== i) {
      throw misfit('given-twice', `${pointer}/ion`, `The pair of ${ion} is given twice.`);
    }
    const constant = lgK ?? knownPairs.get(ion);
    if (constant === undefined) {
      const detail = 'Give lg K: it is known here of Ca^2+ alone.';
      throw misfit('missing', `${pointer}/lgK`, detail);
    }
    const { charge, concentration } = present;
    return { ion, charge, lgK: constant, isRecalled: lgK === undefined, concentration };
  });
}

/** What is in the flask. Refused with `invalid-request` where its parts do not fit each other. */
export function contentsOf(
  request: ResolvedMixture,
  placeOf = (index: number) => `/components/${index}`,
): Contents {
  const components = request.components.map((component, i) =>
    'heldBy' in component ? held(component, placeOf(i)) : weighed(component, placeOf(i)),
  );
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
  const paired = pairs(request, inert);
  return {
    components,
    inert: inert.filter(({ name }) => !paired.some(({ ion }) => ion === name)),
    pairs: paired,
  };
}
