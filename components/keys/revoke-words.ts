import type { KeyAnswer } from '../../shared/keys';
import { momentInWords } from '../ui/moments';

/** What a revocation stops, and how alive that is. */
export function revokeWords(
  { name, state, lastUsedAt }: Pick<KeyAnswer, 'name' | 'state' | 'lastUsedAt'>,
  now: Date,
): string {
  const stops =
    state === 'issuer-left'
      ? `${name} calls no more since its issuer left, and will not if they come back.`
      : `${name} stops at its next call.`;
  const use =
    lastUsedAt === null
      ? 'It was never used.'
      : `Last used ${momentInWords(new Date(lastUsedAt), now)}.`;
  return `${stops} ${use}`;
}
