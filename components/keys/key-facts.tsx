import type { KeyAnswer } from '../../shared/keys';
import { Numerals } from '../ui/numerals';

/** Id of the element that stands for a key in the list: the focus comes back to it. */
export const keyElementId = ({ id }: Pick<KeyAnswer, 'id'>) => `key-${id}`;

/** The part of a key that is safe to show. */
export function PublicPart({ publicId }: Pick<KeyAnswer, 'publicId'>) {
  return (
    <Numerals size={12} tone="inkSoft">
      {`stepwell_${publicId}…`}
    </Numerals>
  );
}

/** What the key may do. */
export const MayDo = ({ scopes }: Pick<KeyAnswer, 'scopes'>) => (
  <Numerals size={12}>{scopes.join(', ')}</Numerals>
);
