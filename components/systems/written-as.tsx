import type { SystemSummary } from '../../shared/stored-system';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';
import { Words } from '../ui/words';

/** The formula and the CAS number of a system, as far as they are known. */
export function WrittenAs({ system }: { readonly system: SystemSummary }) {
  const { formula, cas, origin } = system;
  return (
    <Words kind="help">
      {formula !== null && <Formula formula={formula} />}
      {formula !== null && cas !== null && ' · '}
      {cas !== null && <Numerals>{`CAS ${cas}`}</Numerals>}
      {origin === 'organization' && ' · your organization’s own'}
    </Words>
  );
}
