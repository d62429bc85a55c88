import { placeBeside } from '../../../components/ui/place-beside';

const anchor = (top: number) => ({ left: 16, width: 300, top, bottom: top + 44 });
const window = { innerHeight: 700, innerWidth: 390 };

test('a list lies under its field, as wide as it', () => {
  expect(placeBeside(anchor(100), window)).toEqual({
    left: 16,
    width: 300,
    top: 148,
    bottom: 'auto',
    maxHeight: 544,
  });
});

test('near the foot of the window it lies over it', () => {
  expect(placeBeside(anchor(600), window)).toEqual({
    left: 16,
    width: 300,
    top: 'auto',
    bottom: 104,
    maxHeight: 588,
  });
});

test('with little room on both sides it takes the larger one', () => {
  expect(placeBeside(anchor(80), { ...window, innerHeight: 300 }).top).toBe(128);
  expect(placeBeside(anchor(180), { ...window, innerHeight: 300 }).bottom).toBe(124);
});

test('a wide list moves to the left, and is no wider than the window', () => {
  expect(placeBeside(anchor(100), window, 360)).toMatchObject({ left: 16, width: 360 });
  expect(placeBeside({ ...anchor(100), left: 200 }, window, 360)).toMatchObject({ left: 22 });
  expect(placeBeside(anchor(100), window, 600)).toMatchObject({ left: 8, width: 374 });
});

test('it never reaches out of the window', () => {
  for (let top = 0; top <= 656; top += 1) {
    const { top: from, bottom, maxHeight } = placeBeside(anchor(top), window);
    const start = from === 'auto' ? window.innerHeight - Number(bottom) - maxHeight : from;
    expect(start).toBeGreaterThanOrEqual(0);
    expect(Number(start) + maxHeight).toBeLessThanOrEqual(window.innerHeight);
  }
});
