import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef, useState } from 'react';
import type { TextInput, View } from 'react-native';
import type { IssuedKey } from '../../shared/keys';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { elementOf } from '../ui/element';
import { Failure } from '../ui/failure';
import { faultsIn, faultsOf, firstDraft, requestOf, type DraftFaults } from './issue-draft';
import { IssueForm } from './issue-form';
import { useIssueKey } from './keys-queries';

interface IssueDialogProps {
  readonly onIssued: (key: IssuedKey) => void;
  readonly onClose: () => void;
}

/** Asks for a key. Mounted while it is open, so that it begins afresh each time. */
export function IssueDialog({ onIssued, onClose }: IssueDialogProps) {
  const queryClient = useQueryClient();
  const { mutate, isPending, error } = useIssueKey();
  const [draft, setDraft] = useState(firstDraft);
  const [faults, setFaults] = useState<DraftFaults>({});
  const nameField = useRef<TextInput>(null);
  const failure = useRef<View>(null);
  useEffect(() => nameField.current?.focus(), []);
  useEffect(() => {
    if (error) elementOf(failure.current)?.focus();
  }, [error]);

  const submit = () => {
    const found = faultsOf(draft);
    setFaults(found);
    if (found.name !== undefined) return nameField.current?.focus();
    if (found.scopes !== undefined) return;
    // Asked of the cache: a second Enter may come before this form is drawn again.
    if (queryClient.isMutating({ mutationKey: ['issue-key'] }) > 0) return;
    mutate(requestOf(draft), {
      onSuccess: onIssued,
      onError: (refused) => setFaults(faultsIn(refused)),
    });
  };

  // The key under way can be shown only here.
  const close = () => {
    if (!isPending) onClose();
  };

  return (
    <Dialog
      title="Issue a key"
      open
      onClose={close}
      actions={
        <>
          <Button label="Cancel" onPress={close} />
          <Button
            kind="primary"
            label={isPending ? 'Issuing …' : 'Issue the key'}
            onPress={submit}
          />
        </>
      }
    >
      {error && <Failure ref={failure} error={error} />}
      <IssueForm
        draft={draft}
        faults={faults}
        onChange={(part) => {
          setDraft({ ...draft, ...part });
          setFaults({});
        }}
        onSubmit={submit}
        nameField={nameField}
      />
    </Dialog>
  );
}
