import { useMemo } from 'react';
import { DataTable } from '../ui/data-table';
import { Disclosure } from '../ui/disclosure';
import { Formula } from '../ui/formula';
import { Quantity } from '../ui/quantity';
import type { Layer } from './curves-state';
import type { DrawnCurve } from './drawn-curve';
import type { FigureExtras } from './figure-extras';
import { lgConcentration, shownLg } from './lg-c';
import { shownCapacity, shownCharge, shownFraction } from './rounded';

interface NumbersProps {
  readonly drawn: DrawnCurve;
  readonly shown: readonly Layer[];
  readonly extras: FigureExtras;
  /** mol/L. */
  readonly total: string;
}

/** The figure's data as a table: a row each half pH unit. The CSV has every point. */
export function NumbersTable(props: NumbersProps) {
  return (
    <Disclosure label="Show the numbers">
      <Numbers {...props} />
    </Disclosure>
  );
}

function Numbers({ drawn, shown: layers, extras, total }: NumbersProps) {
  const { answer, formulas, shown } = drawn;
  const { capacity } = extras;
  const withCapacity = layers.includes('capacity') && capacity !== undefined;
  const withLg = layers.includes('lg-c');
  const rows = useMemo(
    () =>
      answer.points
        .map((point, i) => ({ ...point, capacity: capacity?.values[i] }))
        .filter(({ pH }) => Number.isInteger(Number(pH) * 2))
        .map(({ pH, fractions, meanCharge, capacity: beta }) => ({
          key: pH,
          capacity: beta === undefined ? '' : shownCapacity(beta),
          pH,
          charge: shownCharge(meanCharge),
          ...Object.fromEntries(
            shown.flatMap((index) => {
              const fraction = fractions[index] ?? '0';
              return [
                [`form${index}`, shownFraction(fraction)],
                [`lg${index}`, shownLg(lgConcentration(fraction, Number(total)))],
              ];
            }),
          ),
        })),
    [answer, shown, capacity, total],
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
        ...(withCapacity
          ? [
              {
                key: 'capacity',
                head: (
                  <>
                    <Quantity of="beta" />
                    /(mmol/L)
                  </>
                ),
                numeric: true,
              },
            ]
          : []),
        ...(withLg
          ? shown.map((index) => ({
              key: `lg${index}`,
              head: (
                <>
                  lg <Quantity of="concentration" />(<Formula formula={formulas[index] ?? ''} />)
                </>
              ),
              numeric: true,
            }))
          : []),
      ]}
      rows={rows}
    />
  );
}
