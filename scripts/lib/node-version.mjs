import { readFileSync } from 'node:fs';
import { Failure } from './failure.mjs';
import { inRoot } from './paths.mjs';

const numbers = (text) => text.match(/\d+/g).map(Number);

const before = (a, b) => {
  const index = b.findIndex((part, place) => part !== (a[place] ?? 0));
  return index >= 0 && (a[index] ?? 0) < b[index];
};

/** Refuses a Node outside `engines` of package.json, which reads `>=A <B`. */
export function requireNode(version = process.versions.node) {
  const range = JSON.parse(readFileSync(inRoot('package.json'), 'utf8')).engines.node;
  const [from, to] = range.split(' ').map(numbers);
  const here = numbers(version);
  if (before(here, from) || !before(here, to)) {
    throw new Failure(`Stepwell needs Node ${range}; this is ${version}.`);
  }
}
