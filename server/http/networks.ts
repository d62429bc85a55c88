/**
 * An address of either family. An IPv4-mapped IPv6 address (`::ffff:192.0.2.1`) is the IPv4
 * address it maps: a socket of both families writes the same peer so.
 */
export interface Address {
  readonly family: 4 | 6;
  readonly value: bigint;
}

/** All addresses of one family that begin with the same bits. */
export interface Network extends Address {
  /** Bits that are the same, from the left. */
  readonly prefix: number;
}

const bitsOf = { 4: 32, 6: 128 } as const;
const mapped = 0xffffn;

/** Four decimal bytes. A leading zero is refused: some readers take it for octal. */
function parseIPv4(text: string): bigint | undefined {
  const parts = text.split('.');
  const isByte = (part: string) => /^(0|[1-9]\d{0,2})$/.test(part) && Number(part) <= 255;
  if (parts.length !== 4 || !parts.every(isByte)) return undefined;
  return parts.reduce((value, part) => value * 256n + BigInt(part), 0n);
}

/** As RFC 4291 §2.2 writes it, without a zone; the URL standard's parser reads the same forms. */
function parseIPv6(text: string): bigint | undefined {
  const url = /^[0-9a-f:.]{2,45}$/i.test(text) ? `http://[${text}]` : '';
  if (!URL.canParse(url)) return undefined;
  const [head = [], tail] = new URL(url).hostname
    .slice(1, -1)
    .split('::')
    .map((side) => (side === '' ? [] : side.split(':')));
  const zeros = tail ? Array<string>(8 - head.length - tail.length).fill('0') : [];
  const groups = [...head, ...zeros, ...(tail ?? [])];
  return groups.reduce((value, group) => value * 65_536n + BigInt(`0x${group}`), 0n);
}

/** Reads an address, or answers undefined where the text is none. */
export function parseAddress(text: string): Address | undefined {
  const four = parseIPv4(text);
  if (four !== undefined) return { family: 4, value: four };
  const six = parseIPv6(text);
  if (six === undefined) return undefined;
  if (six >> 32n === mapped) return { family: 4, value: six & 0xffff_ffffn };
  return { family: 6, value: six };
}

const hostBits = ({ family, prefix }: Pick<Network, 'family' | 'prefix'>) =>
  BigInt(bitsOf[family] - prefix);

/**
 * Reads a network in CIDR notation; an address alone is a network of one. Undefined where the text
 * is none, and where bits are set beyond the prefix: `10.0.0.1/8` is a slip, and it is not known of
 * which half.
 */
export function parseNetwork(text: string): Network | undefined {
  const [, written = '', bits] = /^([^/]*)(?:\/(0|[1-9]\d{0,2}))?$/.exec(text) ?? [];
  const address = parseAddress(written);
  if (!address) return undefined;
  const { family, value } = address;
  const beforeMapped = family === 4 && written.includes(':') ? 96 : 0;
  const prefix = bits === undefined ? bitsOf[family] : Number(bits) - beforeMapped;
  if (prefix < 0 || prefix > bitsOf[family]) return undefined;
  const network = { family, value, prefix };
  const beyond = hostBits(network);
  return (value >> beyond) << beyond === value ? network : undefined;
}

/**
 * Whether an address lies in a network. Families are apart: `::/0` has no IPv4 address in it, in
 * whichever way that is written.
 */
export function contains(network: Network, address: Address): boolean {
  if (network.family !== address.family) return false;
  const beyond = hostBits(network);
  return address.value >> beyond === network.value >> beyond;
}

/** The one way an address is written in limits and logs: dotted, or as RFC 5952 has it. */
export function writeAddress({ family, value }: Address): string {
  const part = (index: number, bits: number) =>
    (value >> BigInt(index * bits)) & ((1n << BigInt(bits)) - 1n);
  if (family === 4) return [3, 2, 1, 0].map((index) => part(index, 8)).join('.');
  const groups = [7, 6, 5, 4, 3, 2, 1, 0].map((index) => part(index, 16).toString(16));
  return new URL(`http://[${groups.join(':')}]`).hostname.slice(1, -1);
}
