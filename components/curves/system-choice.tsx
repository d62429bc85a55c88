import { SystemCombobox } from '../handbook/system-combobox';
import { useToast } from '../ui/toast';
import type { Curves } from './use-curves';

/** Which system is drawn: one of the handbook, or one that is typed. */
export function SystemChoice({ state: { choice }, title, curve, choose, typeOwn }: Curves) {
  const say = useToast();
  const pick = (id: string) => {
    choose({ kind: 'stored', id });
    if (choice.kind === 'typed') {
      say({ text: 'Your own constants are put away', undo: () => choose(choice) });
    }
  };
  // Its name comes with its first curve; where that is refused, its id is all there is.
  const stored = curve.isOfChoice
    ? title
    : curve.error && choice.kind === 'stored'
      ? choice.id
      : '';
  return (
    <SystemCombobox
      label="System"
      value={choice.kind === 'typed' ? 'Your own constants' : stored}
      onPick={pick}
      onTypeOwn={typeOwn}
    />
  );
}
