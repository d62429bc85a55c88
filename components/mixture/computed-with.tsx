import { StyleSheet, View } from 'react-native';
import { modelWords } from '../conditions/activity-models';
import { shownConstant, trueMinus } from '../curves/rounded';
import { basesOf } from '../handbook/bases';
import { BasisInShort } from '../handbook/basis-in-short';
import { systemTitle } from '../handbook/system-title';
import { Disclosure } from '../ui/disclosure';
import { Facts } from '../ui/facts';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import type { Answered } from './mixture-queries';

type Used = Answered['answer']['model']['constantsUsed'][number];

/** Constants, activity model and water as they were computed with, and where they are from. */
export function ComputedWith({ answered: { answer } }: { readonly answered: Answered }) {
  const { constantsUsed, pKw, activityConstants, interactions, conditions, engineVersion, basis } =
    answer.model;
  const used = new Map(constantsUsed.map((one) => [JSON.stringify(one), one]));
  return (
    <Disclosure label="What this was computed with">
      <View style={styles.list}>
        {[...used].map(([key, one]) => (
          <Constants key={key} used={one} />
        ))}
        <Facts
          facts={[
            { term: 'Activity model', value: modelWords[conditions.activityModel].name },
            ...(activityConstants
              ? [
                  {
                    term: 'Its constant A',
                    value: (
                      <Words>
                        <Numerals>{activityConstants.A}</Numerals>. {activityConstants.source}
                      </Words>
                    ),
                  },
                ]
              : []),
            ...(pKw === null ? [] : [{ term: 'Ion product of water', value: <PKw value={pKw} /> }]),
            ...(interactions && interactions.length > 0
              ? [{ term: 'Parameters', value: `${interactions.length} pairs of ions` }]
              : []),
            {
              term: 'Amounts',
              value:
                basis === 'mol/L'
                  ? 'Per litre of solution, taken as per kilogram of water.'
                  : 'Per kilogram of water.',
            },
            { term: 'Engine', value: <Numerals>{engineVersion}</Numerals> },
          ]}
        />
      </View>
    </Disclosure>
  );
}

const PKw = ({ value }: { readonly value: string }) => (
  <Words>
    <Quantity of="pKw" /> = <Numerals>{value}</Numerals> at this temperature and ionic strength 0
  </Words>
);

function Constants({ used }: { readonly used: Used }) {
  const { name, pKa, pKaAtTemperature, constants = [] } = used;
  const list = (values: readonly string[]) => trueMinus(values.map(shownConstant).join(', '));
  return (
    <View>
      <Words kind="button">
        {name === undefined ? 'Your own constants' : systemTitle(name)}{' '}
        <Numerals>{list(pKa)}</Numerals>
      </Words>
      {pKaAtTemperature && (
        <Words kind="help">
          at this temperature <Numerals>{list(pKaAtTemperature)}</Numerals>
        </Words>
      )}
      {basesOf(constants).map((basis) => (
        <BasisInShort key={basis.steps.join()} basis={basis} count={pKa.length} />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({ list: { gap: space[4], maxWidth: 620 } });
