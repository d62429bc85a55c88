import { View } from 'react-native';
import { Formula } from '../ui/formula';
import { Words } from '../ui/words';
import type { DrawnCurve } from './drawn-curve';
import { Folded, rowsAtMost } from './folded';
import { ValueRow } from './read-out-row';

/** The pH at which each form gives way to the next. */
export function EqualForms({ drawn }: { readonly drawn: DrawnCurve }) {
  const { meetings } = drawn;
  return (
    <View>
      <Words kind="section" heading={2}>
        Where forms are equal
      </Words>
      <Folded label={`Show all ${meetings.length}`} fold={meetings.length > rowsAtMost}>
        <MeetingsTable drawn={drawn} />
      </Folded>
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
