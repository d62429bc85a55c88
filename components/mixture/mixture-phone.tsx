import { useHasFaultyField } from '../conditions/faulty-fields';
import { useState } from 'react';
import { StyleSheet, useWindowDimensions, View } from 'react-native';
import { clamp } from '../chart/geometry';
import { ShareSheet } from '../leaving/share-sheet';
import { Dock } from '../shell/dock';
import { Page } from '../shell/page';
import { Button } from '../ui/button';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { FlaskInputs } from './flask-inputs';
import { MixtureResult } from './mixture-result';
import type { Answered } from './mixture-queries';
import { shownAmount, shownCapacity, shownPH } from './rounded';
import { linkTo } from './use-address';
import type { Mixture } from './use-mixture';
import { mixtureRequest, numbersHeld, useMixtureFiles } from './use-mixture-files';

/** Below 900 px: one column, the flask first; the pH stays in sight at the thumb. */
export function MixturePhone({ mixture }: { readonly mixture: Mixture }) {
  const { state, asked, answered } = mixture;
  const window = useWindowDimensions();
  const files = useMixtureFiles(answered, { captioned: false });
  const [sharing, setSharing] = useState(false);
  return (
    <Page
      title="Mixture"
      actions={
        <Button
          kind="quiet"
          icon="share"
          hideLabel
          label="Share"
          onPress={() => setSharing(true)}
        />
      }
      dock={
        answered && (
          <Dock>
            <DockedAnswer answered={answered} isRefused={mixture.call.error !== null} />
          </Dock>
        )
      }
    >
      <View style={styles.column}>
        <FlaskInputs mixture={mixture} />
        <MixtureResult
          mixture={mixture}
          plotHeight={clamp(window.width * 0.8, 260, 400)}
          compact
          figure={files.figure}
        />
      </View>
      <ShareSheet
        open={sharing}
        onClose={() => setSharing(false)}
        link={linkTo(state)}
        save={files.save}
        numbers={numbersHeld}
        request={mixtureRequest(asked, globalThis.location.origin)}
        gives="this mixture"
      />
    </Page>
  );
}

interface DockedAnswerProps {
  readonly answered: Answered;
  /** Of the mixture before: the present one was refused. */
  readonly isRefused: boolean;
}

/** The answer in one line. It is said where it stands in full. */
function DockedAnswer({ answered: { answer }, isRefused }: DockedAnswerProps) {
  const isUnread = useHasFaultyField();
  const isOld = isRefused || isUnread;
  return (
    <View aria-hidden style={styles.answer}>
      <Words kind="section">
        {isOld ? 'pH before ' : 'pH '}
        <Numerals size={24} tone={isOld ? 'inkSoft' : 'well'}>
          {shownPH(answer.pH)}
        </Numerals>
      </Words>
      <View>
        <Words kind="help">
          <Quantity of="ionicStrength" />{' '}
          <Numerals>{shownAmount(answer.ionicStrengthUsed)}</Numerals> mol/L
        </Words>
        <Words kind="help">
          <Quantity of="beta" /> <Numerals>{shownCapacity(answer.bufferCapacity)}</Numerals> mmol/L
          per pH
        </Words>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  column: { width: '100%', maxWidth: 720, alignSelf: 'center', gap: space[6] },
  answer: {
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
    width: '100%',
    maxWidth: 720,
    alignSelf: 'center',
  },
});
