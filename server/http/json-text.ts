import type { Fault } from '../../shared/problem';
import { jsonPointer } from './json-pointer';

const token = /"(?:[^"\\]|\\.)*"|-?\d[\d.eE+-]*|[{}[\],:]/g;
const plainInteger = /^-?\d{1,15}$/;

/** Where the scan stands: an object with the names so far, or a list with the index. */
type Level = { readonly names: Set<string>; name: string } | { index: number };

const pointerTo = (levels: readonly Level[]) =>
  jsonPointer(levels.map((level) => ('index' in level ? level.index : level.name)));

/**
 * What parsing valid JSON would alter without a word: a name that comes twice in an object, of which
 * the last would win, and an integer written with a point, an exponent or more digits than a double
 * holds. Pointers follow RFC 6901.
 */
export function silentAlterations(text: string): Fault[] {
  const faults: Fault[] = [];
  const levels: Level[] = [];
  let last = '';
  for (const [found] of text.matchAll(token)) {
    const level = levels.at(-1);
    if (found === '{') levels.push({ names: new Set(), name: '' });
    else if (found === '[') levels.push({ index: 0 });
    else if (found === '}' || found === ']') levels.pop();
    else if (found === ',' && level && 'index' in level) level.index += 1;
    else if (found === ':' && level && 'names' in level) {
      level.name = JSON.parse(last) as string;
      if (level.names.has(level.name)) {
        const detail = 'This name comes twice in its object.';
        faults.push({ pointer: pointerTo(levels), code: 'duplicate-field', detail });
      }
      level.names.add(level.name);
    } else if (isAlteredInteger(found)) {
      const detail = 'Write integers without point or exponent, and decimals as strings.';
      faults.push({ pointer: pointerTo(levels), code: 'not-a-plain-integer', detail });
    }
    last = found;
  }
  return faults;
}

const isAlteredInteger = (found: string) =>
  /^[-\d]/.test(found) && !plainInteger.test(found) && Number.isInteger(Number(found));
