import { StyleSheet, View } from 'react-native';
import { limits } from '../../shared/limits';
import { QuantityField } from '../conditions/quantity-field';
import { Button } from '../ui/button';
import { Checkbox } from '../ui/checkbox';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import { AddComponent } from './add-component';
import { concentrationAsked, pressureAsked } from './asked-quantities';
import { ElectrolyteRow } from './electrolyte-row';
import { unknownSystem } from './faults';
import { electrolytesAtMost } from './fragment';
import { MixtureConditions } from './mixture-conditions';
import { airOfToday, firstConcentration } from './mixture-state';
import type { Mixture } from './use-mixture';
import { WeighedPart } from './weighed-part';

/** What is in the flask, and what it is like there. */
export function FlaskInputs({ mixture }: { readonly mixture: Mixture }) {
  const { state, systemOf, isMissing, faults, flask, change } = mixture;
  const { parts, electrolytes, air } = state;
  const { colours } = useTheme();
  return (
    <View style={styles.inputs}>
      <View style={styles.head}>
        <Words kind="section" heading={2}>
          In the flask
        </Words>
        <Words kind="help">
          {parts.length} of {limits.components} components
        </Words>
      </View>
      {parts.length === 0 && (
        <Words kind="help">Water alone. Add what you weigh in, or a strong acid or base.</Words>
      )}
      {parts.map((part, index) => (
        <WeighedPart
          key={`${flask.generation} ${index}`}
          part={part}
          system={systemOf(part.choice)}
          error={isMissing(part.choice) ? unknownSystem : faults.parts.get(index)}
          onChange={(next) => flask.setPart(index, next)}
          onRemove={() => flask.removePart(index, systemOf(part.choice)?.title ?? 'The component')}
        />
      ))}
      <AddComponent parts={parts} onAdd={flask.addPart} />
      <View style={[styles.block, { borderTopColor: colours.rule }]}>
        <View style={styles.row}>
          <View style={styles.cell}>
            <QuantityField
              label="Strong acid"
              asked={concentrationAsked}
              value={state.strongAcid}
              onChange={(strongAcid) => change({ strongAcid })}
              help="as HCl"
              error={faults.strongAcid}
            />
          </View>
          <View style={styles.cell}>
            <QuantityField
              label="Strong base"
              asked={concentrationAsked}
              value={state.strongBase}
              onChange={(strongBase) => change({ strongBase })}
              help="as NaOH"
              error={faults.strongBase}
            />
          </View>
        </View>
        {electrolytes.map((part, index) => (
          <ElectrolyteRow
            key={`${flask.generation} ${index}`}
            part={part}
            error={faults.electrolytes.get(index)}
            onChange={(next) => flask.setElectrolyte(index, next)}
            onRemove={() => flask.removeElectrolyte(index)}
          />
        ))}
        <View style={styles.start}>
          <Button
            kind="quiet"
            icon="plus"
            label="Add a salt"
            disabled={electrolytes.length >= electrolytesAtMost}
            why={`A flask has at most ${electrolytesAtMost} salts here.`}
            onPress={() =>
              flask.addElectrolyte({ name: 'NaCl', concentration: firstConcentration })
            }
          />
        </View>
        <Checkbox
          label="Open to air"
          help="Carbon dioxide comes and goes with the air over it."
          checked={air !== undefined}
          onChange={(open) => change({ air: open ? airOfToday : undefined })}
        />
        {air !== undefined && (
          <QuantityField
            label="Carbon dioxide in the air"
            asked={pressureAsked}
            value={air}
            onChange={(next) => change({ air: next })}
            help="42.6 Pa is 420 µatm, as in the air of today."
            error={faults.air}
          />
        )}
      </View>
      <MixtureConditions {...mixture} />
    </View>
  );
}

const styles = StyleSheet.create({
  inputs: { gap: space[1] },
  head: { flexDirection: 'row', justifyContent: 'space-between', alignItems: 'baseline' },
  block: { borderTopWidth: 1, paddingTop: space[3], marginTop: space[2], gap: space[2] },
  row: { flexDirection: 'row', gap: space[3] },
  cell: { flex: 1, minWidth: 0 },
  start: { alignItems: 'flex-start' },
});
