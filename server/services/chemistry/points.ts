import { gridCount, type PHInput } from '../../../shared/ph';
import type { PHPoints } from '../../chem';

/** The contract's pH input as the engine takes it. */
export function pointsOf(input: PHInput): PHPoints {
  if (typeof input === 'string') return { kind: 'list', values: [input] };
  if (Array.isArray(input)) return { kind: 'list', values: input };
  return { kind: 'grid', from: input.from, step: input.step, count: gridCount(input) };
}
