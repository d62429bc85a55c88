import type { SystemSearch } from './handbook-queries';

interface Circumstances {
  readonly online: boolean;
  /** The search has been on its way for longer than is worth no word. */
  readonly isSlow: boolean;
}

/** What stands between the typed text and what it finds, in words; nothing where nothing does. */
export function searchStatus(
  { systems, query, isCurrent, error, hasNextPage }: SystemSearch,
  { online, isSlow }: Circumstances,
): string | undefined {
  if (isCurrent && systems?.length === 0) return `Nothing is called “${query}”.`;
  if (isCurrent) return hasNextPage ? 'More match: type on to see fewer.' : undefined;
  if (!online) return 'You are offline: the handbook cannot be searched now.';
  if (error) return `${error.message}. The handbook cannot be searched now.`;
  return isSlow ? 'Searching …' : undefined;
}
