import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { Notice } from '../ui/notice';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { Words } from '../ui/words';
import { useSession } from './session-queries';
import { SignInLink } from './sign-in-link';

/** Says, once, that a session ended while somebody was working. What is on screen stays. */
export function SessionEnded() {
  const { rail } = useLayout();
  const { data: session } = useSession();
  const [seen, setSeen] = useState<typeof session>();
  if (session?.state !== 'ended' || seen === session) return null;
  return (
    <View style={[styles.place, rail && styles.placeWide]}>
      <Notice tone="warn" title="You are signed out">
        <View style={styles.answer}>
          <View style={styles.words}>
            <Words>
              What is on screen stays. Sign in again, and you come back to this address as it is
              now.
            </Words>
          </View>
          <SignInLink style={styles.link}>
            <Words kind="button" tone="well">
              Sign in again
            </Words>
          </SignInLink>
          <Button kind="quiet" label="Not now" onPress={() => setSeen(session)} />
        </View>
      </Notice>
    </View>
  );
}

const styles = StyleSheet.create({
  place: { padding: space[4], paddingBottom: 0 },
  placeWide: { paddingHorizontal: space[6] },
  words: { flexShrink: 1 },
  answer: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space[6] },
  link: { minHeight: 44, justifyContent: 'center' },
});
