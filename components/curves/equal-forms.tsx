import { View } from 'react-native';
import { Disclosure } from '../ui/disclosure';
import { Formula } from '../ui/formula';
import { Words } from '../ui/words';
import type { DrawnCurve } from './drawn-curve';
import { ValueRow } from './read-out-row';

/** More meetings than this are behind one press. */
const rowsAtMost = 8;

/** The pH at which each form gives way to the next. */
export function EqualForms({ drawn }: { readonly drawn: DrawnCurve }) {
  const { meetings } = drawn;
  const table = <MeetingsTable drawn={drawn} />;
  return (
    <View>
      <Words kind="section" heading={2}>
        Where forms are equal
      </Words>
      {meetings.length > rowsAtMost ? (
        <Disclosure label={`Show all ${meetings.length}`}>{table}</Disclosure>
      ) : (
        table
      )}
    </View>
  );
}

function MeetingsTable({ drawn: { meetings, formulas } }: { readonly drawn: DrawnCurve }) {
  return (
    <View role="table" aria-label="pH at which two forms are equal">
      {meetings.map(({ before, after, text }) => (
        <ValueRow
          key={after}
          label={
            <Words>
              <Formula formula={formulas[before] ?? ''} /> ={' '}
              <Formula formula={formulas[after] ?? ''} />
            </Words>
          }
          value={text}
        />
      ))}
    </View>
  );
}
