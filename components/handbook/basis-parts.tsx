import { StyleSheet, View } from 'react-native';
import type { Constant } from '../../shared/constant';
import { Icon } from '../ui/icon';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { provenanceWords, recalledMeans } from './bases';

/** Medium that a constant holds in, within a text around it. */
export function Medium({ ionicStrength }: Pick<Constant, 'ionicStrength'>) {
  if (ionicStrength === null) return 'ionic strength not stated';
  return (
    <>
      <Quantity of="ionicStrength" />
      {' = '}
      <Numerals>{ionicStrength}</Numerals>
      {ionicStrength === '0' ? '' : ' mol/L'}
    </>
  );
}

type Origin = Pick<Constant, 'provenance' | 'provenanceNote'>;

/** How a value came here; one that was recalled says what that asks of the reader. */
export function Provenance(origin: Origin) {
  const recalled = origin.provenance === 'recalled';
  return (
    <View style={styles.line}>
      {recalled && <Icon name="warning" size={16} tone="warn" />}
      <View style={styles.words}>
        <Words tone={recalled ? 'warn' : undefined}>{provenanceWords(origin)}</Words>
        {recalled && <Words kind="help">{recalledMeans}</Words>}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', gap: space[1], alignItems: 'flex-start' },
  words: { flex: 1, minWidth: 0 },
});
