import type { Operation } from '../http/operation';
import { fractions, publicFractions } from './fractions';
import { livez, readyz } from './health';
import { limits } from './limits';

/** Every operation there is. */
export const operations: readonly Operation[] = [fractions, publicFractions, limits, livez, readyz];
