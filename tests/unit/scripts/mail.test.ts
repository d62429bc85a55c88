test('production has no mailbox of its own, and nor has whoever names a server', async () => {
  const { openMail } = await import('../../../scripts/lib/mail.mjs');
  const none = { variables: {} };
  expect(await openMail({ mode: 'production' })).toEqual(none);
  expect(await openMail({ mode: 'production', smtpUrl: 'smtp://x' })).toEqual(none);
  expect(await openMail({ mode: 'development', smtpUrl: 'smtp://x' })).toEqual(none);
});
