import {
  decimalsOf,
  labelsOf,
  type PHPoints,
  valuesOf,
} from '../../../server/chem/forms/ph-points';

const grid = (from: string, step: string, count: number): PHPoints => ({
  kind: 'grid',
  from,
  step,
  count,
});

describe('points', () => {
  test('a list is echoed exactly as written, in its order, repeats and all', () => {
    const values = ['7.40', '-0', '1e-3', '7.4', '7.40'];
    expect(labelsOf({ kind: 'list', values })).toEqual(values);
    expect(valuesOf({ kind: 'list', values }).map((value) => value.toNumber())).toEqual([
      7.4, -0, 0.001, 7.4, 7.4,
    ]);
  });

  test.each([
    ['0', '0.05', ['0.00', '0.05', '0.10']],
    ['7.10', '0.1', ['7.10', '7.20', '7.30']],
    ['-0.1', '1e-1', ['-0.1', '0.0', '0.1']],
    ['-0', '0.5', ['0.0', '0.5', '1.0']],
    ['-20', '1e1', ['-20', '-10', '0']],
    ['1.50e-1', '1', ['0.150', '1.150', '2.150']],
  ])('a grid from %s by %s is written with the places of the finer', (from, step, labels) => {
    expect(labelsOf(grid(from, step, 3))).toEqual(labels);
  });

  test('a grid of 60 decimals is exact to the last point', () => {
    const step = `0.${'0'.repeat(59)}7`;
    expect(labelsOf(grid('0', step, 5001)).at(-1)).toBe(`0.${'0'.repeat(55)}35000`);
  });

  test('a grid of one point needs no sensible step', () => {
    expect(labelsOf(grid('7', '1e400', 1))).toEqual(['7']);
    expect(labelsOf(grid('0e-400', '1', 1))).toEqual([`0.${'0'.repeat(60)}`]);
  });

  test('the longest decimal counts, zeros at its end do not', () => {
    expect(decimalsOf({ kind: 'list', values: ['7.4000', '1e-5'] })).toBe(5);
    expect(decimalsOf(grid('0.25', '0.5', 9))).toBe(2);
  });
});
