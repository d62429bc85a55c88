import { readdir, readFile, writeFile } from 'node:fs/promises';
import { extname, join } from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';

const texts = new Set(['.css', '.html', '.js', '.json', '.map', '.svg', '.ttf', '.txt', '.xml']);
/** Smaller files fit one packet as they are. */
const smallest = 1_024;

const encodings = {
  '.gz': (content) => promisify(gzip)(content, { level: 9 }),
  '.br': (content) =>
    promisify(brotliCompress)(content, {
      params: {
        [constants.BROTLI_PARAM_QUALITY]: constants.BROTLI_MAX_QUALITY,
        [constants.BROTLI_PARAM_SIZE_HINT]: content.length,
      },
    }),
};

async function compress(file) {
  const content = await readFile(file);
  if (content.length < smallest) return;
  for (const [suffix, encode] of Object.entries(encodings)) {
    const encoded = await encode(content);
    if (encoded.length < content.length) await writeFile(file + suffix, encoded);
  }
}

/** Lays `.gz` and `.br` beside every text file of a folder, once, at the highest level. */
export async function precompress(folder) {
  const entries = await readdir(folder, { recursive: true, withFileTypes: true });
  const files = entries.filter((entry) => entry.isFile() && texts.has(extname(entry.name)));
  await Promise.all(
    files.map((entry) => compress(join(entry.parentPath ?? entry.path, entry.name))),
  );
}
