import type { z } from 'zod';
import type { systemInFull } from '../../shared/system';

/** A system as the contract takes it: decimals as text, nothing rounded. */
export type SystemText = z.input<typeof systemInFull>;
