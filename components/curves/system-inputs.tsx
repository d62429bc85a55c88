import { StyleSheet, View } from 'react-native';
import { Notice } from '../ui/notice';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { ConstantsEditor } from './constants-editor';
import { ConstantsList } from './constants-list';
import { exampleOf } from './curves-state';
import { SystemChoice } from './system-choice';
import type { Curves } from './use-curves';

/** The system: chosen or typed, with its constants and where they are from. */
export function SystemInputs(curves: Curves) {
  const { state, drawn, editing, typeOwn } = curves;
  const example = exampleOf(state.choice);
  const warnings = drawn?.choice === state.choice ? drawn.answer.model.warnings : [];
  return (
    <View style={styles.inputs}>
      <SystemChoice {...curves} />
      {example ? (
        <ConstantsList example={example} onTypeOwn={typeOwn} />
      ) : (
        <ConstantsEditor {...editing} />
      )}
      <Words kind="help">Constants are taken as given: nothing is corrected for the medium.</Words>
      {warnings.map(({ message, pointer }) => (
        <Notice key={`${pointer} ${message}`} tone="warn" title="Computed as given">
          {message}
        </Notice>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({ inputs: { gap: space[3] } });
