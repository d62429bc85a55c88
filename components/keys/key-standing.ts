import type { KeyAnswer } from '../../shared/keys';
import { momentInWords } from '../ui/moments';
import type { IconName } from '../ui/icon';

/** How a key stands, for a list: a word, an icon and a tone, of which any one suffices. */
export interface KeyStanding {
  readonly word: string;
  readonly icon: IconName;
  readonly tone: 'good' | 'warn' | 'bad' | 'inkSoft';
}

const day = 86_400_000;
/** A key that ends within these days says so: time enough to put a new one in its place. */
export const soonDays = 7;

export function standingOf(
  { state, expiresAt }: Pick<KeyAnswer, 'state' | 'expiresAt'>,
  now: Date,
): KeyStanding {
  switch (state) {
    case 'revoked':
      return { word: 'Revoked', icon: 'close', tone: 'bad' };
    case 'expired':
      return { word: 'Expired', icon: 'clock', tone: 'inkSoft' };
    case 'issuer-left':
      return { word: 'Stopped: its issuer left', icon: 'warning', tone: 'warn' };
    case 'active': {
      const end = new Date(expiresAt);
      const isSoon = end.getTime() - now.getTime() <= soonDays * day;
      return isSoon
        ? { word: `Ends ${momentInWords(end, now)}`, icon: 'clock', tone: 'warn' }
        : { word: 'Working', icon: 'check', tone: 'good' };
    }
  }
}

/** Whether revoking would change anything; a key whose issuer comes back would call again. */
export const canRevoke = ({ state }: Pick<KeyAnswer, 'state'>) =>
  state === 'active' || state === 'issuer-left';
