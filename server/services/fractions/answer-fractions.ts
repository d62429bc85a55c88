import type { DryRunAnswer } from '../../../shared/dry-run';
import type {
  FractionsAnswer,
  ManyFractionsAnswer,
  SystemFractions,
} from '../../../shared/fractions';
import type { Species } from '../../../shared/species';
import {
  type AcidBaseSystem,
  effectivePKa,
  fractionPoints,
  predominanceRanges,
  speciesOf,
} from '../../chem';
import { dryRunOf } from '../compute/dry-run';
import type { SystemUsed } from '../chemistry/system-used';
import { fractionsCost } from './cost';
import { pointsOf } from '../chemistry/points';
import type { ResolvedRequest } from './resolve';
import { settled } from './systems-used';

type Answer = FractionsAnswer | ManyFractionsAnswer | DryRunAnswer;

/** The forms, with their formulas where these are known. */
const formsOf = ({ system }: SystemUsed): Species[] =>
  speciesOf(system).map((form) =>
    system.formulas ? { ...form, formula: system.formulas[form.index] ?? null } : form,
  );

function ofOneSystem(
  used: SystemUsed & { readonly effective: AcidBaseSystem },
  request: ResolvedRequest,
): SystemFractions {
  const { digits } = request;
  const { system, effective } = used;
  return {
    ...(system.name === undefined ? {} : { name: system.name }),
    species: formsOf(used),
    effectivePKa: effectivePKa(effective, digits),
    points: fractionPoints(effective, pointsOf(request.pH), digits),
    predominance: predominanceRanges(effective, digits),
  };
}

/** Species fractions of one system or several, or what they would cost. */
export function answerFractions(request: ResolvedRequest): Answer {
  const { systems, model } = settled(request);
  if (request.dryRun) return dryRunOf(fractionsCost(request), model.warnings);
  const items = systems.map((used) => ofOneSystem(used, request));
  const [only] = items;
  return request.system !== undefined && only ? { ...only, model } : { items, model };
}
