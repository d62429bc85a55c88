import { exactDay, exactMoment, momentInWords } from '../../../components/ui/moments';

const now = new Date('2026-12-01T12:00:00Z');
const away = (seconds: number) => momentInWords(new Date(now.getTime() + seconds * 1_000), now);
const minute = 60;
const hour = 3_600;
const day = 86_400;

test.each([
  [0, 'just now'],
  [-29, 'just now'],
  [20, 'just now'],
  [-60, '1 minute ago'],
  [-3 * minute, '3 minutes ago'],
  [-59.4 * minute, '59 minutes ago'],
  [-59.6 * minute, '1 hour ago'],
  [-23 * hour, '23 hours ago'],
  [-23.6 * hour, '1 day ago'],
  [-52 * day, '52 days ago'],
  [-400 * day, '13 months ago'],
  [-800 * day, '2 years ago'],
  [6 * day, 'in 6 days'],
  [90 * day - 5, 'in 90 days'],
  [180 * day - 5, 'in 6 months'],
  [365 * day - 5, 'in 12 months'],
])('%d s from now is “%s”', (seconds, words) => {
  expect(away(seconds)).toBe(words);
});

test('a moment can be told exactly, with its zone, and as a day', () => {
  expect(exactMoment(now)).toMatch(/^1 December 2026 at \d\d:\d\d \S+$/);
  expect(exactDay(now)).toBe('1 December 2026');
});
