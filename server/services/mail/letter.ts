/** What a template makes: plain text alone, so that a mail programme has nothing to load or run. */
export interface Letter {
  readonly subject: string;
  readonly text: string;
}

/** A letter and the one mailbox that it goes to. */
export interface Mail extends Letter {
  readonly to: string;
}

/** Whatever ends a line, shows as nothing or turns the direction of writing. */
const unfit = /[\p{Cc}\p{Cs}\p{Zl}\p{Zp}\p{Bidi_Control}]+/gu;

/** Text of somebody else's, on one line. */
export const oneLine = (text: string): string => text.replace(unfit, ' ').trim();

/** A name that somebody typed, so that nobody takes it for a sentence of ours. */
export const quoted = (name: string): string => `"${oneLine(name).replaceAll('"', '’')}"`;

/** A moment to the minute, as every reader takes it alike. */
export const moment = (at: Date): string =>
  `${at.toISOString().slice(0, 16).replace('T', ' ')} UTC`;
