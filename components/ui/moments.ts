/** Units of time in seconds, each with the count from which the next one says it better. */
const units = [
  { unit: 'minute', seconds: 60, below: 60 },
  { unit: 'hour', seconds: 3_600, below: 24 },
  { unit: 'day', seconds: 86_400, below: 100 },
  { unit: 'month', seconds: 2_629_746, below: 24 },
  { unit: 'year', seconds: 31_556_952, below: Infinity },
] as const;

const words = new Intl.RelativeTimeFormat('en', { numeric: 'always' });

/** How far `at` lies from `now`, as it is said: "3 minutes ago", "in 90 days", "just now". */
export function momentInWords(at: Date, now: Date): string {
  const away = (at.getTime() - now.getTime()) / 1_000;
  const counted = units.map((unit) => ({ ...unit, count: Math.round(away / unit.seconds) }));
  const best = counted.find(({ count, below }) => Math.abs(count) < below);
  return best && best.count !== 0 ? words.format(best.count, best.unit) : 'just now';
}

const exact = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
  timeZoneName: 'short',
});
const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric' });

/** The moment itself, in the reader's time zone and with it. */
export const exactMoment = (at: Date) => exact.format(at);

/** The day alone, in the reader's time zone. */
export const exactDay = (at: Date) => day.format(at);
