import { readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { operations } from '../server/routes';
import { openApiDocument } from './document';

/** Writes openapi/openapi.json, or with --check says whether the committed one is what it would be. */
const file = path.join(__dirname, 'openapi.json');
const made = `${JSON.stringify(openApiDocument(operations), null, 2)}\n`;

if (process.argv.includes('--check')) {
  const same = readFileSync(file, 'utf8') === made;
  process.stdout.write(
    same ? 'openapi.json is up to date\n' : 'openapi.json is stale: run npm run openapi\n',
  );
  process.exitCode = same ? 0 : 1;
} else {
  writeFileSync(file, made);
}
