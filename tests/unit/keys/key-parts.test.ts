import { keyParts } from '../../../components/keys/key-parts';
import { makeKey } from '../../../server/services/keys/key-format';

test('the four parts are the key, and only one of them is secret', () => {
  const { key, publicId } = makeKey();
  const parts = keyParts(key);
  expect(parts.map(({ text }) => text).join('')).toBe(key);
  expect(parts.map(({ text }) => text.length)).toEqual([9, 13, 52, 7]);
  expect(parts[1]?.text).toBe(`${publicId}_`);
  expect(parts.filter(({ isSecret }) => isSecret).map(({ name }) => name)).toEqual(['secret']);
});
