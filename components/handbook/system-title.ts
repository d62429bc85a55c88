/**
 * A system's name as a title: `phosphoric acid` as `Phosphoric acid`. Names that begin with a
 * locant or a letter of their own (`2-naphthol`, `o-cresol`) stay as they are.
 */
export const systemTitle = (name: string) =>
  /^[a-z]{2}/.test(name) ? name.charAt(0).toUpperCase() + name.slice(1) : name;
