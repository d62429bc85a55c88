import type { z } from 'zod';
import { concentration, heldComponent } from '../../shared/components';
import { activityModels, ionicStrengthValue } from '../../shared/conditions';
import { chargeOfIon, ionInput } from '../../shared/ion';
import { limits } from '../../shared/limits';
import { quantity } from '../../shared/quantity';
import { systemInFull, systemReference } from '../../shared/system';
import type { Choice } from '../constants/choice';
import type { ReadFragment } from '../fragment/address';
import { formatPairs, readPairs, type Pair } from '../fragment/pairs';
import { electrolyteNames } from './electrolytes';
import type { ElectrolytePart, MixtureState, WeighedPart } from './mixture-state';
import { emptyFlask, firstState } from './mixture-state';

const partPairs = ({ choice, form, counterIon, concentration: c }: WeighedPart): Pair[] => [
  ...(choice.kind === 'stored'
    ? ([['system', choice.id]] as const)
    : ([
        ['charge', String(choice.system.fullyProtonatedCharge)],
        ['name', choice.system.name],
        ['pKa', choice.system.pKa.join(',')],
      ] as const)),
  ['form', form === undefined ? undefined : String(form)],
  ['ion', counterIon],
  ['c', c],
];

const unless = (usual: string, value: string) => (value === usual ? undefined : value);

/**
 * The state as an address's fragment, without the `#`. Components one after the other, each from
 * its `system` or `charge` on; what is as in an empty flask is left out, but for the temperature,
 * which tells an empty flask from a first visit.
 */
export const formatFragment = (state: MixtureState): string =>
  formatPairs([
    ...state.parts.flatMap(partPairs),
    ...state.electrolytes.flatMap(({ name, concentration: c }): Pair[] => [
      ['salt', name],
      ['c', c],
    ]),
    ['acid', unless(emptyFlask.strongAcid, state.strongAcid)],
    ['base', unless(emptyFlask.strongBase, state.strongBase)],
    ['air', state.air],
    ['T', state.temperature],
    ['model', unless(emptyFlask.model, state.model)],
    ['I', state.ionicStrength],
    ['beyond', state.beyond ? 'compute' : undefined],
  ]);

const opening = new Set(['system', 'charge', 'salt']);
const ofPart = new Set([...opening, 'name', 'pKa', 'form', 'ion', 'c']);
const ofFlask = new Set(['acid', 'base', 'air', 'T', 'model', 'I', 'beyond']);
const keys = new Set([...ofPart, ...ofFlask]);

type Values = ReadonlyMap<string, string>;

/**
 * Reads a fragment. An empty one is a first visit; another holds what it says and nothing else.
 * What cannot be used is left out, and `faulty` says so: an address is never a reason to show
 * nothing.
 */
export function parseFragment(fragment: string): ReadFragment<MixtureState> {
  const { pairs, faulty: broken } = readPairs(fragment, keys);
  if (pairs.length === 0) return { state: firstState, faulty: broken };
  const { groups, flask, faulty: loose } = gather(pairs);
  const read = groups.map(readGroup);
  const parts = read.flatMap((one) => (one && 'choice' in one ? one : []));
  const electrolytes = read.flatMap((one) => (one && 'name' in one ? one : []));
  const { state, faulty: unusable } = readFlask(flask);
  return {
    state: {
      ...state,
      parts: parts.slice(0, limits.components),
      electrolytes: electrolytes.slice(0, electrolytesAtMost),
    },
    faulty:
      broken ||
      loose ||
      unusable ||
      read.includes(undefined) ||
      parts.length > limits.components ||
      electrolytes.length > electrolytesAtMost,
  };
}

/** Each brings at most two ions, and the contract takes so many. */
export const electrolytesAtMost = limits.ions / 2;

/** Pairs by what they are of; a key that stands twice, or before anything it is of, is a fault. */
function gather(pairs: readonly (readonly [string, string])[]) {
  const groups: Map<string, string>[] = [];
  const flask = new Map<string, string>();
  let faulty = false;
  for (const [key, value] of pairs) {
    if (opening.has(key)) groups.push(new Map());
    const place = ofFlask.has(key) ? flask : groups.at(-1);
    if (!place || place.has(key)) faulty = true;
    else place.set(key, value);
  }
  return { groups, flask, faulty };
}

function readGroup(values: Values): WeighedPart | ElectrolytePart | undefined {
  const amount = concentration.safeParse(values.get('c'));
  if (!amount.success) return undefined;
  const salt = values.get('salt');
  if (salt !== undefined) {
    const name = electrolyteNames.find((known) => known === salt);
    return name && values.size === 2 ? { name, concentration: amount.data } : undefined;
  }
  const choice = readChoice(values);
  const form = readForm(values.get('form'), choice);
  const counterIon = readIon(values.get('ion'));
  if (!choice || form === 'unusable' || counterIon === 'unusable') return undefined;
  return { choice, form, counterIon, concentration: amount.data };
}

function readChoice(values: Values): Choice | undefined {
  const id = values.get('system');
  if (id !== undefined) {
    const typed = values.has('pKa') || values.has('name');
    return typed || !systemReference.safeParse(id).success ? undefined : { kind: 'stored', id };
  }
  const charge = values.get('charge') ?? '';
  const system = systemInFull.safeParse({
    name: values.get('name'),
    fullyProtonatedCharge: /^-?\d+$/.test(charge) ? Number(charge) : undefined,
    pKa: values.get('pKa')?.split(','),
  });
  return system.success ? { kind: 'typed', system: system.data } : undefined;
}

function readForm(text: string | undefined, choice: Choice | undefined) {
  if (text === undefined) return undefined;
  const most = choice?.kind === 'typed' ? choice.system.pKa.length : limits.protons;
  return /^\d{1,2}$/.test(text) && Number(text) <= most ? Number(text) : 'unusable';
}

function readIon(text: string | undefined) {
  if (text === undefined) return undefined;
  const ion = ionInput.safeParse(text);
  return ion.success && Math.abs(chargeOfIon(ion.data)) <= 2 ? ion.data : 'unusable';
}

const pressure = heldComponent.shape.heldBy.shape.partialPressure;
const temperature = quantity('temperature', limits.temperature);

/** What is of the flask as a whole, part by part; the usual where a part cannot be used. */
function readFlask(values: Values) {
  const unusable: string[] = [];
  const read = <Usual>(key: string, usual: Usual, schema: z.ZodType<string>): string | Usual => {
    const text = values.get(key);
    if (text === undefined) return usual;
    const result = schema.safeParse(text);
    if (result.success) return result.data;
    unusable.push(key);
    return usual;
  };
  const model = values.get('model') ?? emptyFlask.model;
  const known = activityModels.find((name) => name === model);
  const beyond = values.get('beyond');
  const state = {
    strongAcid: read('acid', emptyFlask.strongAcid, concentration),
    strongBase: read('base', emptyFlask.strongBase, concentration),
    air: read('air', undefined, pressure),
    temperature: read('T', emptyFlask.temperature, temperature),
    model: known ?? emptyFlask.model,
    ionicStrength: read('I', undefined, ionicStrengthValue),
    beyond: beyond === 'compute',
  };
  const strange = !known || (beyond !== undefined && beyond !== 'compute');
  return { state, faulty: strange || unusable.length > 0 };
}
