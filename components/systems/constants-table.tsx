import type { Constant } from '../../shared/constant';
import type { Species } from '../../shared/species';
import { DataTable, type Column } from '../ui/data-table';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { ConstantFlags } from './constant-flags';
import { StepFormulas } from './step-formulas';

export interface ConstantsProps {
  readonly caption: string;
  readonly constants: readonly Constant[];
  readonly species: readonly Species[];
}

/** Constants with all that was determined with them; a column that nothing is known for is left out. */
export function ConstantsTable({ caption, constants, species }: ConstantsProps) {
  const known = (key: 'uncertainty' | 'deltaH' | 'deltaCp') =>
    constants.some((constant) => constant[key] !== null);
  const columns: Column[] = [
    { key: 'step', head: 'Step' },
    { key: 'forms', head: 'Proton leaves' },
    { key: 'value', head: <Quantity of="pKa" />, numeric: true },
  ];
  if (known('uncertainty')) {
    columns.push({ key: 'uncertainty', head: <Quantity of="uncertainty" />, numeric: true });
  }
  if (known('deltaH')) {
    columns.push({
      key: 'deltaH',
      head: (
        <>
          <Quantity of="deltaH" />
          /(kJ/mol)
        </>
      ),
      numeric: true,
    });
  }
  if (known('deltaCp')) {
    columns.push({
      key: 'deltaCp',
      head: (
        <>
          <Quantity of="deltaCp" />
          /(J/(mol K))
        </>
      ),
      numeric: true,
    });
  }
  return (
    <DataTable
      caption={caption}
      hideCaption
      columns={columns}
      rows={constants.map((constant) => ({
        key: String(constant.step),
        step: <Numerals size={14}>{constant.step}</Numerals>,
        forms: (
          <>
            <StepFormulas step={constant.step} species={species} />
            <ConstantFlags {...constant} />
          </>
        ),
        value: (
          <Numerals size={14} bold>
            {constant.value}
          </Numerals>
        ),
        uncertainty: constant.uncertainty,
        deltaH: constant.deltaH,
        deltaCp: constant.deltaCp,
      }))}
    />
  );
}
