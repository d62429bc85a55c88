import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import type { AccountAnswer } from '../../shared/account';
import type { IssuedKey, KeyAnswer } from '../../shared/keys';
import { Dock } from '../shell/dock';
import { Page } from '../shell/page';
import { Button } from '../ui/button';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { Words } from '../ui/words';
import { IssueDialog } from './issue-dialog';
import { IssuedDialog } from './issued-dialog';
import { KeysContent } from './keys-content';
import { useKeys } from './keys-queries';
import { RevokeDialog } from './revoke-dialog';

/** The keys of an organization, for an admin; one's own, for a developer. */
export function KeysConsole({ who }: { readonly who: AccountAnswer }) {
  const { rail } = useLayout();
  const keys = useKeys();
  const [issuing, setIssuing] = useState(false);
  const [issued, setIssued] = useState<IssuedKey>();
  const [revoking, setRevoking] = useState<KeyAnswer>();
  const hasKeys = (keys.data?.pages[0]?.items.length ?? 0) > 0;
  const organization = who.organization.name;
  const issue = (
    <Button
      kind="primary"
      size={rail ? 'regular' : 'main'}
      icon="plus"
      label="Issue a key"
      onPress={() => setIssuing(true)}
    />
  );
  return (
    <Page
      title="Keys"
      actions={rail ? hasKeys && issue : <Words kind="help">{organization}</Words>}
      dock={!rail && hasKeys && <Dock>{issue}</Dock>}
    >
      <View style={styles.content}>
        <View style={styles.lead}>
          <Words tone="inkSoft">
            {who.role === 'admin'
              ? `Every key that calls for ${organization}. `
              : `Your keys that call for ${organization}. `}
            The public part of a key is safe to show; the rest is not stored.
          </Words>
        </View>
        <KeysContent keys={keys} onRevoke={setRevoking} issue={issue} />
      </View>
      {issuing && (
        <IssueDialog
          onClose={() => setIssuing(false)}
          onIssued={(key) => {
            setIssuing(false);
            setIssued(key);
          }}
        />
      )}
      {issued && <IssuedDialog of={issued} onClose={() => setIssued(undefined)} />}
      <RevokeDialog of={revoking} onClose={() => setRevoking(undefined)} />
    </Page>
  );
}

const styles = StyleSheet.create({
  content: { gap: space[4] },
  lead: { maxWidth: 560 },
});
