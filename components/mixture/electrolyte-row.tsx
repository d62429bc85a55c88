import { StyleSheet, View } from 'react-native';
import { QuantityField } from '../conditions/quantity-field';
import { Button } from '../ui/button';
import { Choice } from '../ui/choice';
import { Formula } from '../ui/formula';
import { space } from '../ui/theme';
import { concentrationAsked } from './asked-quantities';
import { electrolyteNames, electrolyteOf, type ElectrolyteName } from './electrolytes';
import type { ElectrolytePart } from './mixture-state';
import { chargeOf } from './salt-formula';

interface ElectrolyteRowProps {
  readonly part: ElectrolytePart;
  readonly onChange: (part: ElectrolytePart) => void;
  readonly onRemove: () => void;
  readonly error: string | undefined;
}

/** What it is, in a word: an inert salt is two ions, a strong acid or base the one that stays. */
function kindOf(name: ElectrolyteName): string {
  const { ions, pairs } = electrolyteOf(name);
  if (pairs !== undefined) return 'strong base, with ion pairs';
  const charge = ions.reduce((sum, { ion, count }) => sum + chargeOf(ion) * count, 0);
  return charge === 0 ? 'inert salt' : charge > 0 ? 'strong base' : 'strong acid';
}

const options = electrolyteNames.map((value) => ({
  value,
  label: value,
  shown: <Formula formula={value} />,
  note: kindOf(value),
}));

/** A salt, or a strong acid or base by name. */
export function ElectrolyteRow({ part, onChange, onRemove, error }: ElectrolyteRowProps) {
  return (
    <View role="group" aria-label={part.name} style={styles.row}>
      <View style={styles.cell}>
        <Choice
          label="Salt"
          options={options}
          value={part.name}
          onChange={(name) => onChange({ ...part, name })}
        />
      </View>
      <View style={styles.cell}>
        <QuantityField
          label="Concentration"
          asked={concentrationAsked}
          value={part.concentration}
          onChange={(concentration) => onChange({ ...part, concentration })}
          error={error}
        />
      </View>
      <View style={styles.remove}>
        <Button
          kind="quiet"
          icon="close"
          hideLabel
          label="Take out"
          about={part.name}
          onPress={onRemove}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', gap: space[3] },
  cell: { flex: 1, minWidth: 0 },
  // Level with the fields, under the height of their labels.
  remove: { marginTop: 24 },
});
