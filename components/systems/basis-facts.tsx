import { StyleSheet, View } from 'react-native';
import { kindMeaning, kindWords, stepsInWords, type Basis } from '../handbook/bases';
import { Medium, Provenance } from '../handbook/basis-parts';
import { Facts } from '../ui/facts';
import { Numerals } from '../ui/numerals';
import { space } from '../ui/theme';
import { Words } from '../ui/words';

interface BasisFactsProps {
  readonly basis: Basis;
  /** All constants of the determination stand on it. */
  readonly alone: boolean;
}

/** Kind, temperature, medium, source and provenance. */
export function BasisFacts({ basis: { steps, of }, alone }: BasisFactsProps) {
  return (
    <View style={styles.part}>
      {!alone && (
        <Words kind="label" heading={3}>
          {`${steps.length === 1 ? 'Constant' : 'Constants'} ${stepsInWords(steps)}`}
        </Words>
      )}
      <Facts
        facts={[
          { term: 'Kind', value: `${kindWords[of.kind]}: ${kindMeaning[of.kind]}` },
          {
            term: 'Holds at',
            value: (
              <Words>
                <Numerals>{of.temperature}</Numerals>&nbsp;°C, <Medium {...of} />
              </Words>
            ),
          },
          ...(of.uncertainty === null ? [{ term: 'Uncertainty', value: 'not stated' }] : []),
          { term: 'Source', value: of.source },
          { term: 'Provenance', value: <Provenance {...of} /> },
        ]}
      />
    </View>
  );
}

const styles = StyleSheet.create({ part: { gap: space[2] } });
