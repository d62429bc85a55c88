import type { Species } from '../../shared/species';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';
import { Words } from '../ui/words';

interface StepFormulasProps {
  /** From 1: the proton that leaves. */
  readonly step: number;
  readonly species: readonly Species[];
}

/** Which form gives up a proton, and what it becomes; their charges where no formula is known. */
export function StepFormulas({ step, species }: StepFormulasProps) {
  const [before, after] = [species[step - 1], species[step]];
  if (!before || !after) return null;
  return (
    <Words>
      <Form of={before} /> <Numerals>→</Numerals> <Form of={after} />
    </Words>
  );
}

function Form({ of: { formula, charge } }: { readonly of: Species }) {
  if (formula) return <Formula formula={formula} />;
  return <>charge {<Numerals>{charge}</Numerals>}</>;
}
