/**
 * Systems that are offered before anything is typed: ids of the handbook that are the name itself,
 * its words joined by hyphens, so that nothing need be fetched to show them.
 */
const suggestedIds = [
  'phosphoric-acid',
  'citric-acid',
  'carbonic-acid',
  'acetic-acid',
  'boric-acid',
  'ammonia',
  'glycine',
  'tris',
] as const;

export const suggestions = suggestedIds.map((id) => ({ id, name: id.replaceAll('-', ' ') }));
