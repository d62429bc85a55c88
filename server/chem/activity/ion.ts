/**
 * A dissolved species as the activity models see it: its charge number, and its name where it has
 * one, the charge behind ^ ("Na^+", "HPO4^2-"). Neutral species are among them, with charge 0.
 */
export interface Ion {
  readonly name: string | undefined;
  readonly charge: number;
}

/** How an answer speaks of an ion: by its name, or an unnamed one by its charge ("2-"). */
export const shownAs = ({ name, charge }: Ion): string =>
  name ?? `${Math.abs(charge)}${charge < 0 ? '-' : '+'}`;
