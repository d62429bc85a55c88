import type { SystemSummary } from '../../shared/stored-system';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';

/** What tells one found system from another: its formula and its constants. */
export function OptionNote({ system: { formula, pKa } }: { readonly system: SystemSummary }) {
  return (
    <>
      {formula !== null && (
        <>
          <Formula formula={formula} />
          {' · '}
        </>
      )}
      <Numerals>{pKa.join(', ').replace(/-(?=\d)/g, '\u2212')}</Numerals>
    </>
  );
}
