/** The real process: exit codes, streams, standard input, and a reader that stops early. */
import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { sampleText } from '../samples/readSamples.ts';

const root = new URL('../..', import.meta.url);
const tsx = ['node_modules/tsx/dist/cli.mjs', 'src/cli/main.ts'];

const craft = (args: string[], input?: string | Buffer) => {
  const { status, stdout, stderr } = spawnSync(process.execPath, [...tsx, ...args], {
    cwd: root,
    input,
    encoding: 'utf8',
  });
  return { status, stdout, stderr };
};

test('balance of a craft that meets its targets exits 0', () => {
  const { status, stdout, stderr } = craft(['balance', 'samples/school-cylinder.json']);
  expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
  expect(stdout).toMatch(/^School hall cylinder\nFloats level and upright/);
});

test('balance --json of one that misses them exits 1 and is JSON to the last byte', () => {
  const { status, stdout, stderr } = craft(['balance', 'samples/worked-example.json', '--json']);
  expect({ status, stderr }).toEqual({ status: 1, stderr: '' });
  expect(JSON.parse(stdout).rows['lead.mass']).toMatchObject({
    unit: 'kg',
    status: 'solved',
    value: expect.closeTo(0.157117, 6),
  });
});

test('broken input exits 2 and speaks on standard error alone', () => {
  const { status, stdout, stderr } = craft(['check', '-'], '{"steelyard": 99}');
  expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
  expect(stderr).toBe(
    'standard input: steelyard: found 99; allowed: a version up to 3; this file comes from a newer Steelyard\n',
  );
});

test('standard input may begin with a byte order mark, and bytes that are no UTF-8 are answered', () => {
  expect(craft(['check', '-'], `\ufeff${sampleText('micro-round')}`).status).toBe(0);
  expect(craft(['check', '-'], Buffer.from([0xff, 0xfe, 0x00, 0x80])).status).toBe(2);
});

test('--version is that of package.json', () => {
  const { version } = JSON.parse(readFileSync(new URL('package.json', root), 'utf8'));
  expect(craft(['--version']).stdout).toBe(`${version}\n`);
});

test('a reader that has gone is no error, and the exit code is still the craft’s', () => {
  const command = `("${process.execPath}" ${tsx.join(' ')} balance samples/museum-atrium.json; echo "exit $?" >&2) | true`;
  const { stderr } = spawnSync('sh', ['-c', command], { cwd: root, encoding: 'utf8' });
  expect(stderr).toBe('exit 1\n');
});

test('turn from file to exit code, its figures as JSON to the last byte', () => {
  const { status, stdout, stderr } = craft([
    'turn',
    'samples/museum-atrium.json',
    '--vector',
    '-30',
    '--json',
  ]);
  expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
  expect(JSON.parse(stdout).rows['turn.vector']).toMatchObject({
    unit: 'rad',
    status: 'solved',
    value: expect.closeTo(-Math.PI / 6, 12),
  });
});
