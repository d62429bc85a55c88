import type { Warning } from '../../shared/model';
import { Notice } from '../ui/notice';
import { Words } from '../ui/words';
import { WithFormulas } from './with-formulas';

const titles: Readonly<Record<Warning['code'], string>> = {
  'inverted-constants': 'Computed as given',
  'estimated-constant': 'An estimate',
  'constants-at-their-medium': 'Constants of their own medium',
  'constants-outside-medium': 'Constants outside their medium',
  'pka-not-temperature-corrected': 'Constants of another temperature',
  'temperature-beyond-trust': 'Warmer than the constants are trusted to',
  'outside-model-range': 'Beyond the activity model’s range',
  'charge-beyond-model': 'Charges beyond the activity model',
  'missing-interaction': 'Some ions have no parameters for each other',
  'no-ionic-strength-given': 'No ionic strength was given',
  'ion-takes-part': 'An ion that takes part is taken as inert',
  'held-by-gas': 'The gas decides how much there is',
  'note-of-system': 'About a system',
  'unnamed-ion': 'An ion without a name',
  'ion-size-assumed': 'The size of an ion is assumed',
  'several-ionic-strengths': 'More than one ionic strength fits',
  'ionic-strength-differs': 'Not the ionic strength of these ions',
  'parameters-of-another-temperature': 'Parameters of another temperature',
};

/** What to know about a figure that was computed, in the answer's words: one notice, however many. */
export function Warnings({ warnings }: { readonly warnings: readonly Warning[] }) {
  const [first, ...others] = warnings;
  if (!first) return null;
  if (others.length === 0) {
    return (
      <Notice tone="warn" title={titles[first.code]}>
        <Words kind="help" tone="ink">
          <WithFormulas text={first.message} />
        </Words>
      </Notice>
    );
  }
  return (
    <Notice tone="warn" title={`${warnings.length} things to know`}>
      {warnings.map(({ code, message, pointer }) => (
        <Words key={`${code} ${pointer} ${message}`} kind="help" tone="ink">
          <Words kind="label">{titles[code]}</Words>
          {'. '}
          <WithFormulas text={message} />
        </Words>
      ))}
    </Notice>
  );
}
