import { StyleSheet } from 'react-native';
import { CurvesLink } from '../curves/curves-link';
import { plainSystem } from '../constants/choice';
import { Empty } from '../ui/empty';
import { Words } from '../ui/words';

/** Nothing is called so, and what to do then. */
export function NoMatch({ query }: { readonly query: string }) {
  return (
    <Empty
      title={`Nothing is called “${query}”`}
      action={
        <CurvesLink choice={{ kind: 'typed', system: plainSystem }} style={styles.link}>
          <Words kind="button" tone="well">
            Type your own constants in Curves
          </Words>
        </CurvesLink>
      }
    >
      Names, aliases, formulas and CAS numbers are searched. Try a part of the name, or the formula
      of one of its forms.
    </Empty>
  );
}

const styles = StyleSheet.create({ link: { paddingVertical: 11 } });
