import { StyleSheet, View } from 'react-native';
import { AccountPanel } from '../account/account-panel';
import { useSession } from '../account/session-queries';
import { SignInLink } from '../account/sign-in-link';
import { Dialog } from '../ui/dialog';
import { Icon } from '../ui/icon';
import { Skeleton } from '../ui/skeleton';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { PlaceLink } from './place-link';
import type { Place } from './places';

interface MoreDialogProps {
  readonly behind: readonly Place[];
  readonly open: boolean;
  readonly onClose: () => void;
}

/** What the bar or the rail opens: places without room there, and the account. */
export function MoreDialog({ behind, open, onClose }: MoreDialogProps) {
  const { data: session } = useSession();
  return (
    <Dialog title={behind.length > 0 ? 'More' : 'Account'} open={open} onClose={onClose}>
      {behind.map((place) => (
        <PlaceLink key={place.href} place={place} onGo={onClose} style={() => styles.place}>
          {() => (
            <>
              <Icon name={place.icon} size={24} />
              <View style={styles.words}>
                <Words kind="button">{place.label}</Words>
                <Words kind="help">{place.question}</Words>
              </View>
            </>
          )}
        </PlaceLink>
      ))}
      {session?.state === 'signed-in' ? (
        <AccountPanel who={session.who} onClose={onClose} />
      ) : session ? (
        <SignInLink style={styles.place}>
          <Icon name="person" size={24} />
          <Words kind="button">Sign in</Words>
        </SignInLink>
      ) : (
        <Skeleton label="Looking who is signed in" />
      )}
    </Dialog>
  );
}

const styles = StyleSheet.create({
  place: { flexDirection: 'row', alignItems: 'center', gap: space[3], minHeight: 52 },
  words: { flex: 1 },
});
