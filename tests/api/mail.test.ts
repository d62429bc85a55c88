import request from 'supertest';
import { issuedKey, type IssuedKey } from '../../shared/keys';
import { demoPeople } from '../../server/services/demo/demo-data';
import { SmtpMailer } from '../../server/services/mail/mailer';
import { PostOffice } from '../../server/services/mail/post-office';
import { startTestMail, type TestMail } from '../support/mail';
import { signedIn, type Signed } from '../support/people';
import { startTestServer, type TestServer } from '../support/server';

let mail: TestMail;
let server: TestServer;
let developer: Signed;
beforeAll(async () => {
  mail = await startTestMail();
  server = await startTestServer({ config: { mail: mail.settings } });
  developer = await signedIn(server, 'developer@larkmoor.example');
});
afterAll(async () => {
  await server.close();
  await mail.close();
});

const issue = async (name = 'lims-nightly'): Promise<IssuedKey> =>
  issuedKey.parse((await developer.post('/v1/keys').send({ name, scopes: ['compute'] })).body);
const revoke = ({ id }: IssuedKey) => developer.post(`/v1/keys/${id}/revocation`);
const header = (wanted: string, index = -1) =>
  mail.taken
    .at(index)
    ?.headers.filter(([name]) => name === wanted)
    .map(([, value]) => value);

test('the admins of the organization are told of a key issued, and nobody else is', async () => {
  const before = mail.taken.length;
  const { publicId, key } = await issue('grüne Küvette');
  const [letter] = (await mail.until(before + 1)).slice(before);
  expect(letter).toMatchObject({
    from: 'notices@stepwell.example',
    to: ['admin@larkmoor.example'],
    subject: `API key stepwell_${publicId}… issued for "Larkmoor Assay"`,
  });
  expect(letter?.text).toContain('"Demo developer" (developer@larkmoor.example) issued');
  expect(letter?.text).toContain('named "grüne Küvette"');
  expect(letter?.text).toContain('From     127.0.0.1');
  expect(letter?.text).toContain(`${server.url}/keys`);
  expect(JSON.stringify(letter)).not.toContain(key.slice(22));
  expect(header('from')).toEqual(['Stepwell <notices@stepwell.example>']);
  expect(header('to')).toEqual(['admin@larkmoor.example']);
  expect(header('auto-submitted')).toEqual(['auto-generated']);
});

test('and of a key revoked, once however often that is asked', async () => {
  const before = mail.taken.length;
  const key = await issue();
  await revoke(key);
  await Promise.all([revoke(key), revoke(key)]);
  await issue('the next');
  const subjects = (await mail.until(before + 3)).slice(before).map(({ subject }) => subject);
  expect(subjects.filter((text) => text.includes(key.publicId)).sort()).toEqual([
    `API key stepwell_${key.publicId}… issued for "Larkmoor Assay"`,
    `API key stepwell_${key.publicId}… revoked for "Larkmoor Assay"`,
  ]);
});

test('each admin gets a mail of their own', async () => {
  await server.database.query(`INSERT INTO memberships VALUES ($1, $2, 'admin')`, [
    demoPeople[3].id,
    demoPeople[0].organizationId,
  ]);
  const before = mail.taken.length;
  await issue();
  const got = (await mail.until(before + 2)).slice(before);
  expect(got.map(({ to }) => to).sort()).toEqual([
    ['admin@larkmoor.example'],
    ['admin@tarnstreet.example'],
  ]);
  await server.database.query(
    'DELETE FROM memberships WHERE person_id = $1 AND organization_id = $2',
    [demoPeople[3].id, demoPeople[0].organizationId],
  );
});

test('an SMTP server that keeps us waiting keeps nobody else waiting', async () => {
  const held: ((code: undefined) => void)[] = [];
  mail.answer = () => new Promise((resolve) => void held.push(resolve));
  const before = mail.taken.length;
  const issued = await issue();
  expect((await revoke(issued)).status).toBe(200);
  expect((await request(server.url).get('/v1/limits')).status).toBe(200);
  expect(mail.taken).toHaveLength(before);
  mail.answer = () => undefined;
  for (const go of held) go(undefined);
  await mail.until(before + 2);
});

/** Rows of the outbox, oldest first. */
const rows = () =>
  server.database.query<
    { attempts: number; next_attempt_at: Date | null; last_error: string | null }[]
  >('SELECT attempts, next_attempt_at, last_error FROM mail_outbox ORDER BY created_at');

describe('a post office', () => {
  let now: Date;
  let warnings: string[];
  const opened: PostOffice[] = [];
  const office = (settings = mail.settings) => {
    const post = new PostOffice({
      database: server.database,
      mailer: new SmtpMailer(settings),
      log: {
        warn: (fields, message) => void warnings.push(`${message} ${JSON.stringify(fields)}`),
      },
      now: () => now,
    });
    opened.push(post);
    return post;
  };
  const letter = { to: 'admin@larkmoor.example', subject: 'Subject', text: 'Text' };
  const leave = (change: object = {}) =>
    office().leave(server.database.manager, [{ ...letter, ...change }]);
  const later = (minutes: number) => {
    now = new Date(now.getTime() + minutes * 60_000);
  };

  // In another decade than the server's own post office, so that it finds none of these due.
  beforeEach(async () => {
    now = new Date('2096-01-01T12:00:00Z');
    warnings = [];
    mail.answer = () => undefined;
    await server.database.query('DELETE FROM mail_outbox');
  });
  afterAll(() => Promise.all(opened.map((post) => post.close())));

  test('sends what was left and keeps nothing of it', async () => {
    const before = mail.taken.length;
    await leave();
    await office().drain();
    expect(mail.taken.slice(before)).toMatchObject([
      { to: [letter.to], subject: 'Subject', text: 'Text\n' },
    ]);
    expect(await rows()).toEqual([]);
  });

  test('sends nothing of an act that did not happen', async () => {
    const before = mail.taken.length;
    const undone = server.database.transaction(async (manager) => {
      await office().leave(manager, [letter]);
      throw new Error('undone');
    });
    await expect(undone).rejects.toThrow('undone');
    await office().drain();
    expect(mail.taken).toHaveLength(before);
  });

  test('beside others sends each mail once', async () => {
    const before = mail.taken.length;
    const subjects = Array.from({ length: 30 }, (_, i) => `Mail ${i}`);
    for (const subject of subjects) await leave({ subject });
    await Promise.all([office(), office(), office()].map((post) => post.drain()));
    const sent = mail.taken.slice(before).map(({ subject }) => subject);
    expect(sent.sort()).toEqual([...subjects].sort());
  });

  test('tries again after 2, 4, 8 … minutes what was refused for now', async () => {
    mail.answer = () => 451;
    await leave();
    const post = office();
    const waits: number[] = [];
    for (let tries = 1; tries <= 9; tries += 1) {
      await post.drain();
      await post.drain();
      const [row] = await rows();
      expect(row?.attempts).toBe(tries);
      const wait = ((row?.next_attempt_at?.getTime() ?? 0) - now.getTime()) / 60_000;
      waits.push(wait);
      later(wait);
    }
    expect(waits).toEqual([2, 4, 8, 16, 32, 64, 128, 240, 240]);
    mail.answer = () => undefined;
    await post.drain();
    expect(await rows()).toEqual([]);
  });

  test('gives a mail up after twelve tries, says so, and forgets it after thirty days', async () => {
    mail.answer = () => 451;
    await leave();
    const post = office();
    for (let tries = 0; tries < 13; tries += 1) {
      await post.drain();
      later(240);
    }
    expect(await rows()).toMatchObject([{ attempts: 12, next_attempt_at: null }]);
    expect(warnings.at(-1)).toMatch(/^mail given up/);
    later(30 * 24 * 60);
    mail.answer = () => 550;
    await leave();
    await post.drain();
    expect(await rows()).toMatchObject([{ attempts: 1, next_attempt_at: null }]);
  });

  test('gives a mail up at once that the server never will take', async () => {
    mail.answer = () => 554;
    await leave();
    await office().drain();
    expect(await rows()).toMatchObject([{ attempts: 1, next_attempt_at: null }]);
  });

  test('goes on trying where the server is away', async () => {
    const away = await startTestMail();
    await away.close();
    await leave();
    await office(away.settings).drain();
    const [row] = await rows();
    expect(row?.next_attempt_at).not.toBeNull();
    expect(row?.last_error).toMatch(/ECONNREFUSED/);
    later(2);
    await office().drain();
    expect(await rows()).toEqual([]);
  });

  test('sends nothing unencrypted to a server that may be another machine', async () => {
    const before = mail.taken.length;
    await leave();
    // The same server under a name of 127.0.0.1 that is not known for one.
    const smtpUrl = mail.settings.smtpUrl.replace('127.0.0.1', '127.1');
    await office({ ...mail.settings, smtpUrl }).drain();
    expect(mail.taken).toHaveLength(before);
    expect((await rows())[0]?.last_error).toMatch(/STARTTLS/);
  });

  test('that died with a mail in its hands leaves it to the next, under the same Message-ID', async () => {
    await leave();
    const dying = office();
    let reached = () => {};
    const arrived = new Promise<void>((resolve) => (reached = resolve));
    const ids: string[] = [];
    mail.answer = ({ headers }) => {
      ids.push(headers.find(([name]) => name === 'message-id')?.[1] ?? '');
      reached();
      return new Promise(() => {});
    };
    const draining = dying.drain();
    await arrived;
    mail.answer = ({ headers }) => {
      ids.push(headers.find(([name]) => name === 'message-id')?.[1] ?? '');
      return undefined;
    };
    await office().drain();
    expect(ids).toHaveLength(1);
    later(2);
    await office().drain();
    expect(ids).toHaveLength(2);
    expect(ids[0]).toMatch(/^<[0-9a-f-]{36}@stepwell\.example>$/);
    expect(ids[1]).toBe(ids[0]);
    for (const post of opened) await post.close();
    await draining;
  });

  test.each([
    'no address',
    'a@b.example, c@d.example',
    'a@b.example\r\nRCPT TO:<c@d.example>',
    'Somebody <a@b.example>',
  ])('sends nothing to %j', async (to) => {
    const before = mail.taken.length;
    await leave({ to });
    await office().drain();
    expect(mail.taken).toHaveLength(before);
    expect(await rows()).toMatchObject([{ next_attempt_at: null, last_error: 'not an address' }]);
  });

  test('lets nobody add a header or a recipient by what is written', async () => {
    const before = mail.taken.length;
    await leave({
      subject: 'x\r\nBcc: all@evil.example\r\n\r\nbody',
      text: 'a\r\n.\r\nMAIL FROM:<x>\n..b',
    });
    await office().drain();
    const [got] = mail.taken.slice(before);
    expect(mail.taken).toHaveLength(before + 1);
    expect(got?.to).toEqual([letter.to]);
    expect(got?.subject).toBe('x Bcc: all@evil.example body');
    expect(got?.headers.map(([name]) => name)).not.toContain('bcc');
    expect(got?.text).toBe('a\n.\nMAIL FROM:<x>\n..b\n');
  });

  test('logs no address and nothing of a mail', async () => {
    mail.answer = () => 451;
    await leave({ text: 'canary' });
    await office().drain();
    expect(warnings).toHaveLength(1);
    expect(warnings.join()).not.toMatch(/larkmoor|canary|Subject/);
  });
});

test('without an SMTP server a key is issued all the same, nothing piles up, and the start says so', async () => {
  const silent = await startTestServer();
  const person = await signedIn(silent, 'developer@larkmoor.example');
  const answer = await person.post('/v1/keys').send({ name: 'quiet', scopes: ['compute'] });
  expect(answer.status).toBe(201);
  expect(await silent.database.query('SELECT * FROM mail_outbox')).toEqual([]);
  expect(silent.logs.join('')).toMatch(/SMTP_URL is not set/);
  await silent.close();
}, 30_000);
