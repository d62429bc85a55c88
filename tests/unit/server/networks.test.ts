import fc from 'fast-check';
import { BlockList, isIP } from 'node:net';
import {
  contains,
  parseAddress,
  parseNetwork,
  writeAddress,
  type Network,
} from '../../../server/http/networks';

/** The outside check throughout: Node's own `BlockList` and `isIP`. */
const families = { 4: 'ipv4', 6: 'ipv6' } as const;
const bitsOf = { 4: 32, 6: 128 } as const;

const cut = (value: bigint, beyond: number) => (value >> BigInt(beyond)) << BigInt(beyond);

/** A network, and an address that shares more or fewer of its bits. */
const pairs = (family: 4 | 6) => {
  const bits = bitsOf[family];
  return fc
    .tuple(
      fc.bigInt({ min: 0n, max: 2n ** BigInt(bits) - 1n }),
      fc.integer({ min: 0, max: bits }),
      fc.integer({ min: 0, max: bits }),
      fc.bigInt({ min: 0n, max: 2n ** BigInt(bits) - 1n }),
    )
    .map(([value, prefix, shared, other]) => {
      const own = BigInt(bits - shared);
      return {
        network: writeAddress({ family, value: cut(value, bits - prefix) }),
        prefix,
        address: writeAddress({
          family,
          value: cut(value, bits - shared) | (other & (2n ** own - 1n)),
        }),
      };
    });
};

const network = (text: string): Network => {
  const read = parseNetwork(text);
  if (!read) throw new Error(`no network: ${text}`);
  return read;
};
const isIn = (address: string, of: string) => {
  const read = parseAddress(address);
  return read !== undefined && contains(network(of), read);
};

test.each([4, 6] as const)('an address of IPv%i is in a network as Node has it', (family) => {
  fc.assert(
    fc.property(pairs(family), ({ network: base, prefix, address }) => {
      // The mapped block is IPv4 to us and both to Node: it has a test of its own.
      fc.pre([base, address].every((one) => parseAddress(one)?.family === family));
      const list = new BlockList();
      list.addSubnet(base, prefix, families[family]);
      expect(isIn(address, `${base}/${prefix}`)).toBe(list.check(address, families[family]));
    }),
    { numRuns: 2_000 },
  );
});

test('an IPv4 address mapped into IPv6 is in the same networks', () => {
  fc.assert(
    fc.property(pairs(4), ({ network: base, prefix, address }) => {
      const list = new BlockList();
      list.addSubnet(base, prefix, 'ipv4');
      const mapped = `::ffff:${address}`;
      expect(isIn(mapped, `${base}/${prefix}`)).toBe(list.check(mapped, 'ipv6'));
      expect(isIn(address, `::ffff:${base}/${96 + prefix}`)).toBe(list.check(address, 'ipv4'));
    }),
  );
});

test('whatever Node takes for an address is read, and nothing else', () => {
  const piece = fc.constantFrom(
    '0',
    '1',
    '255',
    '256',
    '01',
    'ffff',
    'FFFF',
    '10000',
    '',
    'g',
    '1.2.3.4',
  );
  const text = fc.oneof(
    fc.array(piece, { minLength: 1, maxLength: 9 }).map((parts) => parts.join(':')),
    fc.array(piece, { minLength: 1, maxLength: 5 }).map((parts) => parts.join('.')),
    fc.ipV4(),
    fc.ipV6(),
    fc.string(),
  );
  fc.assert(
    fc.property(text, (written) => {
      expect(parseAddress(written) !== undefined).toBe(isIP(written) !== 0);
    }),
    { numRuns: 5_000 },
  );
});

test('an address is written in one way, whichever way it came', () => {
  const same = (...texts: string[]) =>
    new Set(texts.map((text) => writeAddress(parseAddress(text) ?? { family: 4, value: 0n })));
  // RFC 5952 §1 and §4 (recalled): one address, and the form to write it in.
  const forms = ['2001:db8:0:0:1:0:0:1', '2001:0DB8::1:0:0:1', '2001:db8::0:1:0:0:1'];
  expect([...same(...forms)]).toEqual(['2001:db8::1:0:0:1']);
  expect([...same('192.0.2.1', '::ffff:192.0.2.1', '::FFFF:c000:201')]).toEqual(['192.0.2.1']);
  fc.assert(
    fc.property(fc.oneof(fc.ipV4(), fc.ipV6()), (text) => {
      const [written = ''] = same(text);
      expect(parseAddress(written)).toEqual(parseAddress(text));
    }),
  );
});

test('no IPv4 address is in an IPv6 network, however wide', () => {
  expect(isIn('192.0.2.1', '::/0')).toBe(false);
  expect(isIn('::ffff:192.0.2.1', '::/0')).toBe(false);
  expect(isIn('::1', '0.0.0.0/0')).toBe(false);
});

test('an address alone is a network of one', () => {
  expect(network('192.0.2.1')).toEqual(network('192.0.2.1/32'));
  expect(network('2001:db8::1')).toEqual(network('2001:db8::1/128'));
});

test.each([
  '',
  '/8',
  '10.0.0.0/',
  '10.0.0.0/33',
  '10.0.0.0/08',
  '10.0.0.0/8/8',
  '10.0.0.0/-1',
  '10.0.0.0 /8',
  '10.0.0.1/8',
  '10.0.0/8',
  '010.0.0.0/8',
  '2001:db8::/129',
  '2001:db8::1/32',
  '::ffff:10.0.0.0/95',
  'fe80::1%eth0',
  'localhost',
])('"%s" is no network', (text) => {
  expect(parseNetwork(text)).toBeUndefined();
});
