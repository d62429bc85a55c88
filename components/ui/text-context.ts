import { createContext, useContext } from 'react';
import type { Colours } from './theme';

/** Size (px), tone and weight of the text around, so that nested parts need not repeat them. */
export interface SurroundingText {
  readonly size: number;
  readonly tone: keyof Colours;
  /** Semibold, as titles, labels and buttons are. */
  readonly strong: boolean;
}

const Surrounding = createContext<SurroundingText | null>(null);

export const SurroundingTextProvider = Surrounding.Provider;

/** The text this component is nested in, or null at the root of a text. */
export const useSurroundingText = () => useContext(Surrounding);
