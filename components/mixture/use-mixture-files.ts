import { csvOf } from '../chart/export/csv';
import { useFigureFiles } from '../chart/export/use-figure-files';
import { basesOf, provenanceWords } from '../handbook/bases';
import type { WrittenRequest } from '../request/request-code';
import { conditionsText } from './conditions-text';
import { mixtureRows } from './mixture-csv';
import type { Answered } from './mixture-queries';
import type { MixtureAsked } from './mixture-request';
import { shownPH } from './rounded';

/** What the CSV holds, in words. */
export const numbersHeld = 'Each form and ion, as the API gave it; several portions of one added.';

/** Where the constants are from, each source once. */
const sourcesOf = ({ answer }: Answered) => [
  ...new Set(
    answer.model.constantsUsed.flatMap(({ constants = [] }) =>
      basesOf(constants).map((basis) => `${basis.source}. ${provenanceWords(basis)}.`),
    ),
  ),
];

interface FileOptions {
  /** The figure on the screen states its own conditions. */
  readonly captioned: boolean;
}

/** The files that leave Mixture, and the figure they are made from. */
export const useMixtureFiles = (answered: Answered | undefined, { captioned }: FileOptions) =>
  useFigureFiles({
    title: answered ? `Mixture, pH ${shownPH(answered.answer.pH)}` : 'Mixture',
    notes: () =>
      answered ? [...(captioned ? [] : [conditionsText(answered)]), ...sourcesOf(answered)] : [],
    csv: () => answered && csvOf(mixtureRows(answered)),
  });

/** The keyed call that gives the mixture on the screen. */
export const mixtureRequest = (
  asked: MixtureAsked | undefined,
  origin: string,
): WrittenRequest | undefined =>
  asked && { url: `${origin}/v1/mixtures`, body: asked.body, result: 'mixture' };
