import { useMemo } from 'react';
import { DataTable } from '../ui/data-table';
import { Disclosure } from '../ui/disclosure';
import { Formula } from '../ui/formula';
import { Quantity } from '../ui/quantity';
import type { DrawnCurve } from './drawn-curve';
import { shownCharge, shownFraction } from './rounded';

/** The figure's data as a table: a row each half pH unit. The CSV has every point. */
export function NumbersTable({ drawn }: { readonly drawn: DrawnCurve }) {
  return (
    <Disclosure label="Show the numbers">
      <Numbers drawn={drawn} />
    </Disclosure>
  );
}

function Numbers({ drawn }: { readonly drawn: DrawnCurve }) {
  const { answer, formulas, shown } = drawn;
  const rows = useMemo(
    () =>
      answer.points
        .filter(({ pH }) => Number.isInteger(Number(pH) * 2))
        .map(({ pH, fractions, meanCharge }) => ({
          key: pH,
          pH,
          charge: shownCharge(meanCharge),
          ...Object.fromEntries(
            shown.map((index) => [`form${index}`, shownFraction(fractions[index] ?? '0')]),
          ),
        })),
    [answer, shown],
  );
  return (
    <DataTable
      caption="Fraction of each form and mean charge, each half unit of pH. Export gives every point."
      maxHeight={360}
      columns={[
        { key: 'pH', head: 'pH', numeric: true },
        ...shown.map((index) => ({
          key: `form${index}`,
          head: <Formula formula={formulas[index] ?? ''} />,
          numeric: true,
        })),
        { key: 'charge', head: <Quantity of="meanCharge" />, numeric: true },
      ]}
      rows={rows}
    />
  );
}
