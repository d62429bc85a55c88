import { fractionPoints, type FractionPoint } from '../../chem';
import { pointsOf } from '../chemistry/points';
import type { ResolvedRequest } from './resolve';
import { settled } from './systems-used';

const columns = (prefix: string, count: number) =>
  Array.from({ length: count }, (_, index) => `${prefix}_${index}`);

const filled = (values: readonly string[], count: number) => [
  ...values,
  ...Array.from({ length: count - values.length }, () => ''),
];

/**
 * Fractions as RFC 4180 text: a line a system and pH. With several systems the columns are those of
 * the largest one; smaller ones leave the rest empty.
 */
export function fractionsCsv(request: ResolvedRequest): string {
  const systems = settled(request).systems.map(({ effective }) => effective);
  const most = Math.max(...systems.map(({ pKa }) => pKa.length));
  const head = [
    'system',
    'pH',
    ...columns('fraction', most + 1),
    ...columns('neighbour_ratio', most),
    'mean_charge',
    'predominant',
  ];
  const row = (system: number, point: FractionPoint) => [
    system,
    point.pH,
    ...filled(point.fractions, most + 1),
    ...filled(point.neighbourRatios, most),
    point.meanCharge,
    point.predominant,
  ];
  const rows = systems.flatMap((system, index) =>
    fractionPoints(system, pointsOf(request.pH), request.digits).map((point) => row(index, point)),
  );
  return [head, ...rows].map((cells) => `${cells.join(',')}\r\n`).join('');
}
