import { Fragment, type ReactNode } from 'react';
import { space } from './theme';
import { Words } from './words';

export interface Fact {
  readonly term: string;
  readonly value: ReactNode;
}

/** What is known of one thing: a term and its value a line, as a list that is read in pairs. */
export function Facts({ facts }: { readonly facts: readonly Fact[] }) {
  return (
    <dl style={list}>
      {facts.map(({ term, value }) => (
        <Fragment key={term}>
          <dt>
            <Words tone="inkSoft">{term}</Words>
          </dt>
          <dd style={definition}>{typeof value === 'string' ? <Words>{value}</Words> : value}</dd>
        </Fragment>
      ))}
    </dl>
  );
}

const list: React.CSSProperties = {
  display: 'grid',
  gridTemplateColumns: 'minmax(88px, max-content) minmax(0, 1fr)',
  columnGap: space[4],
  rowGap: space[2],
  margin: 0,
};
const definition: React.CSSProperties = { margin: 0, minWidth: 0, overflowWrap: 'anywhere' };
