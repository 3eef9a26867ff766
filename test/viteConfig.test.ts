import { expect, test } from 'vitest';
import config from '../vite.config.ts';

/** What of a warning is told. */
function told(message: string): string[] {
  const heard: string[] = [];
  config.build!.rolldownOptions!.onLog!('warn', { message }, (_, log) => {
    heard.push(typeof log === 'object' ? log.message : String(log));
  });
  return heard;
}

const externalized = (module: string, by: string) =>
  `Module "${module}" has been externalized for browser compatibility, imported by "/${by}". See the guide.`;

test('of what the bundler warns, only the module of Node that HiGHS asks for there is passed over', () => {
  const highs = 'node_modules/highs/build/highs.mjs';
  expect(told(externalized('node:module', highs))).toEqual([]);
  for (const other of [
    externalized('node:fs', highs),
    externalized('node:module', 'src/app/main.tsx'),
    'Some chunks are larger than 1000 kB.',
  ]) {
    expect(told(other)).toEqual([other]);
  }
});
