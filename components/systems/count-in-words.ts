/** How many systems a list shows: all there are, all that match, or the first of more. */
export function countInWords(shown: number, more: boolean, query: string): string {
  const what = shown === 1 ? 'system' : 'systems';
  if (more) return `The first ${shown} ${what} are shown.`;
  if (query === '') return `All ${shown} ${what} are shown.`;
  if (shown === 0) return `No system matches ${query}.`;
  return `${shown} ${what} ${shown === 1 ? 'matches' : 'match'} ${query}.`;
}
