import { Columns } from '../shell/columns';
import { Page } from '../shell/page';
import { Prose } from '../shell/prose';
import { Descriptions } from './descriptions';
import { FirstCall } from './first-call';
import { Keys } from './keys';
import { Limits } from './limits';

/** How a pipeline calls the service. */
export function ApiScreen() {
  return (
    <Page title="Call it from a pipeline">
      <Columns>
        <Prose>
          <FirstCall />
          <Descriptions />
          <Keys />
        </Prose>
        <Prose>
          <Limits />
        </Prose>
      </Columns>
    </Page>
  );
}
