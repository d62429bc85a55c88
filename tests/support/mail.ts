const scripts = () => import('../../scripts/lib/mailbox.mjs');
type Open = Awaited<ReturnType<typeof scripts>>['openMailbox'];
type ReceivedMail = Parameters<Parameters<Open>[0]>[0];

export interface TestMail {
  /** What the server under test is told. */
  readonly settings: { readonly smtpUrl: string; readonly from: string };
  /** All that was taken so far. */
  readonly taken: readonly ReceivedMail[];
  /** Resolves once so many were taken in all. */
  readonly until: (count: number) => Promise<readonly ReceivedMail[]>;
  /** Decides on each mail to come: a code of SMTP refuses it, a promise keeps its sender waiting. */
  answer: (mail: ReceivedMail) => number | undefined | Promise<number | undefined>;
  readonly close: () => Promise<void>;
}

/** A real SMTP server on a free port, whose messages are read here. */
export async function startTestMail(): Promise<TestMail> {
  const { openMailbox } = await scripts();
  const taken: ReceivedMail[] = [];
  const waiting = new Set<() => void>();
  const { url, close } = await openMailbox(async (mail) => {
    const responseCode = await post.answer(mail);
    if (responseCode !== undefined) throw Object.assign(new Error('No'), { responseCode });
    taken.push(mail);
    for (const look of waiting) look();
  });
  const post: TestMail = {
    settings: { smtpUrl: url, from: 'notices@stepwell.example' },
    taken,
    until: (count) =>
      new Promise((resolve) => {
        const look = () => {
          if (taken.length < count) return;
          waiting.delete(look);
          resolve(taken);
        };
        waiting.add(look);
        look();
      }),
    answer: () => undefined,
    close,
  };
  return post;
}
