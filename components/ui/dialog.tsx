import { useId, useLayoutEffect, useRef, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Button } from './button';
import { keepFocusWithin } from './keep-focus-within';
import { radius, space, useTheme } from './theme';
import { useLayout } from './use-layout';
import { Words } from './words';

interface DialogProps {
  /** What happens: "Revoke lims-nightly". */
  readonly title: string;
  readonly open: boolean;
  readonly onClose: () => void;
  /** For what does not fit a column of text; a sheet on a phone is as wide as it is. */
  readonly wide?: boolean;
  readonly children: ReactNode;
  /** Buttons, the safe one first. */
  readonly actions?: ReactNode;
}

/**
 * A question or a view that waits on top of the page. The browser's own modal `<dialog>`: the page
 * behind is inert, Esc closes, and the focus goes back to where it was.
 */
export function Dialog({ title, open, onClose, wide = false, children, actions }: DialogProps) {
  const { colours } = useTheme();
  const { rail } = useLayout();
  const titleId = useId();
  const element = useRef<HTMLDialogElement>(null);

  useLayoutEffect(() => {
    const dialog = element.current;
    if (!open || !dialog) return;
    dialog.showModal();
    return () => dialog.close();
  }, [open]);

  return (
    <dialog
      ref={element}
      aria-labelledby={titleId}
      aria-modal
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      onClick={(event) => {
        // The backdrop belongs to the dialog element itself.
        if (event.target === event.currentTarget) onClose();
      }}
      onKeyDown={keepFocusWithin}
      className={rail ? (wide ? 'dialog wide' : 'dialog') : 'dialog sheet'}
    >
      {open && (
        <View
          style={[
            styles.body,
            rail ? styles.floating : styles.sheet,
            { backgroundColor: colours.page, borderColor: colours.edge },
          ]}
        >
          <View style={styles.head}>
            <View style={styles.title}>
              <Words kind="section" heading={2} nativeID={titleId}>
                {title}
              </Words>
            </View>
            <Button kind="quiet" icon="close" label="Close" hideLabel onPress={onClose} />
          </View>
          {children}
          {actions !== undefined && (
            <View style={[styles.actions, !rail && styles.actionsSheet]}>{actions}</View>
          )}
        </View>
      )}
    </dialog>
  );
}

const styles = StyleSheet.create({
  body: { gap: space[3], padding: space[5], borderWidth: 1 },
  floating: { borderRadius: radius },
  sheet: { borderTopLeftRadius: radius, borderTopRightRadius: radius, borderBottomWidth: 0 },
  head: { flexDirection: 'row', alignItems: 'center', gap: space[3] },
  title: { flex: 1 },
  actions: { flexDirection: 'row', justifyContent: 'flex-end', gap: space[2], marginTop: space[2] },
  actionsSheet: { flexDirection: 'column' },
});
