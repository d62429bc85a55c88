import { StyleSheet, View } from 'react-native';
import { Icon } from '../ui/icon';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import type { Basis, MediumOf } from './bases';
import { provenanceWords, recalledMeans } from './bases';

/** Temperature and ionic strength that constants hold at, within a text around them. */
export function HoldsAt({
  temperature,
  ionicStrength,
}: Pick<MediumOf, 'temperature' | 'ionicStrength'>) {
  return (
    <>
      <Numerals>{temperature}</Numerals>&nbsp;°C,{' '}
      {ionicStrength === null ? (
        'ionic strength not stated'
      ) : (
        <>
          <Quantity of="ionicStrength" />
          {' = '}
          <Numerals>{ionicStrength}</Numerals>
          {ionicStrength === '0' ? '' : '\u00a0mol/L'}
        </>
      )}
    </>
  );
}

interface ProvenanceProps extends Pick<Basis, 'provenance' | 'provenanceNote'> {
  readonly inShort?: boolean;
}

/** How a value came here; one that was recalled says what that asks of the reader. */
export function Provenance({ inShort = false, ...origin }: ProvenanceProps) {
  const recalled = origin.provenance === 'recalled';
  return (
    <View style={styles.line}>
      {recalled && <Icon name="warning" size={16} tone="warn" />}
      <View style={styles.words}>
        <Words kind={inShort ? 'help' : 'body'} tone={recalled ? 'warn' : undefined}>
          {provenanceWords(origin)}
        </Words>
        {recalled && <Words kind="help">{recalledMeans}</Words>}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', gap: space[1], alignItems: 'flex-start' },
  words: { flex: 1, minWidth: 0 },
});
