import { useLocalSearchParams } from 'expo-router';
import { useSystem } from '../handbook/handbook-queries';
import { systemTitle } from '../handbook/system-title';
import { Dock } from '../shell/dock';
import { Page } from '../shell/page';
import { Failure } from '../ui/failure';
import { Formula } from '../ui/formula';
import { Notice } from '../ui/notice';
import { Skeleton } from '../ui/skeleton';
import { useLayout } from '../ui/use-layout';
import { useOnline } from '../ui/use-online';
import { Words } from '../ui/words';
import { SystemColumn } from './system-column';
import { SystemDetail } from './system-detail';
import { UnknownSystem } from './unknown-system';
import { UseInCurves } from './use-in-curves';

/** One system: its constants and all that is known of them. */
export function SystemScreen() {
  const { id } = useLocalSearchParams<{ id: string }>();
  return <System key={id} id={id} />;
}

/** The id is not one, or nobody's that this reader may see. */
const isUnknown = (status: number) => status === 404 || status === 400;

function System({ id }: { readonly id: string }) {
  const { data: system, error, isFetching, refetch } = useSystem(id);
  const online = useOnline();
  const { rail } = useLayout();
  if (system) {
    return (
      <SystemColumn>
        <Page
          title={systemTitle(system.name)}
          subtitle={
            system.formula !== null && (
              <Words kind="section" tone="inkSoft">
                <Formula formula={system.formula} />
              </Words>
            )
          }
          actions={rail && <UseInCurves id={system.id} />}
          dock={
            !rail && (
              <Dock>
                <UseInCurves id={system.id} />
              </Dock>
            )
          }
        >
          <SystemDetail system={system} />
        </Page>
      </SystemColumn>
    );
  }
  if (error && isUnknown(error.problem.status)) return <UnknownSystem id={id} />;
  return (
    <SystemColumn>
      <Page title="System">
        {!online ? (
          <Notice tone="warn" title="You are offline">
            This system has not been read yet. It comes when the connection is back.
          </Notice>
        ) : error && !isFetching ? (
          <Failure error={error} onRetry={() => void refetch()} />
        ) : (
          <Skeleton label="Fetching the system" lines={8} />
        )}
      </Page>
    </SystemColumn>
  );
}
