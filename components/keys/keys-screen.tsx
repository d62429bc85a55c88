import { SignedIn } from '../account/signed-in';
import { Page } from '../shell/page';
import { KeysConsole } from './keys-console';
import { NoKeys } from './no-keys';

/** Keys: who calls us, and how do I stop one. */
export function KeysScreen() {
  return (
    <SignedIn otherwise={(answer) => <Page title="Keys">{answer}</Page>}>
      {(who) =>
        who.role === 'scientist' ? (
          <Page title="Keys">
            <NoKeys who={who} />
          </Page>
        ) : (
          <KeysConsole who={who} />
        )
      }
    </SignedIn>
  );
}
