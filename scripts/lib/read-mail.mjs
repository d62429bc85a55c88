const ofHex = (text, sign) =>
  Buffer.from(
    text.replace(new RegExp(`${sign}([0-9A-F]{2})`, 'gi'), (_all, hex) =>
      String.fromCharCode(parseInt(hex, 16)),
    ),
    'latin1',
  );

const decoders = {
  base64: (text) => Buffer.from(text, 'base64'),
  'quoted-printable': (text) => ofHex(text.replace(/=\r?\n/g, ''), '='),
};

/** RFC 2047 encoded words; the white space between two of them is none. */
const decodeWords = (text) =>
  text
    .replace(/\?=\s+=\?/g, '?==?')
    .replace(/=\?utf-8\?([bq])\?([^?]*)\?=/gi, (_all, kind, word) =>
      kind.toLowerCase() === 'b'
        ? Buffer.from(word, 'base64').toString()
        : ofHex(word.replaceAll('_', ' '), '=').toString(),
    );

/**
 * Reads a mail of one part in UTF-8, which is what the server sends: its headers by their names in
 * lower case, as a list of `[name, value]`, and its text.
 */
export function readMail(raw) {
  const end = raw.indexOf('\r\n\r\n');
  const headers = raw
    .subarray(0, end)
    .toString('latin1')
    .replace(/\r\n[ \t]+/g, ' ')
    .split('\r\n')
    .map((line) => /^([^:]*):\s*(.*)$/.exec(line) ?? ['', line, ''])
    .map(([, name, value]) => [name.toLowerCase(), decodeWords(value)]);
  const header = (wanted) => headers.find(([name]) => name === wanted)?.[1] ?? '';
  const body = raw.subarray(end + 4).toString('latin1');
  const decode = decoders[header('content-transfer-encoding').toLowerCase()];
  const text = (decode?.(body) ?? Buffer.from(body, 'latin1')).toString();
  return { headers, subject: header('subject'), text: text.replaceAll('\r\n', '\n') };
}
