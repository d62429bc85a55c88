import type { LimitsAnswer } from '../../shared/limits-answer';
import { Section } from '../shell/prose';
import { Button } from '../ui/button';
import { DataTable } from '../ui/data-table';
import { Notice } from '../ui/notice';
import { Numerals } from '../ui/numerals';
import { Skeleton } from '../ui/skeleton';
import { Words } from '../ui/words';
import { useLimits } from './limits-query';

/** What one call may ask for, as the service itself says. */
export function Limits() {
  const { data, error, refetch } = useLimits();
  return (
    <Section heading="Limits">
      {data ? (
        <LimitsInForce limits={data} />
      ) : error ? (
        <Notice tone="bad" title={error.problem.title} requestId={error.problem.requestId}>
          <Words>{error.problem.detail ?? 'The limits could not be fetched.'}</Words>
          <Button label="Try again" onPress={() => void refetch()} />
        </Notice>
      ) : (
        <Skeleton label="Fetching the limits" lines={8} />
      )}
    </Section>
  );
}

function LimitsInForce({ limits }: { readonly limits: LimitsAnswer }) {
  return (
    <>
      <DataTable
        caption="What one call may ask for, checked before any work starts"
        columns={[
          { key: 'what', head: 'What' },
          { key: 'most', head: 'At most', numeric: true },
        ]}
        rows={limitRows(limits)}
      />
      <Words>
        <Numerals size={13}>{limits.cost.formula}</Numerals>
      </Words>
      <Words>
        <Numerals size={13}>{limits.computeUnits.formula}</Numerals>
      </Words>
    </>
  );
}

const grouped = (count: number) => count.toLocaleString('en');
const between = ({ from, to }: { readonly from: string | number; readonly to: string | number }) =>
  `${from} … ${to}`.replaceAll('-', '\u2212');

const limitRows = (limits: LimitsAnswer) => [
  { what: 'Body, bytes', most: grouped(limits.bodyBytes) },
  { what: 'Systems', most: grouped(limits.systems) },
  { what: 'Protons of a system', most: grouped(limits.protons) },
  { what: 'pH points', most: grouped(limits.pHPoints) },
  { what: 'Digits', most: between(limits.digits) },
  { what: 'pH', most: between(limits.pH) },
  { what: 'Constants', most: between(limits.pKa) },
  { what: 'Cost of a call with a key', most: grouped(limits.cost.most) },
  { what: 'Cost of a call without one', most: grouped(limits.cost.mostPublic) },
  { what: 'Calls a minute, each key', most: grouped(limits.callsPerMinute.key) },
  {
    what: 'Calls a minute, each address without key',
    most: grouped(limits.callsPerMinute.address),
  },
];
