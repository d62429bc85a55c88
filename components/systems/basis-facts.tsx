import { StyleSheet, View } from 'react-native';
import { kindMeaning, kindWords, stepsInWords, type Basis, type MediumOf } from '../handbook/bases';
import { HoldsAt, Provenance } from '../handbook/basis-parts';
import { Facts, type Fact } from '../ui/facts';
import { space } from '../ui/theme';
import { Words } from '../ui/words';

interface BasisFactsProps {
  readonly basis: Basis;
  /** How many constants the determination has. */
  readonly count: number;
}

/** Kind, temperature, medium, source and provenance. */
export function BasisFacts({ basis, count }: BasisFactsProps) {
  const { steps, media, source } = basis;
  return (
    <View style={styles.part}>
      {steps.length < count && (
        <Words kind="label" heading={3}>
          {`${steps.length === 1 ? 'Constant' : 'Constants'} ${stepsInWords(steps)}`}
        </Words>
      )}
      <Facts
        facts={[
          ...media.map((medium) => mediumFact(medium, media.length > 1)),
          { term: 'Source', value: source },
          { term: 'Provenance', value: <Provenance {...basis} /> },
        ]}
      />
    </View>
  );
}

function mediumFact(medium: MediumOf, isOneOfSeveral: boolean): Fact {
  return {
    term: isOneOfSeveral ? `Kind of ${stepsInWords(medium.steps)}` : 'Kind',
    value: (
      <Words>
        {kindWords[medium.kind]} ({kindMeaning[medium.kind]}), at <HoldsAt {...medium} />
      </Words>
    ),
  };
}

const styles = StyleSheet.create({ part: { gap: space[2] } });
