import Head from 'expo-router/head';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Mark } from '../ui/mark';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { Words } from '../ui/words';

interface PageProps {
  /** Names the page in the browser's tab. */
  readonly title: string;
  /** The one h1; default the title. */
  readonly heading?: ReactNode;
  /** Beside the heading on a wide screen, below it on a phone. */
  readonly subtitle?: ReactNode;
  /** Buttons at the right of the heading. */
  readonly actions?: ReactNode;
  /** A phone's main action, in a `Dock` under the content. */
  readonly dock?: ReactNode;
  readonly children: ReactNode;
}

/** A place's page: its title, its one h1, its gutters. */
export function Page({ title, heading = title, subtitle, actions, dock, children }: PageProps) {
  const { rail } = useLayout();
  return (
    <>
      <Head>
        <title>{`${title} · Stepwell`}</title>
      </Head>
      <View style={[styles.head, rail && styles.headWide]}>
        {!rail && <Mark size={28} />}
        <View style={rail ? styles.titleWide : styles.title}>
          <Words kind="title" heading={1}>
            {heading}
          </Words>
          {subtitle}
        </View>
        {actions}
      </View>
      <View style={[styles.content, rail && styles.contentWide]}>{children}</View>
      {dock}
    </>
  );
}

const styles = StyleSheet.create({
  head: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[3],
    minHeight: 66,
    paddingHorizontal: space[4],
    paddingVertical: space[2],
  },
  headWide: { minHeight: 76, paddingHorizontal: space[6] },
  title: { flex: 1, minWidth: 0 },
  titleWide: {
    flex: 1,
    minWidth: 0,
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    gap: space[3],
  },
  content: { paddingHorizontal: space[4], paddingBottom: space[6] },
  contentWide: { paddingHorizontal: space[6] },
});
