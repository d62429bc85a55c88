import { StyleSheet, View } from 'react-native';
import { Icon } from '../ui/icon';
import { space } from '../ui/theme';
import { Words } from '../ui/words';

/** The last attempt to copy. The call holds the key, so that copying either keeps it. */
export interface Copied {
  readonly what: 'Key' | 'Call';
  readonly ok: boolean;
  readonly at: Date;
}

const time = new Intl.DateTimeFormat('en-GB', { timeStyle: 'medium' });

/** Says beside the button that it was copied, or that the browser refused. */
export function CopiedMark({ copied }: { readonly copied: Copied | undefined }) {
  const tone = copied?.ok ? 'good' : 'bad';
  return (
    <View role="status" style={styles.mark}>
      {copied && (
        <>
          <Icon name={copied.ok ? 'check' : 'error'} size={16} tone={tone} />
          <View style={styles.words}>
            <Words kind="label" tone={tone}>
              {copied.ok
                ? `${copied.what} copied at ${time.format(copied.at)}`
                : 'This browser let nothing be copied. Select the key and copy it.'}
            </Words>
          </View>
        </>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  mark: { flexDirection: 'row', alignItems: 'center', gap: space[1], flexShrink: 1 },
  words: { flexShrink: 1 },
});
