import { createHash } from 'node:crypto';
import { existsSync } from 'node:fs';
import { copyFile, mkdir, readFile, rm, writeFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/**
 * Cuts the two typefaces to the characters in use and writes them to public/fonts with a static
 * style sheet: expo-font would inject its own, which a strict style-src blocks. Does nothing when
 * what is there was made from the same faces and characters.
 */
const require = createRequire(import.meta.url);
const target = fileURLToPath(new URL('../public/fonts/', import.meta.url));

const range = (from, to) =>
  String.fromCodePoint(...Array.from({ length: to - from + 1 }, (_, at) => from + at));

const latin = range(0x20, 0x7e) + range(0xa0, 0xff) + range(0x100, 0x17f);
const greek = range(0x391, 0x3a9).replace('\u03a2', '') + range(0x3b1, 0x3c9);
/** Dashes, quotation marks, ellipsis, thin space, minus, relations, arrows. */
const signs =
  '\u2009\u202f\u2010\u2011\u2013\u2014\u2018\u2019\u201c\u201d\u2026\u2212\u2248\u2260\u2264\u2265\u2190\u2192\u221a\u221e';
/** Combining macron (z̄) and prime (pK′), which only the numerals' face has. */
const marks = '\u0304\u2032';
const letters = range(0x41, 0x5a) + range(0x61, 0x7a);

const words = {
  family: 'Hanken Grotesk',
  name: 'hanken-grotesk',
  home: dirname(require.resolve('@expo-google-fonts/hanken-grotesk/package.json')),
  text: latin + signs,
};
const numbers = {
  family: 'JetBrains Mono',
  name: 'jetbrains-mono',
  home: dirname(require.resolve('@expo-google-fonts/jetbrains-mono/package.json')),
  text: latin + greek + signs + marks,
};
const faces = [
  { ...words, weight: 400, source: '400Regular/HankenGrotesk_400Regular.ttf' },
  { ...words, weight: 600, source: '600SemiBold/HankenGrotesk_600SemiBold.ttf' },
  { ...numbers, weight: 400, source: '400Regular/JetBrainsMono_400Regular.ttf' },
  { ...numbers, weight: 500, source: '500Medium/JetBrainsMono_500Medium.ttf' },
  { ...numbers, weight: 700, source: '700Bold/JetBrainsMono_700Bold.ttf' },
  {
    ...numbers,
    weight: 400,
    style: 'italic',
    text: letters + greek + marks,
    source: '400Regular_Italic/JetBrainsMono_400Regular_Italic.ttf',
  },
].map((face) => ({ style: 'normal', ...face }));

const fileOf = ({ name, weight, style }) =>
  `${name}-${weight}${style === 'italic' ? '-italic' : ''}.woff2`;
const licenceOf = ({ name }) => `${name}-licence.txt`;

const rule = (face) => `@font-face {
  font-family: '${face.family}';
  font-style: ${face.style};
  font-weight: ${face.weight};
  font-display: swap;
  src: url('/fonts/${fileOf(face)}') format('woff2');
}
`;

const stamp = createHash('sha256')
  .update(await readFile(fileURLToPath(import.meta.url)))
  .update([words, numbers].map(({ home }) => require(join(home, 'package.json')).version).join())
  .digest('hex');
const sheet = join(target, 'fonts.css');
const head = `/* Made by scripts/fonts.mjs from ${stamp} */\n`;

const isMade = async () =>
  faces.every((face) => existsSync(join(target, fileOf(face)))) &&
  existsSync(sheet) &&
  (await readFile(sheet, 'utf8')).startsWith(head);

async function cut(face) {
  const { default: subsetFont } = await import('subset-font');
  const whole = await readFile(join(face.home, face.source));
  const part = await subsetFont(whole, face.text, { targetFormat: 'woff2' });
  await writeFile(join(target, fileOf(face)), part);
}

if (!(await isMade())) {
  await mkdir(target, { recursive: true });
  // The sheet bears the stamp: it goes first and comes last.
  await rm(sheet, { force: true });
  for (const face of faces) await cut(face);
  for (const face of [words, numbers]) {
    await copyFile(join(face.home, 'LICENSE_FONT'), join(target, licenceOf(face)));
  }
  await writeFile(sheet, head + faces.map(rule).join(''));
}
