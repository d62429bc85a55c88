import { useRef } from 'react';
import type { View } from 'react-native';
import { embeddedFonts } from '../chart/export/embedded-fonts';
import { pngOf } from '../chart/export/png';
import { fileName, saveFile } from '../chart/export/save-file';
import { standaloneSvg } from '../chart/export/standalone-svg';
import { elementOf } from '../ui/element';
import { fonts, useTheme } from '../ui/theme';
import { useToast } from '../ui/toast';
import { basesOf, provenanceWords } from '../handbook/bases';
import { conditionsText } from './conditions-of';
import { curveCsv } from './curve-csv';
import type { Curves } from './use-curves';

interface ExportOptions {
  /** The figure on the screen states its own conditions. */
  readonly captioned: boolean;
}

/** The files that leave the screen, and the figure they are made from. */
export function useExports(
  { drawn, shown, extras, title }: Pick<Curves, 'drawn' | 'shown' | 'extras' | 'title'>,
  { captioned }: ExportOptions,
) {
  const figure = useRef<View>(null);
  const { colours } = useTheme();
  const say = useToast();

  const svg = async () => {
    const element = elementOf(figure.current)?.querySelector('svg');
    if (!element || !drawn) return undefined;
    const sources = basesOf(drawn.constants).map(
      (basis) => `${basis.source}. ${provenanceWords(basis)}.`,
    );
    return standaloneSvg(element, {
      title,
      notes: [...(captioned ? [] : [conditionsText(drawn)]), ...sources],
      ink: colours.ink,
      inkSoft: colours.inkSoft,
      page: colours.page,
      face: fonts.words,
      fonts: await embeddedFonts(),
    });
  };
  const save = async (kind: 'csv' | 'svg' | 'png') => {
    const content = async () => {
      if (kind === 'csv') {
        return drawn && new Blob([curveCsv({ drawn, shown, extras })], { type: 'text/csv' });
      }
      const drawing = await svg();
      if (!drawing) return undefined;
      if (kind === 'png') return pngOf(drawing);
      return new Blob([drawing.markup], { type: 'image/svg+xml' });
    };
    try {
      const blob = await content();
      if (blob) saveFile(fileName(title, kind), blob);
    } catch {
      say({ text: `This browser could not make the ${kind.toUpperCase()} file.` });
    }
  };
  return { figure, save };
}

export type Exports = ReturnType<typeof useExports>;
