import { useLayoutEffect, useRef, useState, type ReactNode, type RefObject } from 'react';
import { StyleSheet, View, type Role, type TextInput } from 'react-native';
import { elementOf } from './element';
import { Icon } from './icon';
import { placeBeside, type Placement } from './place-beside';
import { radius, space, useTheme } from './theme';
import { webStyle } from './web-style';
import { Words } from './words';

export interface Option<Value extends string> {
  readonly value: Value;
  readonly label: string;
  /** Stands in the label's place, as a formula does; the label is still what letters find. */
  readonly shown?: ReactNode;
  readonly note?: ReactNode;
}

interface ChoiceListProps<Value extends string> {
  readonly id: string;
  readonly label: string;
  readonly anchor: RefObject<View | TextInput | null>;
  readonly options: readonly Option<Value>[];
  readonly at: number;
  readonly chosen: number;
  readonly optionId: (index: number) => string;
  readonly onTake: (index: number) => void;
  /** Stands over the options: why there are none, what is waited for. */
  readonly status?: string | undefined;
  /** px; the list may be wider than what it belongs to. */
  readonly leastWidth?: number;
}

/**
 * The list of a choice, in the browser's top layer: every react-native-web view is a stacking
 * context, so a list that only had a high z-index would lie under what follows.
 */
export function ChoiceList<Value extends string>({
  id,
  label,
  anchor,
  options,
  at,
  chosen,
  optionId,
  onTake,
  status,
  leastWidth = 0,
}: ChoiceListProps<Value>) {
  const { colours } = useTheme();
  const list = useRef<View>(null);
  const [placement, setPlacement] = useState<Placement>();

  useLayoutEffect(() => {
    const box = elementOf(anchor.current);
    const element = elementOf(list.current);
    if (!box || !element) return;
    const place = () => setPlacement(placeBeside(box.getBoundingClientRect(), seen(), leastWidth));
    place();
    element.popover = 'manual';
    element.showPopover();
    // A phone's keyboard covers the window without resizing it.
    const { visualViewport } = window;
    visualViewport?.addEventListener('resize', place);
    window.addEventListener('resize', place);
    window.addEventListener('scroll', place, true);
    // A sheet may still be on its way up.
    window.addEventListener('animationend', place);
    return () => {
      visualViewport?.removeEventListener('resize', place);
      window.removeEventListener('resize', place);
      window.removeEventListener('scroll', place, true);
      window.removeEventListener('animationend', place);
    };
  }, [anchor, leastWidth]);

  useLayoutEffect(() => {
    document.getElementById(optionId(at))?.scrollIntoView({ block: 'nearest' });
  });

  return (
    <View
      ref={list}
      // The focus stays on the choice itself: a press here must not take it.
      onMouseDown={(event) => event.preventDefault()}
      style={[
        styles.list,
        placement && webStyle({ ...placement }),
        { backgroundColor: colours.page, borderColor: colours.edge },
        webStyle({ boxShadow: `0 8px 24px ${colours.shadow}` }),
      ]}
    >
      {status !== undefined && (
        <View style={styles.status}>
          <Words kind="help">{status}</Words>
        </View>
      )}
      <View id={id} role={listbox} aria-label={label}>
        {options.map((option, index) => (
          <View
            key={option.value}
            id={optionId(index)}
            role="option"
            aria-selected={index === chosen}
            onClick={() => onTake(index)}
            style={[styles.option, index === at && { backgroundColor: colours.wash }]}
          >
            <View style={styles.words}>
              <Words>{option.shown ?? option.label}</Words>
              {option.note !== undefined && <Words kind="help">{option.note}</Words>}
            </View>
            {index === chosen && <Icon name="check" size={16} tone="well" />}
          </View>
        ))}
      </View>
    </View>
  );
}

/** The part of the window that is in sight. */
const seen = () => {
  const { visualViewport, innerHeight, innerWidth } = window;
  const bottom = visualViewport ? visualViewport.offsetTop + visualViewport.height : innerHeight;
  return { innerHeight: bottom, innerWidth };
};

/** React Native's types know no list box; the web does. */
const listbox = 'listbox' as string as Role;

const styles = StyleSheet.create({
  list: {
    borderWidth: 1,
    borderRadius: radius,
    paddingVertical: space[1],
    ...webStyle({ position: 'fixed', overflowY: 'auto', right: 'auto', bottom: 'auto' }),
  },
  option: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[2],
    minHeight: 44,
    paddingVertical: space[1],
    paddingHorizontal: space[3],
    cursor: 'pointer',
    userSelect: 'none',
  },
  words: { flex: 1, minWidth: 0 },
  status: { paddingVertical: space[2], paddingHorizontal: space[3] },
});
