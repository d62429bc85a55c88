import { openMail } from '../../../scripts/lib/mail.mjs';

test('production has no mailbox of its own, and nor has whoever names a server', async () => {
  const none = { variables: {} };
  expect(await openMail({ mode: 'production' })).toEqual(none);
  expect(await openMail({ mode: 'production', smtpUrl: 'smtp://x' })).toEqual(none);
  expect(await openMail({ mode: 'development', smtpUrl: 'smtp://x' })).toEqual(none);
});
