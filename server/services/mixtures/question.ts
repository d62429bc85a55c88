import type { DryRunAnswer } from '../../../shared/dry-run';
import type { MixtureAnswer, MixtureRequest } from '../../../shared/mixtures';
import type { Warning } from '../../../shared/model';
import type { BalanceNumbers } from '../../chem';
import { dryRunOf } from '../compute/dry-run';
import { modelOf } from '../chemistry/model';
import { resolvedSystem } from '../chemistry/resolved-system';
import type { Question } from '../compute/question';
import { pairName } from './balance-of';
import type { Content, ResolvedMixture } from './contents';
import { mixtureCost } from './cost';
import { written } from './exact';
import { interactionsUsed, missingInteractions } from './interactions';
import {
  equilibriumOf,
  settledMixture,
  type SettledMixture,
  strengthFound,
  withoutAnswer,
} from './settled';
import { shortcutsOf } from './shortcuts';
import { temperatureCoefficient } from './temperature-coefficient';

/** Whoever asks without a key has no dry run. */
type Asked = Omit<MixtureRequest, 'dryRun'> & { readonly dryRun?: boolean };

type Component = MixtureAnswer['components'][number];

const formulaOf = ({ system }: Content, index: number) =>
  system.formulas ? { formula: system.formulas[index] ?? null } : {};

function weighedAs(content: Content, digits: (exact: string) => string): Component['weighedAs'] {
  if (content.kind === 'held') return null;
  const { system, form, counterIon } = content;
  return {
    index: form,
    charge: system.fullyProtonatedCharge - form,
    ...formulaOf(content, form),
    counterIon: counterIon && {
      ion: counterIon.name,
      charge: counterIon.charge,
      concentration: digits(counterIon.concentration),
    },
  };
}

/** The components, ion pairs behind them, with what became of each. */
function componentsOf(
  { contents, at }: SettledMixture,
  { acids }: BalanceNumbers,
  digits: (exact: string) => string,
): Component[] {
  const numbersOf = (i: number) => {
    const found = acids[i];
    if (!found) throw new RangeError(`No numbers of component ${i}.`);
    return found;
  };
  const components = contents.components.map((content, i): Component => {
    const { system } = content;
    const { total, species } = numbersOf(i);
    return {
      ...(system.name === undefined ? {} : { name: system.name }),
      weighedAs: weighedAs(content, digits),
      heldBy:
        content.kind === 'held'
          ? { partialPressure: content.partialPressure, henryConstant: at.henry(content) }
          : null,
      total,
      species: species.map((numbers, index) => ({
        index,
        charge: system.fullyProtonatedCharge - index,
        ...formulaOf(content, index),
        ...numbers,
      })),
    };
  });
  const pairs = contents.pairs.map(({ ion, charge }, i): Component => {
    const { total, species } = numbersOf(contents.components.length + i);
    const formulas = [ion, pairName(ion, charge)];
    return {
      name: `${ion} with OH^-`,
      weighedAs: { index: 0, charge, formula: ion, counterIon: null },
      heldBy: null,
      total,
      species: species.map((numbers, index) => ({
        index,
        charge: charge - index,
        formula: formulas[index] ?? null,
        ...numbers,
      })),
    };
  });
  return [...components, ...pairs];
}

/** A tenth: a given ionic strength farther than this from the composition’s own is told. */
const alike = 0.1;

function strengthWarnings(
  { conditions, balance }: SettledMixture,
  { ionicStrengthOfComposition, others }: { ionicStrengthOfComposition: number; others: number },
): Warning[] {
  const pointer = '/conditions/ionicStrength';
  if (others > 0) {
    const message = `${others + 1} ionic strengths fit this composition; the answer is the smallest, reached from I = 0.`;
    return [{ code: 'several-ionic-strengths', message, pointer }];
  }
  const given = balance.activity.ionicStrength;
  if (given === 'self-consistent' || balance.activity.model === 'ideal') return [];
  const own = ionicStrengthOfComposition;
  if (Math.abs(own - Number(given)) <= alike * Math.max(own, Number(given))) return [];
  const message = `The composition’s own ionic strength is ${Number(own.toPrecision(3))} ${conditions.basis}, not the ${given} that was given.`;
  return [{ code: 'ionic-strength-differs', message, pointer }];
}

function answer(request: ResolvedMixture): MixtureAnswer | DryRunAnswer {
  const mixture = settledMixture(request);
  const { conditions, balance, contents, systems, at } = mixture;
  const { digits } = request;
  if (request.dryRun) return dryRunOf(mixtureCost(request), mixture.warnings);
  const found = equilibriumOf(balance);
  const range = strengthFound(mixture, found);
  const missing = missingInteractions(balance, found, conditions);
  const made = found.inDigits(digits);
  if (!made.ok) throw withoutAnswer(made.reason);
  const { numbers, others } = made;
  const { acids, inert, iterations, residual, ...values } = numbers;
  const strengths = strengthWarnings(mixture, {
    ionicStrengthOfComposition: found.ionicStrength,
    others: others.length,
  });
  const interactions = interactionsUsed(balance);
  return {
    ...values,
    otherIonicStrengths: [...others],
    components: componentsOf(mixture, { ...numbers }, (exact) => written(exact, digits)),
    ions: contents.inert.map(({ name, charge }, i) => ({
      ion: name ?? null,
      charge,
      concentration: inert[i]?.concentration ?? '',
      activityCoefficient: inert[i]?.activityCoefficient ?? '',
    })),
    temperatureCoefficient: temperatureCoefficient({ contents, conditions, systems, at, digits }),
    shortcuts: shortcutsOf(mixture, found.pH),
    solver: { iterations, residual },
    model: modelOf({
      digits,
      conditions,
      systems,
      withWater: true,
      warnings: [...mixture.warnings, ...range, ...missing, ...strengths],
      ...(interactions && { interactions }),
    }),
  };
}

/** The pH of a mixture, and everything in it. */
export const mixtureQuestion: Question<Asked, ResolvedMixture> = {
  systemsOf: ({ components }) => components.map(({ system }) => system),
  resolved: (request, found) => ({
    ...request,
    components: request.components.map((component, i) => ({
      ...component,
      system: resolvedSystem(component.system, `/components/${i}/system`, found),
    })),
  }),
  cost: mixtureCost,
  answer,
};
