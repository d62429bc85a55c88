import { useEffect, useState } from 'react';
import type { KeyAnswer } from '../../shared/keys';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { Failure } from '../ui/failure';
import { useToast } from '../ui/toast';
import { useNow } from '../ui/use-now';
import { Words } from '../ui/words';
import { keyElementId } from './key-facts';
import { useRevokeKey } from './keys-queries';
import { revokeWords } from './revoke-words';

interface RevokeDialogProps {
  /** The key to be revoked; closed without one. */
  readonly of: KeyAnswer | undefined;
  readonly onClose: () => void;
}

/** The second of two taps: names what stops. */
export function RevokeDialog({ of: key, onClose }: RevokeDialogProps) {
  const now = useNow();
  const say = useToast();
  const { mutate, isPending, error, reset } = useRevokeKey();
  const [revoked, setRevoked] = useState<KeyAnswer>();
  // Its button is gone, so the focus goes to the key, which is still in the list.
  useEffect(() => {
    if (revoked) document.getElementById(keyElementId(revoked))?.focus();
  }, [revoked]);
  const close = () => {
    reset();
    onClose();
  };
  const revoke = ({ id, name }: KeyAnswer) => {
    if (isPending) return;
    mutate(id, {
      onSuccess: (answer) => {
        close();
        setRevoked(answer);
        say({ text: `${name} is revoked` });
      },
    });
  };
  return (
    <Dialog
      title={key ? `Revoke ${key.name}` : ''}
      open={key !== undefined}
      onClose={close}
      actions={
        key && (
          <>
            <Button label="Keep it" onPress={close} />
            <Button
              kind="destructive"
              label={isPending ? 'Revoking …' : 'Revoke'}
              onPress={() => revoke(key)}
            />
          </>
        )
      }
    >
      {key && <Words>{revokeWords(key, now)}</Words>}
      <Words>A revoked key cannot be brought back; issue another one in its place.</Words>
      {error && <Failure error={error} />}
    </Dialog>
  );
}
