import { SystemCombobox } from '../handbook/system-combobox';
import type { Curves } from './use-curves';

/** Which system is drawn: one of the handbook, or one that is typed. */
export function SystemChoice({ state: { choice }, title, curve, choose, typeOwn }: Curves) {
  return (
    <SystemCombobox
      label="System"
      value={choice.kind === 'typed' ? 'Your own constants' : curve.isCurrent ? title : ''}
      onPick={(id) => choose({ kind: 'stored', id })}
      onTypeOwn={typeOwn}
    />
  );
}
