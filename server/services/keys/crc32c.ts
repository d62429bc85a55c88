/** CRC-32C (Castagnoli, reflected polynomial 0x82F63B78) of a byte string; RFC 3720 §12.1. */
export function crc32c(bytes: Uint8Array): number {
  let remainder = 0xffffffff;
  for (const byte of bytes) {
    remainder ^= byte;
    for (let bit = 0; bit < 8; bit += 1) {
      remainder = (remainder >>> 1) ^ (0x82f63b78 & -(remainder & 1));
    }
  }
  return ~remainder >>> 0;
}
