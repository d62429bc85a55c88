import { owns } from './lifetime.mjs';
import { openMailPage } from './mail-page.mjs';
import { openMailbox } from './mailbox.mjs';
import { step } from './steps.mjs';

/** Messages kept, the oldest going first. */
const kept = 200;

/**
 * Outside production, where no SMTP_URL is given, mail goes to this process and no farther. Answers
 * what the server is told and the address where the messages are read, or neither. The built server
 * has no part of this: production cannot have it by any setting.
 */
export async function openMail({ mode, smtpUrl }) {
  if (mode === 'production' || smtpUrl !== undefined) return { variables: {} };
  const messages = [];
  let url;
  let variables;
  await step('Mail', async () => {
    const mailbox = await openMailbox(({ headers, ...mail }) => {
      messages.push({ at: new Date().toISOString(), ...mail });
      if (messages.length > kept) messages.shift();
    });
    owns({ stop: mailbox.close });
    const page = await openMailPage(messages);
    owns({ stop: page.close });
    url = page.url;
    variables = {
      SMTP_URL: mailbox.url,
      MAIL_FROM: process.env.MAIL_FROM || 'notices@stepwell.example',
    };
    return `kept at ${url}, sent nowhere`;
  });
  return { variables, url };
}
