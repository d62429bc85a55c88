import { exactMoment, momentInWords } from './moments';

interface MomentProps {
  /** ISO 8601, as the API writes it. */
  readonly at: string;
  readonly now: Date;
}

/** A moment in words; the exact one under the pointer, and said after the words. */
export function Moment({ at, now }: MomentProps) {
  const moment = new Date(at);
  const exact = exactMoment(moment);
  return (
    <time dateTime={at} title={exact}>
      {momentInWords(moment, now)}
      <span className="only-said">{`, ${exact}`}</span>
    </time>
  );
}
