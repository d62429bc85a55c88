import { View } from 'react-native';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { Words } from '../ui/words';
import { capacityAt, hydrogenAt, hydroxideAt, type Capacity } from './capacity';
import type { DrawnCurve } from './drawn-curve';
import type { Reading } from './follow-curve';
import { lgConcentration, shownLg } from './lg-c';
import { Folded, rowsAtMost } from './folded';
import { ValueRow } from './read-out-row';
import { shownCapacity, trueMinus } from './rounded';
import { totalInWords } from './total-in-words';

interface AtCursorProps {
  readonly capacity: Capacity;
  readonly reading: Reading;
}

/** Buffer capacity at the cursor. */
export function CapacityRow({ capacity, reading }: AtCursorProps) {
  return (
    <ValueRow
      label={
        <Words>
          capacity <Quantity of="beta" />
          /(mmol/L)
        </Words>
      }
      value={shownCapacity(capacityAt(capacity, reading))}
    />
  );
}

/** Where the system buffers best. */
export function HoldsBest({
  capacity,
  drawn,
}: {
  readonly capacity: Capacity;
  readonly drawn: DrawnCurve;
}) {
  const [from, to] = drawn.range;
  const peaks = capacity.maxima.filter(({ pH }) => pH >= from && pH <= to);
  return (
    <View>
      <Words kind="section" heading={2}>
        Holds best
      </Words>
      {peaks.length === 0 ? (
        <Words tone="inkSoft">
          <Quantity of="beta" /> has no maximum here: it only grows towards strong acid and base.
        </Words>
      ) : (
        <Folded label={`Show all ${peaks.length} maxima`} fold={peaks.length > rowsAtMost}>
          <View role="table" aria-label="Maxima of buffer capacity">
            {peaks.map(({ pH, value }) => (
              <ValueRow
                key={pH}
                label={
                  <Words>
                    at pH <Numerals>{pH.toFixed(2)}</Numerals>
                  </Words>
                }
                value={shownCapacity(value)}
              />
            ))}
          </View>
        </Folded>
      )}
    </View>
  );
}

interface LgCRowsProps {
  readonly drawn: DrawnCurve;
  readonly reading: Reading;
  readonly total: number;
  readonly capacity: Capacity | undefined;
}

/** lg(c/(mol/L)) of every form at the cursor, and of the ions of water. */
export function LgCRows({ drawn, reading, total, capacity }: LgCRowsProps) {
  const pH = Number(reading.pH);
  const forms = reading.fractions.map((fraction, index) => ({
    formula: drawn.formulas[index] ?? '',
    value: lgConcentration(fraction, total),
  }));
  const ions = capacity
    ? [
        { formula: 'H^+', value: Math.log10(hydrogenAt(capacity, pH)) },
        { formula: 'OH^-', value: Math.log10(hydroxideAt(capacity, pH)) },
      ]
    : [];
  return (
    <View>
      <Words kind="section" heading={2}>
        lg <Quantity of="concentration" />
      </Words>
      <Words kind="help">
        <Quantity of="concentration" /> in mol/L, at a total of{' '}
        <Numerals>{totalInWords(total)}</Numerals> mmol/L.
      </Words>
      <View role="table" aria-label="Logarithms of the concentrations at the cursor">
        {[...forms, ...ions].map(({ formula, value }) => (
          <ValueRow
            key={formula}
            label={<Formula formula={formula} />}
            value={trueMinus(shownLg(value))}
          />
        ))}
      </View>
    </View>
  );
}
