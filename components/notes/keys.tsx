import { offeredScopes, scopeWords } from '../keys/scope-words';
import { Section } from '../shell/prose';
import { DataTable } from '../ui/data-table';
import { Numerals } from '../ui/numerals';
import { TextLink } from '../ui/text-link';
import { Words } from '../ui/words';

/** Where keys come from, and what they are good for. */
export function Keys() {
  return (
    <Section heading="Keys">
      <Words>
        Developers and admins <TextLink href="/keys">issue keys</TextLink>, and revoke them in two
        taps. Put yours in the variable:
      </Words>
      <Words>
        <Numerals size={13}>{"export STEPWELL_KEY='stepwell_…'"}</Numerals>
      </Words>
      <DataTable
        caption="What a key’s scopes open"
        columns={[
          { key: 'scope', head: 'Scope' },
          { key: 'opens', head: 'Opens' },
        ]}
        rows={offeredScopes.map((scope) => ({
          scope: <Numerals size={14}>{scope}</Numerals>,
          opens: scopeWords[scope],
        }))}
      />
    </Section>
  );
}
