import { chmodSync, createWriteStream, existsSync, renameSync, statSync } from 'node:fs';
import { createInterface } from 'node:readline';

const largest = 5_000_000;
const keptLines = 30;
const warnLevel = 40;
const levels = { 40: 'warning', 50: 'error', 60: 'fatal' };

/** A line of the log in plain words where a person should see it: warnings and worse. */
export function plainWords(line) {
  let entry;
  try {
    entry = JSON.parse(line);
  } catch {
    return line;
  }
  if (!(entry?.level >= warnLevel)) return undefined;
  const time = new Date(entry.time).toTimeString().slice(0, 8);
  const what = [entry.msg, entry.err?.message].filter(Boolean).join(': ');
  return `${time} ${levels[entry.level] ?? 'warning'}: ${what}`;
}

/**
 * Where the server's output goes: whole into a file for its owner's eyes, and in plain words to
 * the terminal where it matters. A file that has grown too large is set aside first, one deep.
 */
export function openLog(path, show) {
  if (existsSync(path) && statSync(path).size > largest) renameSync(path, `${path}.1`);
  const file = createWriteStream(path, { flags: 'a', mode: 0o600 });
  file.once('open', () => chmodSync(path, 0o600));
  const last = [];
  const keep = (line) => {
    file.write(`${line}\n`);
    if (last.push(line) > keptLines) last.shift();
    const words = plainWords(line);
    if (words !== undefined) show(words);
  };
  return {
    take: (stream) => createInterface({ input: stream }).on('line', keep),
    end: () => last.join('\n'),
    close: () => new Promise((resolve) => file.end(resolve)),
  };
}
