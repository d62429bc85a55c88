import type { ReactNode, Ref } from 'react';
import { StyleSheet, View } from 'react-native';
import { Icon, type IconName } from './icon';
import { Numerals } from './numerals';
import { radius, space, useTheme } from './theme';
import { Words } from './words';

interface NoticeProps {
  readonly tone: 'warn' | 'bad' | 'good';
  readonly title: string;
  readonly children?: ReactNode;
  /** Of the refused call, so that it can be found in the service's logs. */
  readonly requestId?: string;
  /** Lets the focus be sent here: what is wrong is then read before what to change. */
  readonly ref?: Ref<View>;
}

const icons: Record<NoticeProps['tone'], IconName> = {
  warn: 'warning',
  bad: 'error',
  good: 'check',
};

/** A state worth reading: what it is, and what to do. Announced when it appears. */
export function Notice({ tone, title, children, requestId, ref }: NoticeProps) {
  const { colours } = useTheme();
  return (
    <View
      ref={ref}
      tabIndex={ref ? -1 : undefined}
      role={tone === 'bad' ? 'alert' : 'status'}
      style={[styles.notice, { backgroundColor: colours[`${tone}Wash`] }]}
    >
      <Icon name={icons[tone]} tone={tone} />
      <View style={styles.words}>
        <Words kind="button">{title}</Words>
        {typeof children === 'string' ? <Words>{children}</Words> : children}
        {requestId !== undefined && requestId !== '' && (
          <Words kind="help">
            Request <Numerals>{requestId}</Numerals>
          </Words>
        )}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  notice: { flexDirection: 'row', gap: space[3], padding: space[4], borderRadius: radius },
  words: { flex: 1, gap: space[1], alignItems: 'flex-start' },
});
