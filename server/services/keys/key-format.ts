import { randomBytes } from 'node:crypto';
import { base32 } from './base32';
import { crc32c } from './crc32c';

/** `stepwell_<12 public>_<52 secret><7 checksum>`, base32 in lower case. */
export const keyPattern = /stepwell_[a-z2-7]{12}_[a-z2-7]{59}/;
const parts = /^(stepwell_([a-z2-7]{12})_[a-z2-7]{52})([a-z2-7]{7})$/;

/** CRC-32C of all before it, big-endian, in base32: tells a typing error from a wrong key. */
function checksum(body: string): string {
  const bytes = Buffer.alloc(4);
  bytes.writeUInt32BE(crc32c(Buffer.from(body, 'ascii')));
  return base32(bytes);
}

/** A fresh key: 60 public bits to find its row by, 256 secret bits from the system's generator. */
export function makeKey(): { key: string; publicId: string } {
  const publicId = base32(randomBytes(8)).slice(0, 12);
  const body = `stepwell_${publicId}_${base32(randomBytes(32))}`;
  return { key: body + checksum(body), publicId };
}

export type ReadKey =
  { ok: true; publicId: string } | { ok: false; reason: 'malformed' | 'checksum' };

/** Reads a key's public part after checking form and checksum; asks no database. */
export function readKey(key: string): ReadKey {
  const [, body, publicId, check] = parts.exec(key) ?? [];
  if (body === undefined || publicId === undefined) return { ok: false, reason: 'malformed' };
  return checksum(body) === check ? { ok: true, publicId } : { ok: false, reason: 'checksum' };
}
