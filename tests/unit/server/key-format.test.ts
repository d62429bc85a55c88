import { base32 } from '../../../server/services/keys/base32';
import { crc32c } from '../../../server/services/keys/crc32c';
import { KeyDigests } from '../../../server/services/keys/key-digest';
import { keyPattern, makeKey, readKey } from '../../../server/services/keys/key-format';

describe('CRC-32C', () => {
  // RFC 3720, appendix B.4 (iSCSI), and the usual check value of "123456789".
  const rows: [string, Uint8Array, number][] = [
    ['32 bytes of zeros', new Uint8Array(32), 0x8a9136aa],
    ['32 bytes of ones', new Uint8Array(32).fill(0xff), 0x62a8ab43],
    ['32 incrementing bytes', Uint8Array.from({ length: 32 }, (_, i) => i), 0x46dd794e],
    ['32 decrementing bytes', Uint8Array.from({ length: 32 }, (_, i) => 31 - i), 0x113fdb5c],
    ['123456789', Buffer.from('123456789'), 0xe3069283],
  ];
  test.each(rows)('of %s is the published value', (_name, bytes, value) => {
    expect(crc32c(bytes)).toBe(value);
  });
});

// RFC 4648, section 10, in lower case and without padding.
test.each([
  ['', ''],
  ['f', 'my'],
  ['fo', 'mzxq'],
  ['foo', 'mzxw6'],
  ['foob', 'mzxw6yq'],
  ['fooba', 'mzxw6ytb'],
  ['foobar', 'mzxw6ytboi'],
])('base32(%j) is %j', (text, encoded) => {
  expect(base32(Buffer.from(text))).toBe(encoded);
});

describe('a key', () => {
  test('has a public part, 256 secret bits and a checksum that fits', () => {
    const { key, publicId } = makeKey();
    expect(key).toHaveLength(9 + 12 + 1 + 52 + 7);
    expect(key).toMatch(new RegExp(`^${keyPattern.source}$`));
    expect(readKey(key)).toEqual({ ok: true, publicId });
  });

  test('never comes twice', () => {
    const keys = new Set(Array.from({ length: 2000 }, () => makeKey().key));
    expect(keys.size).toBe(2000);
  });

  test('with any one character changed fails its checksum', () => {
    const { key } = makeKey();
    for (let place = 9; place < key.length; place += 1) {
      if (key[place] === '_') continue;
      const other = key[place] === 'a' ? 'b' : 'a';
      const mistyped = key.slice(0, place) + other + key.slice(place + 1);
      expect(readKey(mistyped)).toEqual({ ok: false, reason: 'checksum' });
    }
  });

  test.each([
    '',
    'stepwell_',
    'x'.repeat(10_000),
    makeKey().key.toUpperCase(),
    `${makeKey().key} `,
  ])('that is not written as one is malformed: %.20s', (text) => {
    expect(readKey(text)).toEqual({ ok: false, reason: 'malformed' });
  });
});

describe('a digest', () => {
  const pepper = (fill: number) => Buffer.alloc(32, fill);
  const { key } = makeKey();

  test('fits its key alone', () => {
    const digests = new KeyDigests(new Map([[1, pepper(1)]]));
    expect(digests.matches(key, digests.of(key))).toBe(true);
    expect(digests.matches(makeKey().key, digests.of(key))).toBe(false);
  });

  test('made under an older pepper still fits, and new ones use the newest', () => {
    const before = new KeyDigests(new Map([[1, pepper(1)]])).of(key);
    const digests = new KeyDigests(new Map([1, 2].map((version) => [version, pepper(version)])));
    expect(digests.matches(key, before)).toBe(true);
    expect(digests.of(key).pepperVersion).toBe(2);
  });

  test('whose pepper is gone fits nothing', () => {
    const before = new KeyDigests(new Map([[1, pepper(1)]])).of(key);
    expect(new KeyDigests(new Map([[2, pepper(2)]])).matches(key, before)).toBe(false);
  });
});
