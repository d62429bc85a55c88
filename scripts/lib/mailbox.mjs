import { once } from 'node:events';
import { readMail } from './read-mail.mjs';

const largest = 1_000_000;

/**
 * An SMTP server on the loopback address that keeps what it is given and sends nothing on.
 * `take(mail)` gets each mail, `{ from, to, headers, subject, text }`, before the sender hears that
 * it was taken; where it throws, it was not, and the error's `responseCode` says why.
 */
export async function openMailbox(take) {
  // Packages may have been installed by this very command.
  const { SMTPServer } = await import('smtp-server');
  const server = new SMTPServer({
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: largest,
    closeTimeout: 1_000,
    onData: (stream, { envelope }, callback) => {
      const chunks = [];
      stream.on('data', (chunk) => chunks.push(chunk));
      stream.on('end', () => {
        const from = envelope.mailFrom && envelope.mailFrom.address;
        const to = envelope.rcptTo.map(({ address }) => address);
        Promise.resolve({ from, to, ...readMail(Buffer.concat(chunks)) })
          .then(take)
          .then(() => callback(), callback);
      });
    },
  });
  // A sender that breaks off is the sender's affair.
  server.on('error', () => {});
  await once(server.listen(0, '127.0.0.1'), 'listening');
  return {
    url: `smtp://127.0.0.1:${server.server.address().port}`,
    close: () => new Promise((resolve) => server.close(resolve)),
  };
}
