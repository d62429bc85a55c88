import { Fragment, type ReactNode } from 'react';
import type { Constant } from '../../shared/constant';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { Words } from '../ui/words';

const quantities = [
  { key: 'uncertainty', unit: '' },
  { key: 'deltaH', unit: ' kJ/mol' },
  { key: 'deltaCp', unit: ' J/(mol K)' },
] as const satisfies readonly { key: keyof Constant; unit: string }[];

/** What was determined with a constant, on one line; nothing where nothing is known. */
export function KnownBeside({ constant }: { readonly constant: Constant }): ReactNode {
  const known = quantities.filter(({ key }) => constant[key] !== null);
  if (known.length === 0) return null;
  return (
    <Words kind="help">
      {known.map(({ key, unit }, i) => (
        <Fragment key={key}>
          {i > 0 && ' · '}
          <Quantity of={key} />
          {' = '}
          <Numerals>{constant[key]}</Numerals>
          {unit}
        </Fragment>
      ))}
    </Words>
  );
}
