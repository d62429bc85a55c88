import { View } from 'react-native';
import { Words } from '../ui/words';
import { kindWords, stepsInWords, type Basis } from './bases';
import { HoldsAt, Provenance } from './basis-parts';

interface BasisInShortProps {
  readonly basis: Basis;
  /** How many constants there are. */
  readonly count: number;
}

/** What constants stand on, as a caption under them. */
export function BasisInShort({ basis, count }: BasisInShortProps) {
  return (
    <View>
      {basis.media.map((medium) => (
        <Words key={medium.steps[0]} kind="help" tone="ink">
          {medium.steps.length < count && `${stepsInWords(medium.steps)}: `}
          {kindWords[medium.kind]}, <HoldsAt {...medium} />
        </Words>
      ))}
      <Words kind="help">{basis.source}</Words>
      <Provenance {...basis} inShort />
    </View>
  );
}
