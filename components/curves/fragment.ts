import { systemInFull, systemReference } from '../../shared/system';
import type { Choice } from '../constants/choice';
import type { ReadFragment } from '../fragment/address';
import { formatPairs, readValues, type Pair } from '../fragment/pairs';
import type { CurvesState, Layer } from './curves-state';
import { firstState, givenConstants, layers, views } from './curves-state';
import { rangeOf } from './curve-grid';
import { pHWithin, typedPH } from './ph-steps';

const choicePairs = (choice: Choice): Pair[] =>
  choice.kind === 'stored'
    ? [['system', choice.id]]
    : [
        ['name', choice.system.name],
        ['charge', String(choice.system.fullyProtonatedCharge)],
        ['pKa', choice.system.pKa.join(',')],
      ];

/** The state as an address's fragment, without the `#`; what is as on a first visit is left out. */
export function formatFragment({ choice, pH, layers: shown, view }: CurvesState): string {
  return formatPairs([
    ...choicePairs(choice),
    ['pH', pH],
    ['layers', shown.length < layers.length ? shown.join(',') : undefined],
    ['view', view === firstState.view ? undefined : view],
  ]);
}

/**
 * Reads a fragment. What it leaves out is as on a first visit; so is, part by part, whatever in it
 * cannot be used, and `faulty` says so: an address is never a reason to show nothing.
 */
export function parseFragment(fragment: string): ReadFragment<CurvesState> {
  const { values, faulty: broken } = readValues(fragment, keys);
  const choice = readChoice(values);
  const drawn = choice === 'unusable' ? firstState.choice : choice;
  const range = rangeOf(givenConstants(drawn));
  const typed = typedPH(values.get('pH') ?? pHWithin(firstState.pH, range), range);
  const shown = readLayers(values.get('layers'));
  const view = views.find((name) => name === (values.get('view') ?? firstState.view));
  return {
    state: {
      choice: drawn,
      pH: typed.ok ? typed.pH : pHWithin(firstState.pH, range),
      layers: shown ?? layers,
      view: view ?? firstState.view,
    },
    faulty: broken || choice === 'unusable' || !typed.ok || !shown || !view,
  };
}

const keys = new Set(['system', 'name', 'charge', 'pKa', 'pH', 'layers', 'view']);

function readChoice(values: ReadonlyMap<string, string>): Choice | 'unusable' {
  const id = values.get('system');
  const charge = values.get('charge');
  const pKa = values.get('pKa');
  const typed = charge !== undefined || pKa !== undefined || values.has('name');
  if (id !== undefined) {
    const isReference = systemReference.safeParse(id).success;
    return typed || !isReference ? 'unusable' : { kind: 'stored', id };
  }
  if (!typed) return firstState.choice;
  const system = systemInFull.safeParse({
    name: values.get('name'),
    fullyProtonatedCharge: /^-?\d+$/.test(charge ?? '') ? Number(charge) : undefined,
    pKa: pKa?.split(','),
  });
  return system.success ? { kind: 'typed', system: system.data } : 'unusable';
}

function readLayers(text: string | undefined): readonly Layer[] | undefined {
  if (text === undefined) return layers;
  const asked = text === '' ? [] : text.split(',');
  const known = layers.filter((layer) => asked.includes(layer));
  return known.length === asked.length ? known : undefined;
}
