import { useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import type { AccountAnswer } from '../../shared/account';
import { useSession } from '../account/session-queries';
import { SignInLink } from '../account/sign-in-link';
import { Icon } from '../ui/icon';
import { space, useTheme } from '../ui/theme';
import { softColour } from '../ui/web-style';
import { Words } from '../ui/words';
import { MoreDialog } from './more-dialog';

/** The foot of the rail: who is signed in, or the way to be. */
export function RailAccount({ wide }: { readonly wide: boolean }) {
  const { data: session } = useSession();
  const { colours } = useTheme();
  return (
    <View style={[styles.foot, wide && styles.footWide, { borderTopColor: colours.rule }]}>
      {session?.state === 'signed-in' && <Who who={session.who} wide={wide} />}
      {(session?.state === 'nobody' || session?.state === 'ended') && (
        <SignInLink style={[styles.entry, wide && styles.entryWide]}>
          {!wide && <Icon name="person" size={24} tone="well" />}
          <Words kind={wide ? 'button' : 'help'} tone="well">
            Sign in
          </Words>
        </SignInLink>
      )}
    </View>
  );
}

function Who({ who, wide }: { readonly who: AccountAnswer; readonly wide: boolean }) {
  const { colours } = useTheme();
  const [open, setOpen] = useState(false);
  return (
    <>
      <Pressable
        role="button"
        aria-haspopup="dialog"
        onPress={() => setOpen(true)}
        style={({ hovered }) => [
          styles.entry,
          wide && styles.entryWide,
          softColour,
          hovered && { backgroundColor: colours.raised },
        ]}
      >
        {wide ? (
          <>
            <Words kind="label">{who.account.name}</Words>
            <Words kind="help">{`${who.role}, ${who.organization.name}`}</Words>
          </>
        ) : (
          <>
            <Icon name="person" size={24} tone="inkSoft" />
            <Words kind="help">Account</Words>
          </>
        )}
      </Pressable>
      <MoreDialog behind={[]} open={open} onClose={() => setOpen(false)} />
    </>
  );
}

const styles = StyleSheet.create({
  foot: { marginTop: 'auto', minHeight: 64, borderTopWidth: 1, paddingVertical: space[1] },
  footWide: { marginHorizontal: space[6], paddingVertical: space[2] },
  entry: {
    minHeight: 56,
    alignItems: 'center',
    justifyContent: 'center',
    gap: space[1],
    outlineOffset: -3,
  },
  entryWide: { alignItems: 'flex-start', gap: 0, marginHorizontal: -space[2], padding: space[2] },
});
