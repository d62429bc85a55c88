import { sumOf } from './exact';

/** An ion that takes no part, with how it came here. */
export interface InertContent {
  readonly name: string | undefined;
  readonly charge: number;
  readonly concentration: string;
}

/** Ions of one name are one entry; unnamed ones stay apart. */
export function together(all: readonly InertContent[]): InertContent[] {
  const named = new Map<string, InertContent>();
  const unnamed: InertContent[] = [];
  for (const ion of all) {
    if (ion.name === undefined) unnamed.push(ion);
    else {
      const before = named.get(ion.name)?.concentration ?? '0';
      named.set(ion.name, { ...ion, concentration: sumOf(before, ion.concentration) });
    }
  }
  return [...named.values(), ...unnamed];
}
