import { totalAsked } from '../conditions/asked-quantities';
import { typedQuantity } from '../conditions/typed-quantity';
import type { ReadFragment } from '../fragment/address';
import { formatPairs, readPairs, readValues } from '../fragment/pairs';
import { askedKeys, askedPairs, givenConstants, readAsked } from './curve-asked';
import { rangeOf, widestRange } from './curve-grid';
import type { CurvesState, Layer } from './curves-state';
import { besideAtMost, firstState, layers, views } from './curves-state';
import { pHWithin, typedPH } from './ph-steps';

const listed = (shown: readonly Layer[]) => shown.join(',');

/** The state as an address's fragment, without the `#`; what is as on a first visit is left out. */
export function formatFragment(state: CurvesState): string {
  const { pH, layers: shown, view, total, beside } = state;
  return formatPairs([
    ...askedPairs(state),
    ['pH', pH],
    ['c', total === firstState.total ? undefined : total],
    ['layers', listed(shown) === listed(firstState.layers) ? undefined : listed(shown)],
    ['view', view === firstState.view ? undefined : view],
    ...beside.map((asked) => ['with', formatPairs(askedPairs(asked))] as const),
  ]);
}

const ownKeys: ReadonlySet<string> = new Set(askedKeys);
const keys = new Set([...askedKeys, 'pH', 'c', 'layers', 'view', 'with']);

/**
 * Reads a fragment. What it leaves out is as on a first visit; so is, part by part, whatever in it
 * cannot be used, and `faulty` says so: an address is never a reason to show nothing.
 */
export function parseFragment(fragment: string): ReadFragment<CurvesState> {
  const { pairs, faulty: broken } = readPairs(fragment, keys);
  const single = pairs.filter(([key]) => key !== 'with');
  const values = new Map(single.toReversed());
  const { asked, faulty } = readAsked(values);
  const first = rangeOf(givenConstants(asked.choice));
  // How far a stored system is drawn is known only with its constants.
  const typed = typedPH(
    values.get('pH') ?? pHWithin(firstState.pH, first),
    asked.choice.kind === 'typed' ? first : widestRange,
  );
  const shown = readLayers(values.get('layers'));
  const view = views.find((name) => name === (values.get('view') ?? firstState.view));
  const total = readTotal(values.get('c'));
  const beside = readBeside(pairs.flatMap(([key, value]) => (key === 'with' ? [value] : [])));
  return {
    state: {
      ...asked,
      pH: typed.ok ? typed.pH : pHWithin(firstState.pH, first),
      layers: shown ?? firstState.layers,
      view: view ?? firstState.view,
      total: total ?? firstState.total,
      beside: beside.curves,
    },
    faulty:
      broken ||
      faulty ||
      beside.faulty ||
      values.size < single.length ||
      !typed.ok ||
      !shown ||
      !view ||
      !total,
  };
}

function readLayers(text: string | undefined): readonly Layer[] | undefined {
  if (text === undefined) return firstState.layers;
  const asked = text === '' ? [] : text.split(',');
  const known = layers.filter((layer) => asked.includes(layer));
  return known.length === asked.length ? known : undefined;
}

/** In mol/L, or with a unit. */
function readTotal(text: string | undefined): string | undefined {
  const typed = typedQuantity(text ?? firstState.total, { ...totalAsked, unit: 'mol/L' });
  return typed.ok ? typed.value : undefined;
}

function readBeside(fragments: readonly string[]) {
  const read = fragments.slice(0, besideAtMost).map((fragment) => {
    const { values, faulty } = readValues(fragment, ownKeys);
    const { asked, faulty: unusable } = readAsked(values);
    return { asked, faulty: faulty || unusable };
  });
  return {
    curves: read.flatMap(({ asked, faulty }) => (faulty ? [] : [asked])),
    faulty: fragments.length > besideAtMost || read.some(({ faulty }) => faulty),
  };
}
