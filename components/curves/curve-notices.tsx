import { StyleSheet, View } from 'react-native';
import { conditionFaults } from '../conditions/condition-faults';
import { Notice } from '../ui/notice';
import { space } from '../ui/theme';
import { useOnline } from '../ui/use-online';
import { FailureNotice } from './failure-notice';
import type { Curves } from './use-curves';

interface CurveNoticesProps {
  readonly curves: Curves;
  /** The fields are in sight and say themselves what is wrong with them. */
  readonly atFields: boolean;
}

/** What stands between the reader and the curve asked for. What is drawn stays. */
export function CurveNotices({ curves, atFields }: CurveNoticesProps) {
  const { faulty, unknown, curve, failed, others, setConditions } = curves;
  const online = useOnline();
  const failure = curve.error ?? curve.failureReason;
  const refused = conditionFaults(failure);
  const saidAtFields =
    atFields && Object.keys(refused.at).length > 0 && refused.elsewhere.length === 0;
  const notices = [
    faulty && (
      <Notice key="faulty" tone="warn" title="Part of this address could not be used">
        What it left open is as on a first visit.
      </Notice>
    ),
    unknown !== undefined && (
      <Notice key="unknown" tone="warn" title={`No system has the id ${unknown}`}>
        Phosphoric acid is drawn in its place. Find yours by name, formula or CAS number.
      </Notice>
    ),
    !online && (
      <Notice key="offline" tone="warn" title="You are offline">
        What is drawn stays. New curves come when the connection is back.
      </Notice>
    ),
    online && failure && !saidAtFields && (
      <FailureNotice
        key="curve"
        failure={failure}
        isFetching={curve.isFetching}
        refetch={curve.refetch}
        onPass={() => setConditions({ outOfRange: 'compute' })}
      />
    ),
    online && failed?.error && (
      <FailureNotice
        key="layer"
        failure={failed.error}
        isFetching={failed.isFetching}
        refetch={failed.refetch}
        title="A layer could not be computed"
      />
    ),
    ...others.map(
      ({ error, refetch }, i) =>
        online &&
        error && (
          <FailureNotice
            key={`beside ${i}`}
            failure={error}
            isFetching={false}
            refetch={refetch}
            title={`Curve ${i + 2} could not be drawn`}
          />
        ),
    ),
  ].filter(Boolean);
  return notices.length === 0 ? null : <View style={styles.notices}>{notices}</View>;
}

const styles = StyleSheet.create({ notices: { gap: space[2] } });
