import { StyleSheet, View } from 'react-native';
import type { Determination as DeterminationOf } from '../../shared/stored-system';
import type { Species } from '../../shared/species';
import { basesOf } from '../handbook/bases';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { Words } from '../ui/words';
import { BasisFacts } from './basis-facts';
import { ConstantCards } from './constant-cards';
import { ConstantsTable } from './constants-table';

interface DeterminationProps {
  readonly of: DeterminationOf;
  readonly species: readonly Species[];
}

/** Constants that belong together, and what they stand on. */
export function Determination({ of, species }: DeterminationProps) {
  const { rail } = useLayout();
  const { preferred, listedAs, constants } = of;
  const bases = basesOf(constants);
  const Constants = rail ? ConstantsTable : ConstantCards;
  return (
    <View style={styles.part}>
      <View>
        <Words kind="section" heading={2}>
          {preferred ? 'Constants' : 'Another determination'}
        </Words>
        <Words kind="help">
          {preferred
            ? 'Preferred: a call by id computes with these.'
            : 'Kept beside the preferred one; no call by id uses it.'}
          {listedAs !== null && ` In its source listed as “${listedAs}”.`}
        </Words>
      </View>
      <Constants
        caption={
          preferred ? 'The preferred constants' : `Constants listed as ${listedAs ?? 'another'}`
        }
        constants={constants}
        species={species}
      />
      {constants.every(({ uncertainty }) => uncertainty === null) && (
        <Words kind="help">No uncertainty is stated.</Words>
      )}
      {bases.map((basis) => (
        <BasisFacts key={basis.steps[0]} basis={basis} count={constants.length} />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({ part: { gap: space[3] } });
