const alphabet = 'abcdefghijklmnopqrstuvwxyz234567';

/** RFC 4648 base32 in lower case, without padding: ⌈8·bytes/5⌉ characters. */
export function base32(bytes: Uint8Array): string {
  let bits = 0;
  let held = 0;
  let written = '';
  for (const byte of bytes) {
    held = (held << 8) | byte;
    bits += 8;
    while (bits >= 5) {
      bits -= 5;
      written += alphabet[(held >> bits) & 31];
    }
    held &= (1 << bits) - 1;
  }
  return bits > 0 ? written + alphabet[(held << (5 - bits)) & 31] : written;
}
