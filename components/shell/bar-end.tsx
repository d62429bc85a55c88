import { usePathname } from 'expo-router';
import { useState } from 'react';
import { Pressable } from 'react-native';
import { useSession } from '../account/session-queries';
import { SignInLink } from '../account/sign-in-link';
import { useTheme } from '../ui/theme';
import { BarItem, barSlot } from './bar-item';
import { MoreDialog } from './more-dialog';
import { isWithin, type Place } from './places';

/** The last slot of the bar: the account, and the places the bar has no room for. */
export function BarEnd({ behind }: { readonly behind: readonly Place[] }) {
  const { colours } = useTheme();
  const { data: session } = useSession();
  const pathname = usePathname();
  const [open, setOpen] = useState(false);
  if (behind.length === 0 && (session?.state === 'nobody' || session?.state === 'ended')) {
    return (
      <SignInLink style={[barSlot, { borderTopColor: 'transparent' }]}>
        <BarItem icon="person" label="Sign in" current={false} />
      </SignInLink>
    );
  }
  const current = behind.some((place) => isWithin(place, pathname));
  const more = behind.length > 0;
  return (
    <>
      <Pressable
        role="button"
        aria-haspopup="dialog"
        onPress={() => setOpen(true)}
        style={[barSlot, { borderTopColor: current ? colours.well : 'transparent' }]}
      >
        <BarItem
          icon={more ? 'more' : 'person'}
          label={more ? 'More' : 'Account'}
          current={current}
        />
      </Pressable>
      <MoreDialog behind={behind} open={open} onClose={() => setOpen(false)} />
    </>
  );
}
