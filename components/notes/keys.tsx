import type { Scope } from '../../shared/scopes';
import { Section } from '../shell/prose';
import { DataTable } from '../ui/data-table';
import { Numerals } from '../ui/numerals';
import { Words } from '../ui/words';

const opens: Readonly<Record<Scope, string>> = {
  compute: 'Everything that computes',
  'systems:read': 'Nothing yet: stored systems, read',
  'systems:write': 'Nothing yet: stored systems, change',
  batches: 'Nothing yet: a thousand rows at once',
  'usage:read': 'Nothing yet: who called how often',
};

/** Where keys come from in this version, and what they are good for. */
export function Keys() {
  return (
    <Section heading="Keys">
      <Words>
        In this version the first start makes one key, for the invented organization Larkmoor Assay,
        and writes it to <Numerals>.local/demo-key</Numerals> on the machine that serves it. Put it
        in the variable:
      </Words>
      <Words>
        <Numerals size={13}>{'export STEPWELL_KEY="$(cat .local/demo-key)"'}</Numerals>
      </Words>
      <DataTable
        caption="What a key’s scopes open"
        columns={[
          { key: 'scope', head: 'Scope' },
          { key: 'opens', head: 'Opens' },
        ]}
        rows={Object.entries(opens).map(([scope, what]) => ({
          scope: <Numerals size={14}>{scope}</Numerals>,
          opens: what,
        }))}
      />
    </Section>
  );
}
