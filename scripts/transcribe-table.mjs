import { readFileSync, writeFileSync } from 'node:fs';

/**
 * `node scripts/transcribe-table.mjs <table.json> <copy.json>`: copies a published table for the
 * handbook. A number with a decimal point becomes a string of the very characters that stand in the
 * file, because JSON.parse would make 2.0 into 2; whole numbers (charges) stay numbers. Nothing else
 * changes, so the copy keeps one row a line, to be read beside the table.
 */
const token = /"(?:[^"\\]|\\.)*"|-?\d+\.\d+(?:[eE][+-]?\d+)?/g;
const note =
  'Copied by scripts/transcribe-table.mjs: numbers with a decimal point are strings, digit for digit as in the table.';

const [table, copy] = process.argv.slice(2);
if (!table || !copy) throw new Error('Name the table and the copy to write.');
const text = readFileSync(table, 'utf8');
const quoted = text.replace(token, (found) => (found.startsWith('"') ? found : `"${found}"`));
const noted = quoted.replace('{\n', `{\n "transcription": ${JSON.stringify(note)},\n`);
JSON.parse(noted);
writeFileSync(copy, noted.endsWith('\n') ? noted : `${noted}\n`);
