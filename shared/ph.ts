import { z } from 'zod';
import { decimalString, decimalWithin, Exact } from './decimal';
import { limits } from './limits';

/** One pH value, −lg a(H⁺). */
export const pHValue = decimalWithin(limits.pH).brand<'PH'>().meta({
  id: 'PH',
  description: 'pH = −lg a(H⁺), from −20 to 40, as a decimal string.',
  example: '7.4',
  'x-unit': '1',
});

const step = decimalString.meta({
  description: 'Distance of neighbouring points, greater than 0.',
  example: '0.05',
  'x-unit': '1',
});

/** Points of an even grid, both ends counted where the step reaches them. */
export const gridCount = (grid: { from: string; to: string; step: string }): number =>
  new Exact(grid.to).minus(grid.from).dividedToIntegerBy(grid.step).toNumber() + 1;

const refuse = (context: z.RefinementCtx, path: string, code: string, message: string) =>
  context.addIssue({ code: 'custom', path: [path], params: { code }, message });

/** `{from, to, step}`: from, from + step, … up to and including `to` where the step reaches it. */
export const pHGrid = z
  .strictObject({ from: pHValue, to: pHValue, step })
  .superRefine((grid, context) => {
    const { decimals } = limits.pH;
    const size = new Exact(grid.step);
    if (size.lessThanOrEqualTo(0)) {
      refuse(context, 'step', 'out-of-range', 'The step must be greater than 0.');
    } else if (size.decimalPlaces() > decimals) {
      refuse(context, 'step', 'out-of-range', `The step may have at most ${decimals} decimals.`);
    } else if (new Exact(grid.from).greaterThan(grid.to)) {
      refuse(context, 'to', 'out-of-range', '`to` must not lie below `from`.');
    } else if (gridCount(grid) > limits.pHPoints) {
      refuse(
        context,
        'step',
        'over-limit',
        `The grid has ${gridCount(grid)} points; at most ${limits.pHPoints} are computed in one call.`,
      );
    }
  })
  .meta({
    id: 'PHGrid',
    description: 'An even grid of pH values.',
    example: { from: '0', to: '14', step: '0.05' },
  });

/** One value, a list, or a grid. */
export const pHInput = z
  .union([pHValue, z.array(pHValue).min(1).max(limits.pHPoints), pHGrid])
  .meta({
    id: 'PHInput',
    description: 'The pH values to answer for: one value, a list in any order, or an even grid.',
    example: '7.4',
  });

export type PHInput = z.infer<typeof pHInput>;

/** How many points a pH input asks for. */
export const pointCount = (input: PHInput): number =>
  typeof input === 'string' ? 1 : Array.isArray(input) ? input.length : gridCount(input);
