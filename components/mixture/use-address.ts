import { createAddress } from '../fragment/address';
import { formatFragment, parseFragment } from './fragment';

/** The address of Mixture, and the state in it. */
export const { useAddress, linkTo } = createAddress({
  path: '/mixture',
  parse: parseFragment,
  format: formatFragment,
});
