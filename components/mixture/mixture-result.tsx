import { StyleSheet, View, type View as ViewType } from 'react-native';
import type { Ref } from 'react';
import { Warnings } from '../answer/warnings';
import { Cautions } from '../notes/cautions';
import { Button } from '../ui/button';
import { Disclosure } from '../ui/disclosure';
import { Numerals } from '../ui/numerals';
import { Skeleton } from '../ui/skeleton';
import { space } from '../ui/theme';
import { useCopy } from '../ui/use-copy';
import { useSettled } from '../ui/use-settled';
import { Words } from '../ui/words';
import { AnswerHead } from './answer-head';
import { CapacityPlot } from './capacity-plot';
import { ComputedWith } from './computed-with';
import { describeAnswer } from './describe';
import { mixtureFigures, mixtureRows } from './mixture-csv';
import type { Answered } from './mixture-queries';
import { MixtureNotices } from './mixture-notices';
import { shownAmount, shownPH } from './rounded';
import { Shortcuts } from './shortcuts';
import { IonsTable, SpeciesTable } from './species-table';
import type { Mixture } from './use-mixture';

interface MixtureResultProps {
  readonly mixture: Mixture;
  readonly plotHeight: number;
  readonly compact: boolean;
  readonly figure: Ref<ViewType>;
}

/** The answer: what the pH will be, what holds it there, and what is in the flask. */
export function MixtureResult({ mixture, plotHeight, compact, figure }: MixtureResultProps) {
  const { answered, call, trialPH } = mixture;
  return (
    <View style={styles.result}>
      <MixtureNotices mixture={mixture} />
      {!answered && call.isFetching && <Skeleton label="The pH is being computed" lines={8} />}
      {answered && (
        <>
          <AnswerHead answered={answered} call={call} trialPH={trialPH} />
          <Announced answered={answered} />
          <Warnings warnings={answered.answer.model.warnings} />
          <OtherStates answered={answered} />
          {answered.asked.body.components?.length === 0 && (
            <Words tone="inkSoft">
              Nothing here holds the pH: a trace of carbon dioxide from the air would move it.
            </Words>
          )}
        </>
      )}
      {answered && (
        <>
          <CapacityPlot answered={answered} height={plotHeight} compact={compact} figure={figure} />
          <SpeciesTable answered={answered} />
          <IonsTable answered={answered} />
          <CopyDigits answered={answered} />
          <Shortcuts answered={answered} />
          <View style={styles.foot}>
            <Words kind="help">
              Charge balance closes within <Numerals>{answered.answer.solver.residual}</Numerals>{' '}
              mol/L. A predicted pH is an estimate: calibrate the meter, measure, adjust.
            </Words>
            <Disclosure label="Before you mix">
              <Cautions />
            </Disclosure>
            <ComputedWith answered={answered} />
          </View>
        </>
      )}
    </View>
  );
}

/** A sentence is said once the flask has rested this long, ms. */
const announced = 700;

function Announced({ answered }: { readonly answered: Answered }) {
  const sentence = useSettled(describeAnswer(answered), announced);
  return (
    <div role="status" className="only-said">
      {sentence}
    </div>
  );
}

/** The smallest of several ionic strengths is the answer; the others are told. */
function OtherStates({ answered: { answer } }: { readonly answered: Answered }) {
  return answer.otherIonicStrengths.map(({ ionicStrength, pH }) => (
    <Words key={ionicStrength} tone="inkSoft">
      An ionic strength of <Numerals>{shownAmount(ionicStrength)}</Numerals> mol/L fits too, with pH{' '}
      <Numerals>{shownPH(pH)}</Numerals>.
    </Words>
  ));
}

function CopyDigits({ answered }: { readonly answered: Answered }) {
  const copy = useCopy();
  const text = () =>
    [...mixtureFigures(answered), [], ...mixtureRows(answered)]
      .map((row) => row.join('\t'))
      .join('\n');
  return (
    <View style={styles.start}>
      <Button
        kind="quiet"
        icon="copy"
        label="Copy all digits"
        onPress={() => copy('Answer', text())}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  result: { gap: space[5] },
  start: { alignItems: 'flex-start' },
  foot: { gap: space[2] },
});
