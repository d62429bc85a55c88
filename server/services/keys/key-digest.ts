import { createHmac, timingSafeEqual } from 'node:crypto';

export interface KeyDigest {
  readonly pepperVersion: number;
  readonly digest: Buffer;
}

/** HMAC-SHA-256 of a key under a versioned pepper: what is stored in place of the key. */
export class KeyDigests {
  private readonly current: number;

  constructor(private readonly peppers: ReadonlyMap<number, Buffer>) {
    this.current = Math.max(...peppers.keys());
  }

  of(key: string): KeyDigest {
    return { pepperVersion: this.current, digest: this.under(this.current, key) };
  }

  /** Whether the key made the digest; false where its pepper is no longer known. */
  matches(key: string, stored: KeyDigest): boolean {
    if (!this.peppers.has(stored.pepperVersion)) return false;
    const digest = this.under(stored.pepperVersion, key);
    return digest.length === stored.digest.length && timingSafeEqual(digest, stored.digest);
  }

  private under(version: number, key: string): Buffer {
    return createHmac('sha256', this.peppers.get(version) ?? '')
      .update(key)
      .digest();
  }
}
