import { StyleSheet, View } from 'react-native';
import { ConstantsEditor } from '../constants/constants-editor';
import { space } from '../ui/theme';
import { ConditionFields } from './condition-fields';
import { ConstantsList } from './constants-list';
import { CurveWarnings } from './curve-warnings';
import { isMoved } from './drawn-curve';
import { MovedConstants } from './moved-constants';
import { SystemChoice } from './system-choice';
import type { Curves } from './use-curves';

/** The system, chosen or typed, with its constants, and its conditions. */
export function SystemInputs(curves: Curves) {
  const { state, drawn, curve, editing, typeOwn, setConditions } = curves;
  const { choice, conditions } = state;
  const isDrawn = drawn !== undefined && curve.isOfChoice;
  return (
    <View style={styles.inputs}>
      <SystemChoice {...curves} />
      <CurveWarnings {...curves} />
      {choice.kind === 'typed' ? (
        <>
          <ConstantsEditor {...editing} />
          {isDrawn && isMoved(drawn) && <MovedConstants drawn={drawn} />}
        </>
      ) : (
        isDrawn && <ConstantsList id={choice.id} drawn={drawn} onTypeOwn={typeOwn} />
      )}
      <ConditionFields conditions={conditions} onChange={setConditions} error={curve.error} />
    </View>
  );
}

const styles = StyleSheet.create({ inputs: { gap: space[3] } });
