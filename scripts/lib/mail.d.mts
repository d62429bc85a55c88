/** What a command opens for the mail of its server. */
export function openMail(settings: {
  readonly mode: string;
  readonly smtpUrl?: string | undefined;
}): Promise<{ readonly variables: Readonly<Record<string, string>>; readonly url?: string }>;
