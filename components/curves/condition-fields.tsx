import { StyleSheet, View } from 'react-native';
import { ionicStrengthAsked, temperatureAsked } from '../conditions/asked-quantities';
import { conditionFaults } from '../conditions/condition-faults';
import { ModelChoice } from '../conditions/model-choice';
import { QuantityField } from '../conditions/quantity-field';
import { Button } from '../ui/button';
import { Checkbox } from '../ui/checkbox';
import { space } from '../ui/theme';
import { curveModels, type CurveConditions } from './curve-conditions';

interface ConditionFieldsProps {
  readonly conditions: CurveConditions;
  readonly onChange: (part: Partial<CurveConditions>) => void;
  /** What the service refused the curve with. */
  readonly error: Error | null;
}

/** Temperature, ionic strength and activity model of a curve, with what the service said of them. */
export function ConditionFields({ conditions, onChange, error }: ConditionFieldsProps) {
  const { temperature, ionicStrength, activityModel, outOfRange } = conditions;
  const faults = conditionFaults(error);
  // A refusal is a sentence or two: it needs the whole width.
  const beside = !faults.at.temperature && !faults.at.ionicStrength;
  return (
    <View style={styles.fields}>
      <View style={beside ? styles.row : styles.fields}>
        <View style={beside && styles.temperature}>
          <QuantityField
            label="Temperature"
            asked={temperatureAsked}
            value={temperature}
            onChange={(value) => onChange({ temperature: value })}
            error={faults.at.temperature}
          />
        </View>
        <View style={beside && styles.ionicStrength}>
          <QuantityField
            label="Ionic strength"
            asked={ionicStrengthAsked}
            value={ionicStrength}
            onChange={(value) => onChange({ ionicStrength: value })}
            error={faults.at.ionicStrength}
          />
        </View>
      </View>
      {faults.passable && (
        <View style={styles.pass}>
          <Button
            label="Compute all the same"
            onPress={() => onChange({ outOfRange: 'compute' })}
          />
        </View>
      )}
      <ModelChoice
        models={curveModels}
        value={activityModel}
        onChange={(value) => onChange({ activityModel: value })}
        error={faults.at.activityModel}
      />
      {outOfRange === 'compute' && (
        <Checkbox
          label="Compute beyond range"
          help="What is beyond its range is said beside the curve."
          checked
          onChange={() => onChange({ outOfRange: 'refuse' })}
        />
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  fields: { gap: space[2] },
  row: { flexDirection: 'row', gap: space[2] },
  temperature: { flex: 2, minWidth: 0 },
  ionicStrength: { flex: 3, minWidth: 0 },
  pass: { alignItems: 'flex-start' },
});
