/** A pointer no longer than this goes back to the caller, whatever names the caller sent. */
const longest = 200;

/** JSON Pointer (RFC 6901) to a place in a body, cut where it is very long. */
export const jsonPointer = (path: readonly PropertyKey[]): string =>
  path
    .map((part) => `/${String(part).replaceAll('~', '~0').replaceAll('/', '~1')}`)
    .join('')
    .slice(0, longest);
