import type { BufferCapacityAnswer, BufferCapacityRequest } from '../../../shared/buffer-capacity';
import type { DryRunAnswer } from '../../../shared/dry-run';
import { costOf, pointsWorth } from '../../../shared/limits';
import { pointCount } from '../../../shared/ph';
import {
  bufferCapacityPoints,
  type BufferSolution,
  capacityMaxima,
  effectiveSystem,
  waterExponents,
} from '../../chem';
import { dryRunOf } from '../compute/dry-run';
import { conditionsUsed, idealDefaults } from '../chemistry/conditions-used';
import { modelOf } from '../chemistry/model';
import { pointsOf } from '../chemistry/points';
import { strengthWarnings, withoutComposition } from '../chemistry/ranges';
import { type ResolvedSystem, resolvedSystem } from '../chemistry/resolved-system';
import { systemUsed } from '../chemistry/system-used';
import type { Question } from '../compute/question';

type Resolved = Omit<BufferCapacityRequest, 'components' | 'dryRun'> & {
  readonly components: readonly {
    readonly system: ResolvedSystem;
    readonly concentration: string;
  }[];
  readonly dryRun?: boolean;
};

/** Whoever asks without a key has no dry run. */
type Asked = Omit<BufferCapacityRequest, 'dryRun'> & { readonly dryRun?: boolean };

/** The solution that is asked about, and where its constants come from. */
function settled(request: Resolved) {
  const conditions = conditionsUsed(request.conditions, idealDefaults);
  withoutComposition(conditions);
  const range = strengthWarnings(conditions);
  const systems = request.components.map(({ system }, i) =>
    systemUsed(system, conditions, `/components/${i}/system`),
  );
  const solution: BufferSolution = {
    components: systems.map(({ inMedium }, i) => ({
      system: effectiveSystem(inMedium, conditions.activity),
      concentration: request.components[i]?.concentration ?? '0',
    })),
    water: waterExponents(conditions.pKw, conditions.activity),
  };
  const warnings = [...range, ...systems.flatMap((used) => used.warnings)];
  const { digits } = request;
  return {
    solution,
    model: modelOf({ digits, conditions, systems, withWater: true, warnings }),
  };
}

const cost = ({ components, pH, digits }: Resolved): number =>
  [...components.map(({ system }) => system.pKa.length + 1), 2]
    .map((species) => costOf(pointCount(pH) + pointsWorth.capacityMaxima, species, digits))
    .reduce((sum, one) => sum + one, 0);

function answer(request: Resolved): BufferCapacityAnswer | DryRunAnswer {
  const { solution, model } = settled(request);
  if (request.dryRun) return dryRunOf(cost(request), model.warnings);
  return {
    points: bufferCapacityPoints(solution, pointsOf(request.pH), request.digits),
    maxima: capacityMaxima(solution, request.digits),
    model,
  };
}

/** The curve as RFC 4180 text: a line a pH. */
function csv(request: Resolved): string {
  const { solution } = settled(request);
  const head = ['pH', 'total', 'water', ...solution.components.map((_, i) => `component_${i}`)];
  const rows = bufferCapacityPoints(solution, pointsOf(request.pH), request.digits).map(
    ({ pH, total, water, components }) => [pH, total, water, ...components],
  );
  return [head, ...rows].map((cells) => `${cells.join(',')}\r\n`).join('');
}

/** How strongly a mixture buffers. */
export const bufferCapacityQuestion: Question<Asked, Resolved> = {
  systemsOf: ({ components }) => components.map(({ system }) => system),
  resolved: (request, found) => ({
    ...request,
    components: request.components.map(({ system, concentration }, i) => ({
      system: resolvedSystem(system, `/components/${i}/system`, found),
      concentration,
    })),
  }),
  cost,
  answer,
  csv,
};
