import { contextOf, Exact } from '../../../server/chem/decimals/contexts';
import { afterPoint, settleAll, significant } from '../../../server/chem/decimals/settle-all';

const digits = 2;
const loss = 3;

/** Numbers by their exact values, each off by as much as the loss allows; and the precisions used. */
function settled(numbers: readonly { exactly: string; given?: boolean }[], by = 1) {
  const precisions: number[] = [];
  const written = settleAll({
    digits,
    loss,
    at: (precision) => {
      precisions.push(precision);
      return numbers.map(({ exactly, given = false }) => {
        const value = new Exact(exactly);
        const off = `${0.9 * by}e${loss - precision + value.e}`;
        return { value: given ? value : value.plus(off), form: significant(digits), exact: given };
      });
    },
  });
  return { written, precisions };
}

describe('settling all numbers of an answer', () => {
  test('the planned precision decides ordinary ones', () => {
    expect(settled([{ exactly: '0.1234' }, { exactly: '-98765' }])).toEqual({
      written: ['0.12', '-9.9e+4'],
      precisions: [10],
    });
  });

  test('a number as given needs no more digits, tie or not: 0.0275 to two digits', () => {
    const given = { given: true } as const;
    expect(
      settled([
        { exactly: '0.0275', ...given },
        { exactly: '0.0265', ...given },
        { exactly: '0.02650000000000000000000000000000000000000001', ...given },
      ]),
    ).toEqual({ written: ['0.028', '0.026', '0.027'], precisions: [10] });
  });

  test.each([1, -1])('next to a tie precision is doubled until it is passed (%i)', (by) => {
    const above = { exactly: '0.0265000000000001' };
    const below = { exactly: '0.0274999999999999' };
    expect(settled([above, below], by)).toEqual({
      written: ['0.027', '0.027'],
      precisions: [10, 20],
    });
  });

  test.each([1, -1])(
    'a tie that all doublings find is one, and goes to the even digit (%i)',
    (by) => {
      const { written, precisions } = settled([{ exactly: '0.0265' }, { exactly: '0.0275' }], by);
      expect(written).toEqual(['0.026', '0.028']);
      expect(precisions).toEqual([10, 20, 40, 80]);
    },
  );

  test('places after the point of what is smaller than all of them are zeros without a sign', () => {
    const value = new (contextOf(20))('-0.0001');
    expect(settleAll({ digits, loss, at: () => [{ value, form: afterPoint(2) }] })).toEqual([
      '0.00',
    ]);
  });
});
