import { StyleSheet, View } from 'react-native';
import type { StoredSystem } from '../../shared/stored-system';
import { Facts } from '../ui/facts';
import { Numerals } from '../ui/numerals';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { CallById } from './call-by-id';
import { Determination } from './determination';
import { SystemFigure } from './system-figure';

/** All that is known of a system. */
export function SystemDetail({ system }: { readonly system: StoredSystem }) {
  const { id, aliases, cas, note, origin, revision, determinations, species } = system;
  return (
    <View style={styles.parts}>
      <View style={styles.part}>
        {note !== null && <Words>{note}</Words>}
        <Facts
          facts={[
            ...(aliases.length > 0 ? [{ term: 'Also', value: aliases.join(', ') }] : []),
            { term: 'CAS', value: cas === null ? 'not known' : <Numerals>{cas}</Numerals> },
            {
              term: 'Kept by',
              value: `${keepers[origin]}, revision ${revision}`,
            },
          ]}
        />
      </View>
      <SystemFigure id={id} />
      {determinations.map((determination) => (
        <Determination
          key={`${determination.listedAs} ${determination.constants[0]?.source}`}
          of={determination}
          species={species}
        />
      ))}
      <CallById id={id} />
    </View>
  );
}

const keepers: Readonly<Record<StoredSystem['origin'], string>> = {
  handbook: 'the handbook, read only',
  organization: 'your organization',
};

const styles = StyleSheet.create({
  parts: { gap: space[6], width: '100%', maxWidth: 760 },
  part: { gap: space[3] },
});
