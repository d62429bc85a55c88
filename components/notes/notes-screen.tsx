import { Columns } from '../shell/columns';
import { Page } from '../shell/page';
import { Prose } from '../shell/prose';
import { Cautions } from './cautions';
import { Digits } from './digits';
import { Licences } from './licences';
import { ModelNotes } from './model-notes';
import { WhichPH } from './which-ph';

/** What the numbers of the app are worth. */
export function NotesScreen() {
  return (
    <Page title="What these numbers are worth">
      <Columns>
        <Prose>
          <Digits />
          <WhichPH />
          <ModelNotes />
        </Prose>
        <Prose>
          <Cautions />
          <Licences />
        </Prose>
      </Columns>
    </Page>
  );
}
