import { StyleSheet, View } from 'react-native';
import { QuantityField } from '../conditions/quantity-field';
import { ConstantsEditor } from '../constants/constants-editor';
import { useConstantsDraft } from '../constants/use-constants-draft';
import { Button } from '../ui/button';
import { Choice } from '../ui/choice';
import { Disclosure } from '../ui/disclosure';
import { FieldMessage } from '../ui/field-message';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import { concentrationAsked } from './asked-quantities';
import { broughtOf, counterIonOf, counterIonsFor, usualCounterIon } from './counter-ions';
import { formOf, unchargedForm, type KnownSystem } from './known-system';
import type { WeighedPart as Part } from './mixture-state';
import { saltFormula } from './salt-formula';

interface WeighedPartProps {
  readonly part: Part;
  /** Undefined until it has been read. */
  readonly system: KnownSystem | undefined;
  readonly onChange: (part: Part) => void;
  readonly onRemove: () => void;
  readonly error: string | undefined;
}

/** One acid or base in the flask: as what it was weighed in, with what, how much of it. */
export function WeighedPart({ part, system, onChange, onRemove, error }: WeighedPartProps) {
  const { colours } = useTheme();
  const title = system?.title ?? (part.choice.kind === 'stored' ? part.choice.id : '');
  return (
    <View
      role="group"
      aria-label={title}
      style={[styles.part, { borderBottomColor: colours.rule }]}
    >
      <View style={styles.head}>
        <View style={styles.title}>
          <Words kind="button" heading={3}>
            {title}
          </Words>
        </View>
        <Button
          kind="quiet"
          icon="close"
          hideLabel
          label="Take out"
          about={title}
          onPress={onRemove}
        />
      </View>
      <View style={styles.row}>
        <View style={styles.cell}>
          {system && <FormChoice part={part} system={system} onChange={onChange} />}
        </View>
        <View style={styles.cell}>
          <QuantityField
            label="Concentration"
            asked={concentrationAsked}
            value={part.concentration}
            onChange={(concentration) => onChange({ ...part, concentration })}
          />
        </View>
      </View>
      {system && <CounterIon part={part} system={system} onChange={onChange} />}
      {part.choice.kind === 'typed' && <OwnConstants part={part} onChange={onChange} />}
      {error !== undefined && <FieldMessage id={`${title}-fault`} error={error} />}
    </View>
  );
}

interface FormProps {
  readonly part: Part;
  readonly system: KnownSystem;
  readonly onChange: (part: Part) => void;
}

function FormChoice({ part, system, onChange }: FormProps) {
  const form = formOf(part.form, system);
  const options = system.formulas.map((formula, index) => {
    const charge = system.fullyProtonatedCharge - index;
    const salt = saltFormula(formula, counterIonOf(charge, part.counterIon));
    return {
      value: String(index),
      label: salt,
      shown: <Formula formula={salt} />,
      note: index === 0 ? 'fully protonated' : `${index} lost`,
    };
  });
  return (
    <Choice
      label="Weighed in as"
      options={options}
      value={String(form)}
      onChange={(value) => onChange({ ...part, form: Number(value) })}
    />
  );
}

function CounterIon({ part, system, onChange }: FormProps) {
  const charge = system.fullyProtonatedCharge - formOf(part.form, system);
  if (charge === 0) return null;
  const ion = counterIonOf(charge, part.counterIon);
  const offered = counterIonsFor(charge, unchargedForm(system) !== undefined);
  const options = offered.includes(ion) ? offered : [...offered, ion];
  return (
    <View style={[styles.row, styles.with]}>
      <View style={styles.cell}>
        <Choice
          label="Counter-ion"
          hideLabel
          options={options.map((value) => ({
            value,
            label: value.replace('^', ''),
            shown: (
              <>
                with <Formula formula={value} />
              </>
            ),
          }))}
          value={ion}
          onChange={(value) =>
            onChange({
              ...part,
              counterIon: value === usualCounterIon(charge) ? undefined : value,
            })
          }
        />
      </View>
      <View style={styles.cell}>
        <Words kind="help">
          Brings <Numerals>{broughtOf(charge, ion, part.concentration)}</Numerals> mol/L of{' '}
          <Formula formula={ion} />.
        </Words>
      </View>
    </View>
  );
}

/** The constants of a system of one's own. */
function OwnConstants({ part, onChange }: Omit<FormProps, 'system'>) {
  const editing = useConstantsDraft(part.choice, (choice) => onChange({ ...part, choice }));
  return (
    <Disclosure label="Constants" startsOpen>
      <ConstantsEditor {...editing} />
    </Disclosure>
  );
}

const styles = StyleSheet.create({
  part: { paddingTop: space[2], paddingBottom: space[3], borderBottomWidth: 1 },
  head: { flexDirection: 'row', alignItems: 'center', gap: space[2] },
  title: { flex: 1, minWidth: 0 },
  row: { flexDirection: 'row', gap: space[3] },
  with: { alignItems: 'center' },
  cell: { flex: 1, minWidth: 0 },
});
