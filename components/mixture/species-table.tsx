import { View } from 'react-native';
import { WithFormulas } from '../answer/with-formulas';
import { DataTable, type Row } from '../ui/data-table';
import { Formula } from '../ui/formula';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { Words } from '../ui/words';
import type { Answered } from './mixture-queries';
import { shownAmount } from './rounded';
import { shownIons, shownSystems, type ShownSpecies, type ShownSystem } from './shown-mixture';

const concentrationHead = (
  <>
    <Quantity of="concentration" />
    /(mol/L)
  </>
);

const formColumns = [
  { key: 'form', head: 'Form' },
  { key: 'concentration', head: concentrationHead, numeric: true },
  { key: 'fraction', head: <Quantity of="alpha" />, numeric: true },
  { key: 'gamma', head: <Quantity of="activityCoefficient" />, numeric: true },
] as const;

/** On a phone four columns of figures find room at a size smaller. */
const cells = (one: ShownSpecies, size: 13 | 14): Row => {
  const amount = (value: string) => <Numerals size={size}>{shownAmount(value)}</Numerals>;
  return {
    form: <Formula formula={one.formula} size={size} />,
    concentration: amount(one.concentration),
    fraction: amount(one.fraction),
    gamma: amount(one.activityCoefficient),
  };
};

/** Every form in the mixture: one table where there is room, else one a component. */
export function SpeciesTable({ answered }: { readonly answered: Answered }) {
  const { rail } = useLayout();
  const systems = shownSystems(answered);
  if (systems.length === 0) return null;
  if (!rail) {
    return (
      <View style={{ gap: space[4] }}>
        {systems.map((system) => (
          <View key={system.key}>
            <Words kind="button" heading={3}>
              <WithFormulas text={system.title} />
            </Words>
            <DataTable
              caption={`Forms of ${system.title}`}
              hideCaption
              columns={formColumns}
              rows={system.species.map((one) => ({ key: one.formula, ...cells(one, 13) }))}
            />
          </View>
        ))}
      </View>
    );
  }
  return (
    <DataTable
      caption="Forms in the mixture"
      hideCaption
      columns={[{ key: 'component', head: 'Component' }, ...formColumns]}
      rows={systems.flatMap(rowsOf)}
    />
  );
}

/** The name stands once, and is said with each form. */
const rowsOf = ({ key, title, species }: ShownSystem): Row[] =>
  species.map((one, index) => ({
    key: `${key} ${index}`,
    component:
      index === 0 ? (
        <Words>
          <WithFormulas text={title} />
        </Words>
      ) : (
        <span className="only-said">{title}</span>
      ),
    ...cells(one, 14),
  }));

/** The ions beside the components’ forms: those of water, and those that take no part. */
export function IonsTable({ answered }: { readonly answered: Answered }) {
  return (
    <View>
      <Words kind="section" heading={2}>
        Other ions
      </Words>
      <DataTable
        caption="Ions beside the components’ forms"
        hideCaption
        columns={[
          { key: 'ion', head: 'Ion' },
          { key: 'concentration', head: concentrationHead, numeric: true },
          { key: 'gamma', head: <Quantity of="activityCoefficient" />, numeric: true },
        ]}
        rows={shownIons(answered).map(({ ion, concentration, activityCoefficient }, index) => ({
          key: `${ion} ${index}`,
          ion: <Formula formula={ion} size={14} />,
          concentration: shownAmount(concentration),
          gamma: shownAmount(activityCoefficient),
        }))}
      />
    </View>
  );
}
