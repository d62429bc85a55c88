import Head from 'expo-router/head';
import { Link } from 'expo-router';
import { useEffect } from 'react';
import { StyleSheet, useWindowDimensions, View } from 'react-native';
import { Failure } from '../ui/failure';
import { Mark } from '../ui/mark';
import { Skeleton } from '../ui/skeleton';
import { space, useTheme } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import { takeReturnAddress } from './return-address';
import { whoOf } from './session';
import { useSession } from './session-queries';
import { SignInFigure } from './sign-in-figure';
import { SignInForm } from './sign-in-form';

/** Signing in, with the curve that needs none of it beside it. */
export function SignInScreen() {
  const { colours } = useTheme();
  const { rail } = useLayout();
  const { height } = useWindowDimensions();
  return (
    <View role="main" style={[styles.page, rail && styles.pageWide]}>
      <Head>
        <title>Sign in · Stepwell</title>
      </Head>
      <View style={[styles.front, rail && styles.frontWide]}>
        <View style={styles.name}>
          <Mark size={28} />
          <Words kind="section">Stepwell</Words>
        </View>
        {rail && (
          <>
            <Words kind="display">{'At this pH,\nwhich form is it in?'}</Words>
            <SignInFigure
              layers={['fractions', 'predominance']}
              height={Math.min(Math.max(height - 260, 360), 640)}
              compact={false}
            />
          </>
        )}
      </View>
      <View style={rail && [styles.side, { backgroundColor: colours.raised }]}>
        <View style={[styles.panel, rail && styles.panelWide]}>
          <Words kind="title" heading={1}>
            Sign in
          </Words>
          <Entrance />
          <View style={[styles.otherwise, { borderTopColor: colours.rule }]}>
            <Words tone="inkSoft">
              Accounts come by invitation from your organization’s admin, who also helps with a
              forgotten password. The curve needs none.
            </Words>
            <Link href="/" style={styles.link}>
              <Words kind="button" tone="well">
                Open Curves without signing in
              </Words>
            </Link>
            {!rail && (
              <View style={styles.edge}>
                <SignInFigure layers={['predominance']} height={160} compact />
              </View>
            )}
          </View>
        </View>
      </View>
    </View>
  );
}

/** The form, once it is known that nobody is signed in. */
function Entrance() {
  const { data: session, error, refetch } = useSession();
  const isSignedIn = session?.state === 'signed-in';
  useEffect(() => {
    // A new page rather than a change of this one: nothing of the person before stays in memory,
    // and the address is read, fragment and all, as if it had been opened.
    if (isSignedIn) window.location.replace(takeReturnAddress());
  }, [isSignedIn]);
  if (error && !session) return <Failure error={error} onRetry={() => void refetch()} />;
  if (!session) return <Skeleton label="Looking who is signed in" />;
  return <SignInForm knownEmail={whoOf(session)?.account.email} />;
}

const styles = StyleSheet.create({
  page: {
    flexGrow: 1,
    gap: space[6],
    padding: space[4],
    ...webStyle({ minHeight: '100dvh' }),
  },
  pageWide: { flexDirection: 'row', gap: 0, padding: 0 },
  front: { gap: space[6] },
  frontWide: { flexGrow: 1, flexShrink: 1, minWidth: 0, maxWidth: 1008, padding: space[8] },
  name: { flexDirection: 'row', alignItems: 'center', gap: space[2] },
  side: { flexGrow: 1, flexShrink: 0, ...webStyle({ flexBasis: 'clamp(336px, 31vw, 448px)' }) },
  panel: { gap: space[4], width: '100%', maxWidth: 448 },
  panelWide: { paddingTop: 104, paddingHorizontal: space[10], paddingBottom: space[8] },
  otherwise: { gap: space[2], paddingTop: space[4], borderTopWidth: 1 },
  edge: { marginHorizontal: -space[4] },
  link: { paddingVertical: space[2], alignSelf: 'flex-start' },
});
