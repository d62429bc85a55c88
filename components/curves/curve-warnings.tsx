import type { Warning } from '../../shared/model';
import { Notice } from '../ui/notice';
import { Words } from '../ui/words';
import { trueMinus } from './rounded';
import type { Curves } from './use-curves';

const titles: Readonly<Record<Warning['code'], string>> = {
  'inverted-constants': 'Computed as given',
  'estimated-constant': 'An estimate',
  'constants-at-their-medium': 'Constants of their own medium',
  'pka-not-temperature-corrected': 'Constants of another temperature',
};

/** What to know about the curve that is drawn, in the answer's words. */
export function CurveWarnings({ drawn, curve }: Pick<Curves, 'drawn' | 'curve'>) {
  const warnings = curve.isCurrent && drawn ? drawn.answer.model.warnings : [];
  return warnings.map(({ code, message, pointer }) => (
    <Notice key={`${code} ${pointer} ${message}`} tone="warn" title={titles[code]}>
      <Words kind="help" tone="ink">
        {trueMinus(message)}
      </Words>
    </Notice>
  ));
}
