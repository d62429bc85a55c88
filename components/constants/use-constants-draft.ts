import { useState } from 'react';
import { plainSystem, type Choice } from './choice';
import type { ConstantsDraft, DraftFaults } from './constants-draft';
import { checkDraft, draftOf } from './constants-draft';

export interface DraftEditing {
  readonly draft: ConstantsDraft;
  readonly faults: DraftFaults;
  readonly edit: (draft: ConstantsDraft) => void;
}

const noFaults: DraftFaults = { pKa: {} };

/**
 * The typed system as it stands in the fields. Each edit that can be drawn becomes the choice; one
 * that cannot keeps the choice as it was. A choice from elsewhere replaces the draft.
 */
export function useConstantsDraft(
  choice: Choice,
  onChoice: (choice: Choice) => void,
): DraftEditing {
  const typed = choice.kind === 'typed' ? choice.system : plainSystem;
  const fresh = () => ({ of: choice, draft: draftOf(typed), faults: noFaults });
  const [held, setHeld] = useState(fresh);
  const current = held.of === choice ? held : fresh();
  if (current !== held) setHeld(current);
  const edit = (draft: ConstantsDraft) => {
    const checked = checkDraft(draft);
    if (!checked.ok) {
      setHeld({ of: choice, draft, faults: checked.faults });
      return;
    }
    const next: Choice = { kind: 'typed', system: checked.system };
    setHeld({ of: next, draft, faults: noFaults });
    onChoice(next);
  };
  return { draft: current.draft, faults: current.faults, edit };
}
