import { expect, test } from 'vitest';
import { commandOf } from '../../src/cli/args.ts';
import { heard } from './terminal.ts';

test('options may stand before or after the file, with = or a space', () => {
  const wanted = { kind: 'balance', file: 'a.json', json: true, units: 'imperial' };
  expect(commandOf(['balance', 'a.json', '--json', '--units', 'imperial'])).toEqual(wanted);
  expect(commandOf(['--units=imperial', 'balance', '--json', 'a.json'])).toEqual(wanted);
});

test('metric and readable unless asked otherwise', () => {
  expect(commandOf(['balance', '-'])).toEqual({ kind: 'balance', file: '-', json: false, units: 'metric' });
});

test('after -- a file may begin with a hyphen', () => {
  expect(commandOf(['check', '--', '--odd.json', 'b.json'])).toEqual({
    kind: 'check',
    files: ['--odd.json', 'b.json'],
  });
});

test.each([['help'], ['--help'], ['-h'], ['balance', '--help']])(
  '%s gives the help on standard output',
  (...args) => {
    const { code, out, errors } = heard(args);
    expect(code).toBe(0);
    expect(errors).toEqual([]);
    for (const word of [
      'balance FILE',
      'check FILE',
      '--json',
      '--units',
      '--version',
      'Exit codes',
      'npm run -s craft',
    ]) {
      expect(out).toContain(word);
    }
    for (const line of out.split('\n')) expect(line.length).toBeLessThanOrEqual(80);
  },
);

test('--version gives the version alone', () => {
  expect(heard(['--version'])).toEqual({ code: 0, out: '9.8.7\n', errors: [] });
});

test.each([
  [[], /No command given; allowed: balance, check, plan, carry, turn, place, help/],
  [['balance'], /balance takes one craft file; found 0/],
  [['balance', 'a', 'b'], /balance takes one craft file; found 2/],
  [['check'], /check takes one craft file or more; found 0/],
  [['check', 'a', '--json'], /check takes no --json/],
  [['weigh', 'a'], /Unknown command "weigh"; allowed: balance, check, plan, carry, turn, place, help/],
  [['balance', 'a', '--units', 'stone'], /--units: found "stone"; allowed: metric, imperial/],
  [['balance', 'a', '--units'], /--units/],
  [['balance', 'a', '--robust'], /balance takes no --robust/],
  [['plan', 'a', '--time-limit', '0'], /--time-limit: found "0"; allowed: seconds above 0/],
  [['carry', 'a', 'b'], /carry takes one craft file; found 2/],
  [['balance', 'a', '--loud'], /--loud/],
  [['balance', 'a', '--json=yes'], /--json/],
  [['we\nigh'], /Unknown command/],
])('%j is misuse: one line, exit 2, nothing on standard output', (args, said) => {
  const { code, out, errors } = heard(args);
  expect(code).toBe(2);
  expect(out).toBe('');
  expect(errors).toHaveLength(1);
  expect(errors[0]).toMatch(said);
  expect(errors[0]).toMatch(/Try: npm run -s craft -- help$/);
});
