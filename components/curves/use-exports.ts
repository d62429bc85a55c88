import { useFigureFiles } from '../chart/export/use-figure-files';
import { basesOf, provenanceWords } from '../handbook/bases';
import { conditionsText } from './conditions-of';
import { curveCsv } from './curve-csv';
import type { Curves } from './use-curves';

interface ExportOptions {
  /** The figure on the screen states its own conditions. */
  readonly captioned: boolean;
}

/** What the CSV holds, in words. */
export const numbersHeld = 'Every point of the curve, as the API gave it.';

/** The files that leave Curves, and the figure they are made from. */
export const useExports = (
  { drawn, shown, extras, title }: Pick<Curves, 'drawn' | 'shown' | 'extras' | 'title'>,
  { captioned }: ExportOptions,
) =>
  useFigureFiles({
    title,
    notes: () =>
      drawn
        ? [
            ...(captioned ? [] : [conditionsText(drawn)]),
            ...basesOf(drawn.constants).map(
              (basis) => `${basis.source}. ${provenanceWords(basis)}.`,
            ),
          ]
        : [],
    csv: () => drawn && curveCsv({ drawn, shown, extras }),
  });

export type Exports = ReturnType<typeof useExports>;
