import { StyleSheet, View } from 'react-native';
import { activityModels } from '../../shared/conditions';
import { ionicStrengthAsked, temperatureAsked } from '../conditions/asked-quantities';
import { ModelChoice } from '../conditions/model-choice';
import { QuantityField } from '../conditions/quantity-field';
import { Checkbox } from '../ui/checkbox';
import { Choice } from '../ui/choice';
import { Disclosure } from '../ui/disclosure';
import { space, useTheme } from '../ui/theme';
import type { Mixture } from './use-mixture';

/** What a given ionic strength begins with where no answer tells one, mol/L. */
const usualIonicStrength = '0.1';

/** Temperature, activity model and ionic strength. */
export function MixtureConditions({
  state,
  answered,
  faults,
  change,
}: Pick<Mixture, 'state' | 'answered' | 'faults' | 'change'>) {
  const { temperature, model, ionicStrength, beyond } = state;
  const { colours } = useTheme();
  const fault = faults.conditions.at.ionicStrength;
  const own = answered?.answer.ionicStrengthOfComposition;
  return (
    <View style={[styles.block, { borderTopColor: colours.rule }]}>
      <View style={styles.row}>
        <View style={styles.cell}>
          <QuantityField
            label="Temperature"
            asked={temperatureAsked}
            value={temperature}
            onChange={(next) => change({ temperature: next })}
            error={faults.conditions.at.temperature}
          />
        </View>
        <View style={styles.cell}>
          <ModelChoice
            models={activityModels}
            value={model}
            onChange={(next) => change({ model: next })}
            error={faults.conditions.at.activityModel}
          />
        </View>
      </View>
      <Choice
        label="Ionic strength"
        options={[
          { value: 'own', label: 'Self-consistent, from all ions' },
          { value: 'given', label: 'Given' },
        ]}
        value={ionicStrength === undefined ? 'own' : 'given'}
        {...(ionicStrength === undefined && fault !== undefined && { error: fault })}
        onChange={(kind) =>
          change({
            ionicStrength:
              kind === 'own' ? undefined : own ? Number(own).toFixed(3) : usualIonicStrength,
          })
        }
      />
      {ionicStrength !== undefined && (
        <QuantityField
          label="Given ionic strength"
          asked={ionicStrengthAsked}
          value={ionicStrength}
          onChange={(next) => change({ ionicStrength: next })}
          help="Sets the activity coefficients alone."
          error={fault}
        />
      )}
      <Disclosure label="More" startsOpen={beyond}>
        <Checkbox
          label="Compute beyond the ranges too"
          help="Those of the activity model and of the constants; the answer then warns."
          checked={beyond}
          onChange={(next) => change({ beyond: next })}
        />
      </Disclosure>
    </View>
  );
}

const styles = StyleSheet.create({
  block: { borderTopWidth: 1, paddingTop: space[3], marginTop: space[2], gap: space[1] },
  row: { flexDirection: 'row', gap: space[3] },
  cell: { flex: 1, minWidth: 0 },
});
