import { mkdir, writeFile } from 'node:fs/promises';
import { makeCheckout, runScript, type Checkout } from './checkout';

const suites = {
  good: "test('one and one', () => expect(1 + 1).toBe(2));",
  wrong:
    "test('one and one', () => expect(1 + 1).toBe(3));\ntest('true', () => expect(true).toBe(true));",
  broken: "throw new Error('this file cannot run');",
  late: "test('true', () => expect(true).toBe(true));\nafterAll(() => { throw new Error('late'); });",
  left: "test.skip('left out', () => expect(1).toBe(1));\ntest('true', () => expect(true).toBe(true));",
};

let checkout: Checkout;

beforeAll(async () => {
  checkout = await makeCheckout();
  await mkdir(checkout.path('tests'));
  for (const [name, text] of Object.entries(suites)) {
    await writeFile(checkout.path('tests', `${name}.test.ts`), `${text}\nexport {};\n`);
  }
});

afterAll(() => checkout.remove());

async function runTests(...args: string[]) {
  const run = runScript(checkout, ['scripts/test.mjs', ...args]);
  const code = await run.ended;
  return { code, line: run.output().trimEnd().split('\n').at(-1) };
}

test('tests that pass end with their number and exit 0', async () => {
  expect(await runTests('good')).toEqual({ code: 0, line: '1 passed, 0 failed' });
});

test('what fails, cannot run, fails late, or is left out is counted, and exits 1', async () => {
  expect(await runTests()).toEqual({ code: 1, line: '4 passed, 3 failed, 1 skipped' });
});

test('no test at all is a failure', async () => {
  expect(await runTests('no-such-file')).toEqual({ code: 1, line: '0 passed, 1 failed' });
});
