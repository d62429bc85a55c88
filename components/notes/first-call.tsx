import { View } from 'react-native';
import { firstCall } from '../keys/first-call';
import { Section } from '../shell/prose';
import { Button } from '../ui/button';
import { CodeBlock } from '../ui/code-block';
import { Numerals } from '../ui/numerals';
import { useCopy } from '../ui/use-copy';
import { Words } from '../ui/words';

/** A call that works as it is copied, against the service that shows it. */
export function FirstCall() {
  const copy = useCopy();
  const code = firstCall(window.location.origin, '$STEPWELL_KEY');
  return (
    <Section heading="A first call">
      <Words>
        Which forms of phosphate are there at pH <Numerals>7.4</Numerals>? Decimals are strings, in
        and out: a JSON number would lose digits.
      </Words>
      <CodeBlock label="A first call with curl" code={code} />
      <View style={{ flexDirection: 'row' }}>
        <Button icon="copy" label="Copy the call" onPress={() => copy('Call', code)} />
      </View>
      <Words>
        The answer holds each form’s fraction, the ratios of neighbours, the mean charge, the ranges
        of predominance, and the model behind them: constants, conditions and engine version.
      </Words>
    </Section>
  );
}
