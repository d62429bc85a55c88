/** A mail as the loopback SMTP server got it. */
export interface ReceivedMail {
  readonly from: string;
  readonly to: readonly string[];
  readonly headers: readonly (readonly [name: string, value: string])[];
  readonly subject: string;
  readonly text: string;
}

export function openMailbox(
  take: (mail: ReceivedMail) => void | Promise<void>,
): Promise<{ readonly url: string; readonly close: () => Promise<void> }>;
