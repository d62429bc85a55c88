import { axisTicks } from '../../../components/chart/axis-ticks';
import { cursorMove } from '../../../components/chart/cursor-keys';
import { linePath } from '../../../components/chart/line-path';
import { formulaWidth, numeralsWidth } from '../../../components/chart/text-width';
import { wholeSteps } from '../../../components/chart/whole-steps';

const numerals = (domain: [number, number], width: number) =>
  axisTicks(domain, width).flatMap(({ value, numeral }) => (numeral ? [value] : []));

describe('the pH axis', () => {
  test('has a tick each half unit, a longer one each unit, a numeral each unit', () => {
    const ticks = axisTicks([0, 14], 676);
    expect(ticks).toHaveLength(29);
    expect(ticks.filter(({ long }) => long)).toHaveLength(15);
    expect(numerals([0, 14], 676)).toEqual(Array.from({ length: 15 }, (_, i) => i));
  });

  test('has a numeral each two units under 480 px', () => {
    expect(numerals([0, 14], 358)).toEqual([0, 2, 4, 6, 8, 10, 12, 14]);
    expect(numerals([-1, 14], 328)).toEqual([0, 2, 4, 6, 8, 10, 12, 14]);
  });

  test('thins ticks and numerals that would touch', () => {
    expect(numerals([-20, 40], 328)).toEqual([-20, -10, 0, 10, 20, 30, 40]);
    expect(axisTicks([-20, 40], 328)).toHaveLength(61);
  });
});

describe('whole steps of a vertical axis', () => {
  test('are all there where there is room', () => {
    expect(wholeSteps([0, -3], 82)).toEqual([0, -1, -2, -3]);
    expect(wholeSteps([2, -4], 104)).toEqual([2, 1, 0, -1, -2, -3, -4]);
  });

  test('are thinned where there is not, both ends staying', () => {
    expect(wholeSteps([10, -54], 104)).toEqual([10, 0, -10, -20, -30, -40, -54]);
    expect(wholeSteps([1, 0], 60)).toEqual([1, 0]);
  });
});

describe('a line', () => {
  test('lifts the pen where it is told to', () => {
    const point = (x: number, drawn = true) => ({ x, y: x / 3, drawn });
    expect(linePath([point(0), point(1), point(2, false), point(3), point(4)])).toBe(
      'M0,0L1,0.33M3,1L4,1.33',
    );
    expect(linePath([point(0, false)])).toBe('');
  });
});

describe('widths of figures', () => {
  test('every digit takes 0.6 em, a combining mark none', () => {
    expect(numeralsWidth('7.40', 10)).toBeCloseTo(24);
    expect(numeralsWidth('z\u0304', 10)).toBeCloseTo(6);
  });

  test('indices and charges are smaller', () => {
    expect(formulaWidth('HPO4^2-', 10)).toBeCloseTo(6 * 3 + 6 * 0.72 * 3);
  });
});

describe('keys of the cursor', () => {
  test.each([
    ['ArrowRight', false, { by: '0.01', sign: 1 }],
    ['ArrowUp', false, { by: '0.01', sign: 1 }],
    ['ArrowLeft', true, { by: '0.1', sign: -1 }],
    ['ArrowDown', false, { by: '0.01', sign: -1 }],
    ['PageUp', false, { by: '0.5', sign: 1 }],
    ['PageDown', true, { by: '0.5', sign: -1 }],
    ['Home', false, { to: 'start' }],
    ['End', false, { to: 'end' }],
  ] as const)('%s with Shift %s', (key, shift, move) => {
    expect(cursorMove(key, shift)).toEqual(move);
  });

  test('other keys are left to the page', () => {
    for (const key of ['Tab', 'Enter', ' ', 'a']) expect(cursorMove(key, false)).toBeUndefined();
  });
});
