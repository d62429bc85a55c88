import type { Ref } from 'react';
import { StyleSheet, View } from 'react-native';
import { ProblemError } from '../../shared/client';
import { Button } from './button';
import { Notice } from './notice';
import { space } from './theme';
import { Words } from './words';

interface FailureProps {
  readonly error: Error;
  readonly onRetry?: () => void;
  readonly ref?: Ref<View>;
}

/** What the service refused, in its own words, or that it could not be reached. */
export function Failure({ error, onRetry, ref }: FailureProps) {
  // Anything else is a fault of ours: the place fails and says so.
  if (!(error instanceof ProblemError)) throw error;
  const { problem } = error;
  const wait = problem.status === 429 || problem.status === 503;
  return (
    <Notice
      ref={ref}
      tone={wait ? 'warn' : 'bad'}
      title={problem.title}
      requestId={problem.requestId}
    >
      {reasonsOf(error).map((reason) => (
        <Words key={reason}>{reason}</Words>
      ))}
      {onRetry && (
        <View style={styles.again}>
          <Button label="Try again" onPress={onRetry} />
        </View>
      )}
    </Notice>
  );
}

function reasonsOf({ problem }: ProblemError): string[] {
  if (problem.status === 0) return ['Check the connection, then try again.'];
  const faults = problem.errors?.map(({ detail }) => detail) ?? [];
  return [...new Set([problem.detail, ...faults])].filter((reason) => reason !== undefined);
}

const styles = StyleSheet.create({
  again: { marginTop: space[2] },
});
