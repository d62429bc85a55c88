import type { KeyAnswer } from '../../shared/keys';

/** What every way of showing the keys is given. */
export interface KeysViewProps {
  readonly keys: readonly KeyAnswer[];
  readonly now: Date;
  readonly onRevoke: (key: KeyAnswer) => void;
}
