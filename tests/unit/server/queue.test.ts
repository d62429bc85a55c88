import { Queue } from '../../../server/services/queue';

/** Work that ends when told to. */
function work() {
  let end = () => {};
  const ended = new Promise<void>((resolve) => {
    end = resolve;
  });
  return { run: () => ended, end };
}
/** Every promise that can go on has gone on. */
const settled = () => new Promise((resolve) => setImmediate(resolve));
const mostWaiting = 36_000_000;
const here = () => new AbortController().signal;

test('so many work at once, others of the same cost in the order they came', async () => {
  const queue = new Queue({ places: 2, mostWaiting });
  const started: number[] = [];
  const works = [0, 1, 2, 3].map(work);
  const runs = works.map(({ run }, i) =>
    queue.run(1, here(), () => {
      started.push(i);
      return run();
    }),
  );
  await settled();
  expect(started).toEqual([0, 1]);
  works[1]?.end();
  await runs[1];
  await settled();
  expect(started).toEqual([0, 1, 2]);
  for (const { end } of works) end();
  await Promise.all(runs);
  expect(started).toEqual([0, 1, 2, 3]);
});

test('a small call goes before large ones that came first, and a large one after eight such', async () => {
  const queue = new Queue({ places: 1, mostWaiting: 1_000 });
  const started: string[] = [];
  const first = work();
  const busy = queue.run(1, here(), first.run);
  const enter = (name: string, cost: number) =>
    queue.run(cost, here(), () => {
      started.push(name);
      return Promise.resolve();
    });
  const large = enter('large', 100);
  const small = Array.from({ length: 10 }, (_, i) => enter(`small ${i}`, 1));
  first.end();
  await Promise.all([busy, large, ...small]);
  const eight = Array.from({ length: 8 }, (_, i) => `small ${i}`);
  expect(started).toEqual([...eight, 'large', 'small 8', 'small 9']);
});

test('work that fails gives its place to the next', async () => {
  const queue = new Queue({ places: 1, mostWaiting });
  const failing = queue.run(1, here(), () => Promise.reject(new Error('no')));
  const next = queue.run(1, here(), () => Promise.resolve('done'));
  await expect(failing).rejects.toThrow('no');
  await expect(next).resolves.toBe('done');
});

test('a caller who goes away leaves the queue', async () => {
  const queue = new Queue({ places: 1, mostWaiting });
  const first = work();
  const running = queue.run(1, here(), first.run);
  const gone = new AbortController();
  const never = jest.fn();
  const waiting = queue.run(1, gone.signal, never);
  gone.abort();
  await expect(waiting).rejects.toMatchObject({ code: 'unavailable' });
  first.end();
  await running;
  expect(never).not.toHaveBeenCalled();
});

test('more waiting work than some seconds’ worth is refused', async () => {
  const queue = new Queue({ places: 1, mostWaiting });
  const first = work();
  const running = [queue.run(12_000_000, here(), first.run)];
  for (let i = 0; i < 3; i += 1)
    running.push(queue.run(12_000_000, here(), () => Promise.resolve()));
  const refused = queue.run(1, here(), () => Promise.resolve());
  await expect(refused).rejects.toMatchObject({ code: 'unavailable' });
  first.end();
  await Promise.all(running);
});
