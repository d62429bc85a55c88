import { useRef } from 'react';
import type { View } from 'react-native';
import { elementOf } from '../../ui/element';
import { fonts, useTheme } from '../../ui/theme';
import { useToast } from '../../ui/toast';
import { embeddedFonts } from './embedded-fonts';
import { pngOf } from './png';
import { fileName, saveFile } from './save-file';
import { standaloneSvg } from './standalone-svg';

/** What the files of a figure are made of, at the moment they are asked for. */
interface FigureFiles {
  readonly title: string;
  /** Conditions and sources, printed under the figure. */
  readonly notes: () => readonly string[];
  /** Undefined while there is nothing to write. */
  readonly csv: () => string | undefined;
}

/** The files that leave a screen, and the figure they are made from. */
export function useFigureFiles({ title, notes, csv }: FigureFiles) {
  const figure = useRef<View>(null);
  const { colours } = useTheme();
  const say = useToast();

  const svg = async () => {
    const element = elementOf(figure.current)?.querySelector('svg');
    if (!element) return undefined;
    return standaloneSvg(element, {
      title,
      notes: notes(),
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
        const text = csv();
        return text === undefined ? undefined : new Blob([text], { type: 'text/csv' });
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

export type FigureSave = ReturnType<typeof useFigureFiles>['save'];
