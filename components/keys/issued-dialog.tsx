import * as Clipboard from 'expo-clipboard';
import { useEffect, useRef, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { IssuedKey } from '../../shared/keys';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { elementOf } from '../ui/element';
import { exactDay } from '../ui/moments';
import { Notice } from '../ui/notice';
import { Numerals } from '../ui/numerals';
import { radius, space, useTheme } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { Words } from '../ui/words';
import { CopiedMark, type Copied } from './copied-mark';
import { KeySlip } from './key-slip';
import { TryKey } from './try-key';
import { useBeforeLeaving } from './use-before-leaving';

interface IssuedDialogProps {
  readonly of: IssuedKey;
  readonly onClose: () => void;
}

/** The one time that a key is shown. It lives in this dialog alone and is gone with it. */
export function IssuedDialog({ of: { key, name, scopes, expiresAt }, onClose }: IssuedDialogProps) {
  const { colours } = useTheme();
  const { rail } = useLayout();
  const [copied, setCopied] = useState<Copied>();
  const [asked, setAsked] = useState(false);
  const isKept = copied?.ok === true;
  const warning = useRef<View>(null);
  const ask = () => {
    setAsked(true);
    elementOf(warning.current)?.focus();
  };
  useBeforeLeaving(!isKept, ask);
  useEffect(() => {
    if (asked) elementOf(warning.current)?.focus();
  }, [asked]);

  const copy = async (what: Copied['what'], text: string) => {
    const ok = await Clipboard.setStringAsync(text).catch(() => false);
    setCopied({ what, ok, at: new Date() });
    setAsked(false);
  };
  return (
    <Dialog
      title={`${name} is issued`}
      open
      wide
      onClose={isKept ? onClose : ask}
      actions={<Button label="Done" onPress={isKept ? onClose : ask} />}
    >
      {asked && (
        <Notice ref={warning} tone="warn" title="You have not copied the key">
          <Words>
            It cannot be shown again. Without it the key is of no use: revoke it and issue another.
          </Words>
          <View style={[styles.row, styles.answers]}>
            <Button label="Stay" onPress={() => setAsked(false)} />
            <Button kind="destructive" label="Leave without it" onPress={onClose} />
          </View>
        </Notice>
      )}
      <Words>
        Copy the key now. It is shown this once: we keep only a fingerprint of it, and this page
        forgets it when you leave.
      </Words>
      <View style={[styles.raised, { backgroundColor: colours.raised }]}>
        <KeySlip value={key} />
        <View style={styles.row}>
          <Button
            kind="primary"
            size={rail ? 'regular' : 'main'}
            icon="copy"
            label="Copy the whole key"
            onPress={() => void copy('Key', key)}
          />
          <CopiedMark copied={copied} />
        </View>
      </View>
      <Words kind="help">
        It may <Numerals>{scopes.join(', ')}</Numerals>
        {` until ${exactDay(new Date(expiresAt))}.`}
      </Words>
      <TryKey value={key} scopes={scopes} onCopy={(call) => void copy('Call', call)} />
    </Dialog>
  );
}

const styles = StyleSheet.create({
  raised: { gap: space[4], padding: space[4], borderRadius: radius },
  answers: { marginTop: space[2] },
  row: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space[3] },
});
