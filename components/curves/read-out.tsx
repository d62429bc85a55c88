import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { Formula } from '../ui/formula';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { ComparisonReadOut } from './comparison-read-out';
import type { Layer } from './curves-state';
import { describeReading } from './describe';
import type { DrawnCurve } from './drawn-curve';
import { EqualForms } from './equal-forms';
import type { FigureExtras } from './figure-extras';
import type { Reading } from './follow-curve';
import { FormsTable } from './forms-table';
import { CapacityRow, HoldsBest, LgCRows } from './layer-rows';
import { neighbourRatio } from './neighbours';
import { ValueRow } from './read-out-row';
import { readOutText } from './read-out-text';
import { shownCharge, shownPH, shownRatio } from './rounded';
import { useCopy } from '../ui/use-copy';
import { useSettled } from '../ui/use-settled';

interface ReadOutProps {
  readonly drawn: DrawnCurve;
  readonly reading: Reading;
  readonly shown: readonly Layer[];
  readonly extras: FigureExtras;
  /** mol/L. */
  readonly total: string;
  /** Two columns where the page is one wide column. */
  readonly columns: boolean;
}

/** A sentence is said once the cursor has rested this long, ms. */
const announced = 700;

/** What is present at the cursor. */
export function ReadOut(props: ReadOutProps) {
  const { drawn, reading, shown, extras, total, columns } = props;
  const { isoelectricPoint, beside } = extras;
  const capacity = shown.includes('capacity') ? extras.capacity : undefined;
  const copy = useCopy();
  const sentence = useSettled(describeReading(drawn, reading), announced);
  const ratio = neighbourRatio(reading);
  return (
    <View style={columns ? styles.columns : styles.column}>
      <View style={[styles.part, columns && styles.half]}>
        <FormsTable drawn={drawn} reading={reading} />
        <div role="status" className="only-said">
          {sentence}
        </div>
      </View>
      <View style={[styles.part, columns && styles.half]}>
        <View role="table" aria-label="Mean charge and ratio at the cursor">
          <ValueRow
            label={
              <Words>
                mean charge <Quantity of="meanCharge" />
              </Words>
            }
            value={shownCharge(reading.meanCharge)}
          />
          {capacity && <CapacityRow capacity={capacity} reading={reading} />}
          {shown.includes('isoelectric-point') && isoelectricPoint !== undefined && (
            <ValueRow
              label={
                <Words>
                  isoelectric point <Quantity of="isoelectricPoint" />
                </Words>
              }
              value={shownPH(isoelectricPoint)}
            />
          )}
          {ratio && (
            <ValueRow
              label={
                <Words>
                  <Formula formula={drawn.formulas[ratio.over] ?? ''} /> /{' '}
                  <Formula formula={drawn.formulas[ratio.under] ?? ''} />
                </Words>
              }
              value={shownRatio(ratio.ratio)}
            />
          )}
        </View>
        <View style={styles.copy}>
          <Button
            kind="quiet"
            icon="copy"
            label="Copy all digits"
            disabled={!reading.exact}
            onPress={() => copy('Read-out', readOutText(drawn, reading, shown, extras))}
          />
        </View>
        <ComparisonReadOut drawn={drawn} beside={beside} pH={reading.pH} />
        {shown.includes('lg-c') && (
          <LgCRows
            drawn={drawn}
            reading={reading}
            total={Number(total)}
            capacity={extras.capacity}
          />
        )}
        {capacity && <HoldsBest capacity={capacity} drawn={drawn} />}
        <EqualForms drawn={drawn} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  column: { gap: space[5] },
  columns: { flexDirection: 'row', gap: space[8], alignItems: 'flex-start' },
  part: { gap: space[3] },
  half: { flex: 1, minWidth: 0 },
  copy: { alignItems: 'flex-start' },
});
