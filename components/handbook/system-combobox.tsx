import { useEffect, useId, useRef, useState } from 'react';
import { View, type TextInput } from 'react-native';
import { ChoiceList } from '../ui/choice-list';
import { Field, type FieldKey } from '../ui/field';
import { useOnline } from '../ui/use-online';
import { useLong } from '../ui/use-settled';
import { comboboxMove, inText } from './combobox-keys';
import { useSystemSearch } from './handbook-queries';
import { searchStatus } from './search-status';
import { systemOptions, typeOwn } from './system-options';
import { systemTitle } from './system-title';

interface SystemComboboxProps {
  readonly label: string;
  /** What is chosen, in words; empty while its name is not known. */
  readonly value: string;
  readonly onPick: (id: string) => void;
  readonly onTypeOwn: () => void;
  /** It was asked for a moment ago: the next key is its, and what may be chosen is in sight. */
  readonly startsOpen?: boolean;
}

interface Typing {
  /** Undefined while nothing was typed since the last choice. */
  readonly text: string | undefined;
  readonly open: boolean;
  /** Where the keys went; undefined for the first match, as long as there is one. */
  readonly moved: number | undefined;
}

const resting: Typing = { text: undefined, open: false, moved: undefined };
const shownAtMost = 20;
/** px; a column of inputs is narrower than a formula and its constants. */
const leastWidth = 280;

/** Finds a system while it is typed. */
export function SystemCombobox({
  label,
  value,
  onPick,
  onTypeOwn,
  startsOpen = false,
}: SystemComboboxProps) {
  const id = useId();
  const input = useRef<TextInput>(null);
  const latest = useRef<string>(undefined);
  const online = useOnline();
  const [{ text, open, moved }, setTyping] = useState({ ...resting, open: startsOpen });
  const [picked, setPicked] = useState('');
  const isTyped = text !== undefined && text.trim() !== '';
  const search = useSystemSearch(text ?? '', shownAtMost, open && isTyped);
  const isSlow = useLong(isTyped && online && !search.isCurrent && !search.error);

  useEffect(() => {
    if (startsOpen) input.current?.focus();
  }, [startsOpen]);

  const options = systemOptions(isTyped ? (search.systems ?? []) : undefined);
  const hasMatch = isTyped && search.isCurrent && options.length > 1;
  const at = moved ?? (hasMatch ? 0 : inText);
  const status = isTyped ? searchStatus(search, { online, isSlow }) : undefined;
  const optionId = (index: number) => `${id}-option-${index}`;

  const rest = () => {
    latest.current = undefined;
    setTyping(resting);
  };
  const take = (chosen: string, name: string) => {
    rest();
    setPicked(name);
    if (chosen === typeOwn) onTypeOwn();
    else onPick(chosen);
  };
  const takeAt = (index: number) => {
    const option = options[index];
    if (option) take(option.value, option.label);
  };
  /** Enter before the list is there: the first match is taken once it has come. */
  const takeFirst = async () => {
    const first = await search.first();
    if (first && latest.current === text) take(first.id, systemTitle(first.name));
  };
  const press = (event: FieldKey) => {
    if (event.key === 'Enter' && isTyped && at === inText && !search.isCurrent && online) {
      // What went wrong is said over the list.
      takeFirst().catch(() => undefined);
    }
    const move = comboboxMove(event, { open, at }, options.length);
    if (!move) return;
    event.preventDefault();
    if (move.take) takeAt(move.state.at);
    else setTyping({ text, open: move.state.open, moved: move.state.at });
  };
  const type = (next: string) => {
    latest.current = next;
    setTyping({ text: next, open: true, moved: undefined });
  };

  return (
    <View>
      <View onClick={() => setTyping({ text, open: true, moved })}>
        <Field
          ref={input}
          label={label}
          kind="words"
          value={text ?? (value || picked)}
          onChangeText={type}
          onKeyDown={press}
          onBlur={rest}
          selectOnFocus
          listbox={{ id: `${id}-list`, open, at: at === inText ? undefined : optionId(at) }}
          help="By name, formula or CAS number"
        />
      </View>
      {open && (
        <ChoiceList
          id={`${id}-list`}
          label={label}
          anchor={input}
          options={options}
          at={at}
          chosen={-1}
          optionId={optionId}
          onTake={takeAt}
          status={status}
          leastWidth={leastWidth}
        />
      )}
      <div role="status" className="only-said">
        {open ? (status ?? (hasMatch ? `${options.length - 1} found` : '')) : ''}
      </div>
    </View>
  );
}
