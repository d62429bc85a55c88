import { Choice } from '../ui/choice';
import { useToast } from '../ui/toast';
import { examples } from './examples';
import type { Curves } from './use-curves';

const own = 'own';

const options = [
  ...examples.map(({ id, title, system }) => ({
    value: id,
    label: title,
    note: system.pKa.join(', '),
  })),
  { value: own, label: 'Your own constants', note: 'typed or pasted' },
];

/** Which system is drawn: an example, or one that is typed. */
export function SystemChoice({ state: { choice }, choose, typeOwn }: Curves) {
  const say = useToast();
  const pick = (id: string) => {
    choose({ kind: 'example', id });
    if (choice.kind === 'typed') {
      say({ text: 'Your own constants are put away', undo: () => choose(choice) });
    }
  };
  return (
    <Choice
      label="System"
      options={options}
      value={choice.kind === 'example' ? choice.id : own}
      onChange={(id) => (id === own ? typeOwn() : pick(id))}
    />
  );
}
