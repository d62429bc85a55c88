import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { Numerals } from '../ui/numerals';
import { space, useTheme } from '../ui/theme';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import { useCopy } from '../ui/use-copy';
import type { WrittenRequest } from './request-code';
import { requestCode } from './request-code';
import { aboutRequest, RequestView, useLanguage } from './request-view';

/** Heights of the drawer, px: opening it shrinks the plot and never covers it. */
export const drawerHeights = { closed: 48, open: 240 } as const;

/** The code lines up with the plot's axis, px. */
const axisInset = 36;

interface RequestDrawerProps {
  readonly request: WrittenRequest;
  readonly open: boolean;
  readonly onToggle: () => void;
  /** What the call gives: `this curve`. */
  readonly gives: string;
  /** Chooses the call, where there are several. */
  readonly which?: ReactNode;
  /** Width of the inputs column, whose edges the drawer keeps. */
  readonly inputsWidth: number;
}

/** The call that gives what is on the screen, at the foot of a wide window. */
export function RequestDrawer(props: RequestDrawerProps) {
  const { request, gives, open, onToggle, which, inputsWidth } = props;
  const { colours } = useTheme();
  const [language, setLanguage] = useLanguage();
  const copy = useCopy();
  return (
    <View
      role="region"
      aria-label="The request"
      style={[
        styles.drawer,
        { height: drawerHeights[open ? 'open' : 'closed'] },
        { backgroundColor: colours.raised, borderTopColor: colours.edge },
      ]}
    >
      <View style={[styles.side, { width: inputsWidth }]}>
        <Words kind="button" heading={2}>
          The request
        </Words>
        {open && <Words kind="help">{aboutRequest(gives)}</Words>}
        {open && which}
      </View>
      <View style={styles.code}>
        {open ? (
          <RequestView request={request} language={language} onLanguage={setLanguage} />
        ) : (
          <View style={styles.line}>
            <Numerals size={13} tone="inkSoft">
              POST {new URL(request.url).pathname}
            </Numerals>
          </View>
        )}
      </View>
      <View style={styles.actions}>
        <Button
          kind="quiet"
          icon="copy"
          label="Copy"
          onPress={() => copy(`Request in ${language}`, requestCode[language](request))}
        />
        <Button kind="quiet" label={open ? 'Close' : 'Open'} expanded={open} onPress={onToggle} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  drawer: {
    flexDirection: 'row',
    gap: space[5],
    paddingHorizontal: space[6],
    borderTopWidth: 1,
    marginTop: 'auto',
    ...webStyle({ position: 'sticky', bottom: 0, zIndex: 1 }),
  },
  side: { gap: space[2], paddingTop: space[3] },
  code: { flex: 1, minWidth: 0, paddingLeft: axisInset, ...webStyle({ overflowY: 'auto' }) },
  line: { height: 47, justifyContent: 'center' },
  actions: { flexDirection: 'row', gap: space[3], height: 47, alignItems: 'center' },
});
