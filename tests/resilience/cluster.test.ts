import { once } from 'node:events';
import { chmod, mkdtemp, readdir, rm } from 'node:fs/promises';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Client } from 'pg';
import { runScript, type Command } from './checkout';

interface Found {
  readonly pid: number;
  readonly port: number;
  readonly attached: boolean;
  readonly setAsideTo?: string;
  readonly url: string;
}

const fixture = path.join(__dirname, 'fixtures', 'cluster.mjs');
const password = 'first-password';
let folder: string;
let place: string;

beforeAll(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'stepwell cluster '));
  // The cluster's own user must get through, when that is not us.
  await chmod(folder, 0o755);
  place = path.join(folder, 'pg');
});

afterAll(() => rm(folder, { recursive: true, force: true }));

async function open(secret = password, usualPort = 0): Promise<{ run: Command; found: Found }> {
  const run = runScript({ folder }, [fixture, place, secret, String(usualPort)]);
  await run.says('\n');
  if (!run.output().startsWith('{')) throw new Error(run.output());
  return { run, found: JSON.parse(run.output()) as Found };
}

const stop = async ({ child, ended }: Command) => {
  child.kill('SIGTERM');
  expect(await ended).toBe(0);
};

async function ask(url: string, query: string): Promise<unknown> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    return Object.values((await client.query(query)).rows[0])[0];
  } finally {
    await client.end();
  }
}

test('a cluster in a folder with a space listens on the loopback address and nowhere else', async () => {
  const { run, found } = await open();
  expect(found.attached).toBe(false);
  expect(await ask(found.url, 'SHOW listen_addresses')).toBe('127.0.0.1');
  expect(await ask(found.url, 'SHOW unix_socket_directories')).toBe('');
  await stop(run);
  await expect(ask(found.url, 'SELECT 1')).rejects.toThrow('ECONNREFUSED');
});

test('a cluster opens with its own password alone', async () => {
  const { run, found } = await open();
  const wrong = found.url.replace(password, 'another');
  await expect(ask(wrong, 'SELECT 1')).rejects.toThrow('password authentication failed');
  await stop(run);
});

test('who finds a cluster running attaches to it and leaves it running', async () => {
  const first = await open();
  const second = await open();
  expect(second.found).toEqual({ ...first.found, attached: true });
  await stop(second.run);
  expect(await ask(first.found.url, 'SELECT 1')).toBe(1);
  await stop(first.run);
});

test('a cluster whose usual port is taken takes another one', async () => {
  const squatter = createServer().listen(0, '127.0.0.1');
  await once(squatter, 'listening');
  const { port } = squatter.address() as AddressInfo;
  const { run, found } = await open(password, port);
  expect(found.port).not.toBe(port);
  expect(await ask(found.url, 'SELECT 1')).toBe(1);
  await stop(run);
  squatter.close();
});

test('a cluster whose password is lost is set aside, not deleted', async () => {
  const { run, found } = await open('second-password');
  expect(found.setAsideTo).toMatch(/^.+pg\.set-aside-\d{14}$/);
  expect(await readdir(String(found.setAsideTo))).toContain('data');
  expect(await ask(found.url, 'SELECT 1')).toBe(1);
  await stop(run);
});
