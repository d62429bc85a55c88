import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { CodeBlock } from '../ui/code-block';
import { Numerals } from '../ui/numerals';
import { space } from '../ui/theme';
import { useCopy } from '../ui/use-copy';
import { Words } from '../ui/words';
import { oneLineCall } from './one-line-call';

/** How a pipeline asks about this system: its id, and a call that works as it is copied. */
export function CallById({ id }: { readonly id: string }) {
  const copy = useCopy();
  const call = oneLineCall(window.location.origin, id);
  return (
    <View style={styles.part}>
      <Words kind="section" heading={2}>
        Call it by id
      </Words>
      <View style={styles.row}>
        <Words>
          Its id is <Numerals bold>{id}</Numerals> and never changes.
        </Words>
        <Button kind="quiet" icon="copy" label="Copy id" onPress={() => copy('Id', id)} />
      </View>
      <CodeBlock label="The fractions at pH 7.4 with curl" code={call} />
      <View style={styles.row}>
        <Button icon="copy" label="Copy the call" onPress={() => copy('Call', call)} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  part: { gap: space[3] },
  row: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space[5] },
});
