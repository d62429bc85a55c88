import { View } from 'react-native';
import type { Shortcut } from '../../shared/mixtures';
import { WithFormulas } from '../answer/with-formulas';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import type { Answered } from './mixture-queries';
import { componentTitle } from './shown-mixture';

const pKa = <Quantity of="pKa" />;

const rules: Readonly<Record<Shortcut['name'], React.ReactNode>> = {
  'mean-of-two-pKa': <>the mean of two {pKa}</>,
  'logarithmic-buffer-equation': <>pH = {pKa} + lg(base/acid)</>,
  'weak-acid-root': (
    <>
      pH = ½({pKa} {'\u2212'} lg <Quantity of="concentration" />)
    </>
  ),
  'weak-base-root': (
    <>
      pH = ½(
      <Quantity of="pKw" /> + {pKa} + lg <Quantity of="concentration" />)
    </>
  ),
};

/** Which shortcuts of the trade would have been wrong here, by how much, and why. */
export function Shortcuts({ answered: { answer } }: { readonly answered: Answered }) {
  const { shortcuts, components } = answer;
  if (shortcuts.length === 0) return null;
  return (
    <View style={{ gap: space[2], maxWidth: 620 }}>
      <Words kind="section" heading={2}>
        Shortcuts, and how far off
      </Words>
      {shortcuts.map(({ name, concerns, pH, error, why }) => {
        const component = components[concerns];
        return (
          <View key={`${name} ${concerns}`}>
            <Words>
              {component && `${componentTitle(component)}: `}
              {rules[name]} gives pH <Numerals>{pH}</Numerals>, which is <Off error={error} />.
            </Words>
            <Words kind="help">
              <WithFormulas text={why} />
            </Words>
          </View>
        );
      })}
    </View>
  );
}

function Off({ error }: { readonly error: string }) {
  const value = Number(error);
  if (value === 0) return <>right to three decimals</>;
  return (
    <>
      <Numerals>{error.replace('-', '')}</Numerals> too {value > 0 ? 'high' : 'low'}
    </>
  );
}
