import { readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { accuracyPage, rewriting } from '../support/accuracy-page';

/** docs/accuracy.md has no number of its own: each comes from the computations of these tests. */
const file = path.join(__dirname, '../../docs/accuracy.md');

/** Seven hundred mixtures are solved: seconds alone, a minute where others use the machine. */
const patience = 300_000;

test(
  `docs/accuracy.md is what is calculated; to write it anew: ${rewriting}`,
  () => {
    const page = accuracyPage();
    if (process.env['UPDATE_ACCURACY'] === '1') writeFileSync(file, page);
    expect(readFileSync(file, 'utf8')).toBe(page);
  },
  patience,
);
