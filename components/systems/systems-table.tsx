import type { SystemSummary } from '../../shared/stored-system';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import { ConstantValues } from './constant-values';
import { SystemLink } from './system-link';
import { WrittenAs } from './written-as';

interface SystemsTableProps {
  readonly systems: readonly SystemSummary[];
  readonly chosen?: string | undefined;
}

/** Systems on a wide screen: a table whose whole row leads to its system. */
export function SystemsTable({ systems, chosen }: SystemsTableProps) {
  const { colours } = useTheme();
  const head: React.CSSProperties = { ...cell, borderBottom: `1px solid ${colours.edge}` };
  const body: React.CSSProperties = { ...cell, borderBottom: `1px solid ${colours.rule}` };
  const chosenRow: React.CSSProperties = {
    backgroundColor: colours.wash,
    boxShadow: `inset 0 3px ${colours.well}`,
  };
  return (
    <table style={table}>
      <caption className="only-said">Systems and their constants</caption>
      <thead>
        <tr>
          <th scope="col" style={head}>
            <Words kind="label" tone="inkSoft">
              Name
            </Words>
          </th>
          <th scope="col" style={{ ...head, ...numeric }}>
            <Words kind="label" tone="inkSoft">
              <Quantity of="firstCharge" />
            </Words>
          </th>
          <th scope="col" style={head}>
            <Words kind="label" tone="inkSoft">
              <Quantity of="pKa" index={1} />, <Quantity of="pKa" index={2} />, …
            </Words>
          </th>
        </tr>
      </thead>
      <tbody>
        {systems.map((system) => (
          <tr
            key={system.id}
            style={{ position: 'relative', ...(system.id === chosen ? chosenRow : {}) }}
          >
            <td style={body}>
              <SystemLink system={system} chosen={system.id === chosen} />
              <WrittenAs system={system} />
            </td>
            <td style={{ ...body, ...numeric }}>
              <Numerals size={14}>{signed(system.fullyProtonatedCharge)}</Numerals>
            </td>
            <td style={body}>
              <ConstantValues pKa={system.pKa} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

const signed = (charge: number) => (charge > 0 ? `+${charge}` : String(charge));

const table: React.CSSProperties = { borderCollapse: 'separate', borderSpacing: 0, width: '100%' };
const cell: React.CSSProperties = {
  textAlign: 'left',
  paddingBlock: space[2],
  paddingInline: space[3],
};
const numeric: React.CSSProperties = { textAlign: 'right', whiteSpace: 'nowrap' };
