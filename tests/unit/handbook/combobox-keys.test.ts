import { comboboxMove, inText } from '../../../components/handbook/combobox-keys';

const key = (name: string, altKey = false) => ({ key: name, altKey });
const closed = { open: false, at: inText };
const openAt = (at: number) => ({ open: true, at });

describe('keys of an editable combobox', () => {
  test('Down opens the list at its first option, Up at its last', () => {
    expect(comboboxMove(key('ArrowDown'), closed, 4)).toEqual({ state: openAt(0), take: false });
    expect(comboboxMove(key('ArrowUp'), closed, 4)).toEqual({ state: openAt(3), take: false });
  });

  test('Alt and Down open it and stay in the text; Alt and Up close it', () => {
    expect(comboboxMove(key('ArrowDown', true), closed, 4)?.state).toEqual(openAt(inText));
    expect(comboboxMove(key('ArrowUp', true), openAt(2), 4)?.state).toEqual(closed);
    expect(comboboxMove(key('ArrowUp', true), closed, 4)).toBeUndefined();
  });

  test('arrows go round', () => {
    expect(comboboxMove(key('ArrowDown'), openAt(inText), 4)?.state).toEqual(openAt(0));
    expect(comboboxMove(key('ArrowDown'), openAt(1), 4)?.state).toEqual(openAt(2));
    expect(comboboxMove(key('ArrowDown'), openAt(3), 4)?.state).toEqual(openAt(0));
    expect(comboboxMove(key('ArrowUp'), openAt(0), 4)?.state).toEqual(openAt(3));
    expect(comboboxMove(key('ArrowUp'), openAt(inText), 4)?.state).toEqual(openAt(3));
  });

  test('Enter takes the option the keys are at, and nothing where they are in the text', () => {
    expect(comboboxMove(key('Enter'), openAt(2), 4)).toEqual({
      state: { open: false, at: 2 },
      take: true,
    });
    expect(comboboxMove(key('Enter'), openAt(inText), 4)).toBeUndefined();
    expect(comboboxMove(key('Enter'), closed, 4)).toBeUndefined();
  });

  test('Escape closes the list; where it is closed, Escape is the page’s', () => {
    expect(comboboxMove(key('Escape'), openAt(2), 4)).toEqual({ state: closed, take: false });
    expect(comboboxMove(key('Escape'), closed, 4)).toBeUndefined();
  });

  test.each(['Home', 'End', 'ArrowLeft', 'Tab', 'a', ' '])('%j is the text’s own', (name) => {
    expect(comboboxMove(key(name), openAt(2), 4)).toBeUndefined();
  });
});
