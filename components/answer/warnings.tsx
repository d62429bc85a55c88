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
  'unnamed-ion': 'An ion without a name',
  'ion-size-assumed': 'The size of an ion is assumed',
  'several-ionic-strengths': 'More than one ionic strength fits',
  'ionic-strength-differs': 'Not the ionic strength of these ions',
  'parameters-of-another-temperature': 'Parameters of another temperature',
};

/** What to know about a figure that was computed, in the answer's words. */
export function Warnings({ warnings }: { readonly warnings: readonly Warning[] }) {
  return warnings.map(({ code, message, pointer }) => (
    <Notice key={`${code} ${pointer} ${message}`} tone="warn" title={titles[code]}>
      <Words kind="help" tone="ink">
        <WithFormulas text={message} />
      </Words>
    </Notice>
  ));
}
