import fc from 'fast-check';
import { clientAddress } from '../../../server/http/client-address';
import { parseNetwork } from '../../../server/http/networks';

const proxies = ['10.0.0.0/8', '2001:db8:ffff::/48'].flatMap((text) => parseNetwork(text) ?? []);
const from = (peer: string | undefined, forwarded?: string) =>
  clientAddress(peer, forwarded, proxies);

test('a peer that is no trusted proxy is believed nothing', () => {
  expect(from('192.0.2.9', '198.51.100.1')).toBe('192.0.2.9');
  expect(clientAddress('10.0.0.1', '198.51.100.1', [])).toBe('10.0.0.1');
});

const rows: [what: string, forwarded: string | undefined, address: string][] = [
  ['without the header it is the proxy', undefined, '10.0.0.1'],
  ['an empty header says nothing', '', '10.0.0.1'],
  ['one entry is the client', '198.51.100.1', '198.51.100.1'],
  ['the first from the right that is no proxy', '203.0.113.5, 198.51.100.1', '198.51.100.1'],
  ['proxies in a row are passed over', '198.51.100.1, 10.1.1.1,10.2.2.2', '198.51.100.1'],
  ['a forged trusted entry on the left is not reached', '10.9.9.9, 198.51.100.1', '198.51.100.1'],
  ['proxies all the way: the farthest', '10.7.7.7, 10.8.8.8', '10.7.7.7'],
  ['a client of IPv6', '2001:DB8:0::5', '2001:db8::5'],
  ['a proxy of IPv6', '198.51.100.1, 2001:db8:ffff::7', '198.51.100.1'],
  ['a mapped client', '::ffff:198.51.100.1', '198.51.100.1'],
  ['a client with its port', '198.51.100.1:49152', '198.51.100.1'],
  ['a client of IPv6 with its port', '[2001:db8::5]:49152', '2001:db8::5'],
  ['garbage left of the client', 'unknown, <script>, 198.51.100.1', '198.51.100.1'],
  ['garbage ends the reading', '198.51.100.1, unknown, 10.2.2.2', '10.2.2.2'],
  ['garbage beside the proxy', 'unknown', '10.0.0.1'],
  ['an empty entry ends it too', '198.51.100.1,', '10.0.0.1'],
];
test.each(rows)('behind a trusted proxy: %s', (_what, forwarded, address) => {
  expect(from('10.0.0.1', forwarded)).toBe(address);
  expect(from('::ffff:10.0.0.1', forwarded)).toBe(address);
});

test('a peer that has gone has no address', () => {
  expect(from(undefined, '198.51.100.1')).toBe('');
});

test('what a client writes into the header never changes its address', () => {
  const client = fc.ipV4().filter((text) => !text.startsWith('10.'));
  fc.assert(
    fc.property(fc.string(), client, (forged, address) => {
      expect(from('10.0.0.1', `${forged}, ${address}`)).toBe(address);
    }),
  );
});
