import fc from 'fast-check';
import { silentAlterations } from '../../../server/http/json-text';

const seen = (text: string) => {
  JSON.parse(text);
  return silentAlterations(text).map(({ pointer, code }) => `${pointer} ${code}`);
};

test.each([
  ['{"a":1,"a":2}', ['/a duplicate-field']],
  ['{"a":{"b":1,"c":{"b":1},"b":2}}', ['/a/b duplicate-field']],
  ['[{"a":1},{"a":1,"\\u0061":2}]', ['/1/a duplicate-field']],
  ['{"a/b~":1,"a/b~":2}', ['/a~1b~0 duplicate-field']],
  ['{"digits":1.00000000000000000001}', ['/digits not-a-plain-integer']],
  ['{"digits":[1,1e1]}', ['/digits/1 not-a-plain-integer']],
  ['{"digits":12345678901234567890}', ['/digits not-a-plain-integer']],
])('%s would be altered', (text, faults) => {
  expect(seen(text)).toEqual(faults);
});

test.each([
  '{}',
  '[]',
  '"a"',
  '0',
  '-7',
  '{"a":"b","b":"a"}',
  '{"a":[{"a":1},{"a":1}]}',
  '{"a":"{\\"a\\":1,\\"a\\":2}"}',
  '{"a":"\\\\","b":"]}"}',
  '{"a":1.5,"b":true,"c":null}',
])('%s would not', (text) => {
  expect(seen(text)).toEqual([]);
});

test('whatever JSON.stringify writes of integers and text would not be altered', () => {
  const value = fc.letrec((tie) => ({
    any: fc.oneof(
      fc.string(),
      fc.integer(),
      fc.boolean(),
      fc.array(tie('any'), { maxLength: 4 }),
      fc.dictionary(fc.string(), tie('any'), { maxKeys: 4 }),
    ),
  })).any;
  fc.assert(
    fc.property(value, (any) => silentAlterations(JSON.stringify(any)).length === 0),
    { numRuns: 2_000 },
  );
});
