import { choiceMove, typedOption } from '../../../components/ui/choice-keys';

const press = (key: string, open: boolean, at: number, altKey = false) =>
  choiceMove({ key, altKey }, { open, at }, 12);

describe('a closed choice', () => {
  test.each(['Enter', ' ', 'ArrowDown', 'ArrowUp'])('opens where it stands by “%s”', (key) => {
    expect(press(key, false, 3)).toEqual({
      state: { open: true, at: 3 },
      take: false,
      consumed: true,
    });
  });

  test('opens at an end by Home and End', () => {
    expect(press('Home', false, 3)?.state).toEqual({ open: true, at: 0 });
    expect(press('End', false, 3)?.state).toEqual({ open: true, at: 11 });
  });

  test.each(['Tab', 'Escape', 'a'])('leaves “%s” to the page', (key) => {
    expect(press(key, false, 3)).toBeUndefined();
  });
});

describe('an open choice', () => {
  test.each([
    ['ArrowDown', 3, 4],
    ['ArrowDown', 11, 11],
    ['ArrowUp', 3, 2],
    ['ArrowUp', 0, 0],
    ['PageDown', 5, 11],
    ['PageUp', 5, 0],
    ['Home', 5, 0],
    ['End', 5, 11],
  ])('goes by %s from %i to %i', (key, from, to) => {
    expect(press(key, true, from)).toEqual({
      state: { open: true, at: to },
      take: false,
      consumed: true,
    });
  });

  test('is left as it was by Escape', () => {
    expect(press('Escape', true, 5)).toMatchObject({ state: { open: false }, take: false });
  });

  test.each([
    ['Enter', false, true],
    [' ', false, true],
    ['ArrowUp', true, true],
    ['Tab', false, false],
  ])('takes the option by “%s”, Alt %s; kept from the page: %s', (key, altKey, consumed) => {
    const move = press(key, true, 5, altKey);
    expect(move).toEqual({ state: { open: false, at: 5 }, take: true, consumed });
  });
});

describe('typed letters', () => {
  const labels = ['Acetic acid', 'Carbonic acid', 'Citric acid', 'EDTA', 'Glycine'];
  test.each([
    ['c', 0, 1],
    ['c', 1, 2],
    ['c', 2, 1],
    ['ci', 2, 2],
    ['CI', 0, 2],
    ['e', 4, 3],
    ['x', 0, -1],
  ])('“%s” from %i leads to %i', (typed, from, to) => {
    expect(typedOption(typed, labels, from)).toBe(to);
  });
});
