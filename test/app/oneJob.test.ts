import { expect, test } from 'vitest';
import { OneJob } from '../../src/app/oneJob.ts';
import type { Answer } from '../../src/worker/planClient.ts';

/** A job that answers when the test says so, and the ears of whoever began it. */
function heldJob(one: OneJob<string, number>) {
  let settle: (answer: Answer<string>) => void = () => {};
  let tell: (progress: number) => void = () => {};
  const answer = new Promise<Answer<string>>((resolve) => {
    settle = resolve;
  });
  const heard: unknown[] = [];
  let stops = 0;
  const stop = () => {
    stops++;
    settle({ status: 'stopped' });
  };
  one.begin(
    (each) => {
      tell = each;
      return { answer, stop };
    },
    ({ status }) => heard.push(status),
    (progress) => heard.push(progress),
  );
  const done = () => settle({ status: 'done', value: '' });
  return { heard, done, tell: (progress: number) => tell(progress), stops: () => stops };
}

const later = () => new Promise((resolve) => setTimeout(resolve));

test('progress and answer of the job that runs are heard; then nothing runs', async () => {
  const one = new OneJob<string, number>();
  const job = heldJob(one);
  job.tell(1);
  job.done();
  await later();
  job.tell(2);
  expect(job.heard).toEqual([1, 'done']);
  expect(one.stop()).toBe(false);
  expect(job.stops()).toBe(0);
});

test('stopped, its answer is heard', async () => {
  const one = new OneJob<string, number>();
  const job = heldJob(one);
  expect(one.stop()).toBe(true);
  await later();
  expect([job.heard, job.stops()]).toEqual([['stopped'], 1]);
});

test('of one that is dropped, or followed by another, nothing is heard', async () => {
  const one = new OneJob<string, number>();
  const [first, second] = [heldJob(one), heldJob(one)];
  first.tell(1);
  await later();
  one.drop();
  second.tell(2);
  await later();
  expect([first.heard, first.stops()]).toEqual([[], 1]);
  expect([second.heard, second.stops()]).toEqual([[], 1]);
});
