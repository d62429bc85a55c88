import { StyleSheet, View } from 'react-native';
import { ConstantsEditor } from '../constants/constants-editor';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { ConstantsList } from './constants-list';
import { CurveWarnings } from './curve-warnings';
import { SystemChoice } from './system-choice';
import type { Curves } from './use-curves';

/** The system: chosen or typed, with its constants and where they are from. */
export function SystemInputs(curves: Curves) {
  const { state, drawn, curve, editing, typeOwn } = curves;
  const { choice } = state;
  return (
    <View style={styles.inputs}>
      <SystemChoice {...curves} />
      <CurveWarnings {...curves} />
      {choice.kind === 'typed' ? (
        <ConstantsEditor {...editing} />
      ) : (
        drawn &&
        curve.isCurrent && (
          <ConstantsList id={choice.id} constants={drawn.constants} onTypeOwn={typeOwn} />
        )
      )}
      <Words kind="help">Constants are taken as given: nothing is corrected for the medium.</Words>
    </View>
  );
}

const styles = StyleSheet.create({ inputs: { gap: space[3] } });
