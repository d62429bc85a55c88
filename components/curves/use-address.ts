import { createAddress } from '../fragment/address';
import { formatFragment, parseFragment } from './fragment';

/** The address of Curves, and the state in it. */
export const { useAddress, openNext, linkTo } = createAddress({
  path: '/',
  parse: parseFragment,
  format: formatFragment,
});
