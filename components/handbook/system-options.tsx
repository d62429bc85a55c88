import type { SystemSummary } from '../../shared/stored-system';
import type { Option } from '../ui/choice-list';
import { OptionNote } from './option-note';
import { suggestions } from './suggestions';
import { systemTitle } from './system-title';

/** Value of the option that begins a system of one's own; no id holds a space. */
export const typeOwn = 'type own';

const ownOption: Option<string> = {
  value: typeOwn,
  label: 'Type your own constants',
  note: 'typed or pasted',
};

/** What was found, or what is suggested before anything is typed; one's own constants always last. */
export const systemOptions = (
  found: readonly SystemSummary[] | undefined,
): readonly Option<string>[] => [
  ...(found
    ? found.map((system) => ({
        value: system.id,
        label: systemTitle(system.name),
        note: <OptionNote system={system} />,
      }))
    : suggestions.map(({ id, name }) => ({ value: id, label: systemTitle(name) }))),
  ownOption,
];
