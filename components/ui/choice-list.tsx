import { useLayoutEffect, useRef, useState, type RefObject } from 'react';
import { StyleSheet, View, type Role } from 'react-native';
import { elementOf } from './element';
import { Icon } from './icon';
import { placeBeside, type Placement } from './place-beside';
import { radius, space, useTheme } from './theme';
import { webStyle } from './web-style';
import { Words } from './words';

export interface Option<Value extends string> {
  readonly value: Value;
  readonly label: string;
  readonly note?: string;
}

interface ChoiceListProps<Value extends string> {
  readonly id: string;
  readonly label: string;
  readonly anchor: RefObject<View | null>;
  readonly options: readonly Option<Value>[];
  readonly at: number;
  readonly chosen: number;
  readonly optionId: (index: number) => string;
  readonly onTake: (index: number) => void;
  readonly onClose: () => void;
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
  onClose,
}: ChoiceListProps<Value>) {
  const { colours } = useTheme();
  const list = useRef<View>(null);
  const [placement, setPlacement] = useState<Placement>();

  useLayoutEffect(() => {
    const box = elementOf(anchor.current);
    const element = elementOf(list.current);
    if (!box || !element) return;
    setPlacement(placeBeside(box.getBoundingClientRect(), window));
    element.popover = 'manual';
    element.showPopover();
  }, [anchor]);

  useLayoutEffect(() => {
    document.getElementById(optionId(at))?.scrollIntoView({ block: 'nearest' });
  });

  useLayoutEffect(() => {
    const scrolled = (event: Event) => {
      if (event.target !== elementOf(list.current)) onClose();
    };
    window.addEventListener('resize', onClose);
    window.addEventListener('scroll', scrolled, true);
    return () => {
      window.removeEventListener('resize', onClose);
      window.removeEventListener('scroll', scrolled, true);
    };
  }, [onClose]);

  return (
    <View
      ref={list}
      id={id}
      role={listbox}
      aria-label={label}
      // The focus stays on the choice itself: a press here must not take it.
      onMouseDown={(event) => event.preventDefault()}
      style={[
        styles.list,
        placement && webStyle({ ...placement }),
        { backgroundColor: colours.page, borderColor: colours.edge },
        webStyle({ boxShadow: `0 8px 24px ${colours.shadow}` }),
      ]}
    >
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
            <Words>{option.label}</Words>
            {option.note !== undefined && <Words kind="help">{option.note}</Words>}
          </View>
          {index === chosen && <Icon name="check" size={16} tone="well" />}
        </View>
      ))}
    </View>
  );
}

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
  words: { flex: 1 },
});
