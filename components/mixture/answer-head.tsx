import { useHasFaultyField } from '../conditions/faulty-fields';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { Raised } from '../ui/raised';
import { space, useTheme } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { useLong } from '../ui/use-settled';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import type { Mixture } from './use-mixture';
import { shownAmount, shownCapacity, shownPerDegree, shownPH, shownShift } from './rounded';

/** The pH, large, and what goes with it. */
export function AnswerHead({
  answered,
  call,
  trialPH,
}: Pick<Mixture, 'answered' | 'call' | 'trialPH'>) {
  const { colours } = useTheme();
  const { rail, readOutAside } = useLayout();
  const isLate = useLong(call.isFetching);
  const isUnread = useHasFaultyField();
  const isOld = call.error !== null || isUnread;
  if (!answered) return null;
  const { answer } = answered;
  const concentrationPH = shownPH(answer.pHOfConcentration);
  return (
    <View style={[styles.head, rail && styles.wide, { borderBottomColor: colours.edge }]}>
      <View>
        <Words kind="label" tone={isOld ? 'warn' : 'ink'}>
          {isOld
            ? 'pH of the mixture before'
            : isLate
              ? 'pH of this mixture is coming'
              : 'pH of this mixture'}
        </Words>
        <Numerals size={64} tone="well">
          {shownPH(answer.pH)}
        </Numerals>
      </View>
      <View style={[styles.facts, readOutAside && styles.beside]}>
        {concentrationPH !== shownPH(answer.pH) && (
          <Fact label={<MinusLgC />} value={concentrationPH} unit="of concentration" />
        )}
        <Fact label="ionic strength" value={shownAmount(answer.ionicStrengthUsed)} unit="mol/L" />
        <Fact
          label="buffer capacity"
          value={shownCapacity(answer.bufferCapacity)}
          unit="mmol/L per pH"
        />
        <Fact
          label="temperature"
          value={
            answer.temperatureCoefficient === null
              ? undefined
              : shownPerDegree(answer.temperatureCoefficient)
          }
          unit={answer.temperatureCoefficient === null ? 'not known for all' : 'pH per °C'}
        />
        <Fact
          label="5 mmol/L acid"
          value={trialPH === undefined ? undefined : shownShift(trialPH, answer.pH)}
          unit="pH"
        />
      </View>
    </View>
  );
}

/** −lg c(H⁺). */
export const MinusLgC = () => (
  <>
    {'\u2212lg '}
    <Quantity of="concentration" />
    (H
    <Raised place="sup">+</Raised>)
  </>
);

interface FactProps {
  readonly label: ReactNode;
  /** Undefined where it is not known. */
  readonly value: string | undefined;
  readonly unit: string;
}

function Fact({ label, value, unit }: FactProps) {
  const { colours } = useTheme();
  return (
    <View style={[styles.fact, { borderLeftColor: colours.rule }]}>
      <Words kind="help">{label}</Words>
      <Numerals size={18}>{value ?? '\u2013'}</Numerals>
      <Words kind="help">{unit}</Words>
    </View>
  );
}

const styles = StyleSheet.create({
  head: { gap: space[4], paddingBottom: space[4], borderBottomWidth: 1 },
  wide: { flexDirection: 'row', alignItems: 'flex-start', gap: space[6] },
  // Level with the large figure where there is one row of them.
  beside: { paddingTop: space[5] },
  facts: {
    flexGrow: 1,
    flexShrink: 1,
    minWidth: 0,
    rowGap: space[3],
    ...webStyle({ display: 'grid', gridTemplateColumns: 'repeat(auto-fit, minmax(104px, 1fr))' }),
  },
  fact: {
    borderLeftWidth: 1,
    paddingLeft: space[3],
    paddingRight: space[1],
  },
});
