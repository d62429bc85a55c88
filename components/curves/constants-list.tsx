import { Link } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import type { Constant } from '../../shared/constant';
import { basesOf } from '../handbook/bases';
import { BasisInShort } from '../handbook/basis-in-short';
import { Button } from '../ui/button';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { Words } from '../ui/words';
import { isMoved, type DrawnCurve } from './drawn-curve';
import { MovedConstants } from './moved-constants';
import { ValueRow } from './read-out-row';

interface ConstantsListProps {
  /** Id of the system whose constants they are. */
  readonly id: string;
  readonly drawn: DrawnCurve;
  readonly onTypeOwn: () => void;
}

/** A stored system's constants as given, what conditions make of them, where they are from. */
export function ConstantsList({ id, drawn, onTypeOwn }: ConstantsListProps) {
  const { constants } = drawn;
  const { rail } = useLayout();
  const bases = basesOf(constants);
  return (
    <View style={styles.list}>
      {isMoved(drawn) ? <MovedConstants drawn={drawn} /> : <GivenConstants constants={constants} />}
      {bases.map((basis) => (
        <BasisInShort key={basis.steps[0]} basis={basis} count={constants.length} />
      ))}
      <View style={styles.ways}>
        <Button
          kind="quiet"
          size={rail ? 'small' : 'regular'}
          label="Change these constants"
          onPress={onTypeOwn}
        />
        <Link href={`/systems/${id}`} style={rail ? styles.smallLink : styles.link}>
          <Words kind={rail ? 'label' : 'button'} tone="well">
            All that is known of them
          </Words>
        </Link>
      </View>
    </View>
  );
}

function GivenConstants({ constants }: { readonly constants: readonly Constant[] }) {
  return (
    <View role="table" aria-label="Constants">
      {constants.map(({ step, value, estimate, approximate }) => (
        <ValueRow
          key={step}
          label={
            <Words>
              <Quantity of="pKa" index={step} />
              {estimate ? ' estimate' : approximate && ' approximate'}
            </Words>
          }
          value={value}
        />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space[2] },
  ways: { alignItems: 'flex-start' },
  link: { paddingVertical: 11 },
  smallLink: { paddingVertical: 6 },
});
