/** What was typed after `craft`, made a command, or one sentence on what is wrong with it. */
import { parseArgs } from 'node:util';
import type { UnitSystem } from '../units/units.ts';

export type Command =
  | { readonly kind: 'balance'; readonly file: string; readonly json: boolean; readonly units: UnitSystem }
  | { readonly kind: 'check'; readonly files: readonly string[] }
  | { readonly kind: 'help' }
  | { readonly kind: 'version' }
  | { readonly kind: 'misuse'; readonly why: string };

const OPTIONS = {
  json: { type: 'boolean' },
  units: { type: 'string' },
  help: { type: 'boolean', short: 'h' },
  version: { type: 'boolean' },
} as const;

type Values = ReturnType<typeof split>['values'];

const split = (args: string[]) => parseArgs({ args, options: OPTIONS, allowPositionals: true });

const misuse = (why: string): Command => ({ kind: 'misuse', why });

export function commandOf(args: readonly string[]): Command {
  try {
    const { values, positionals } = split([...args]);
    if (values.help) return { kind: 'help' };
    if (values.version) return { kind: 'version' };
    const [word, ...files] = positionals;
    return named(word, files, values);
  } catch (error) {
    return misuse((error as Error).message.split('. ')[0]!);
  }
}

function named(word: string | undefined, files: string[], values: Values): Command {
  switch (word) {
    case 'balance':
      return balance(files, values);
    case 'check':
      return check(files, values);
    case 'help':
      return { kind: 'help' };
    case undefined:
      return misuse('No command given; allowed: balance, check, help');
    default:
      return misuse(`Unknown command ${JSON.stringify(word)}; allowed: balance, check, help`);
  }
}

function balance(files: string[], { json = false, units = 'metric' }: Values): Command {
  const [file] = files;
  if (file === undefined || files.length > 1) {
    return misuse(`balance takes one craft file; found ${files.length}`);
  }
  if (units !== 'metric' && units !== 'imperial') {
    return misuse(`--units: found ${JSON.stringify(units)}; allowed: metric, imperial`);
  }
  return { kind: 'balance', file, json, units };
}

function check(files: string[], { json, units }: Values): Command {
  if (json !== undefined || units !== undefined) return misuse('check takes no --json and no --units');
  return files.length > 0 ? { kind: 'check', files } : misuse('check takes one craft file or more; found 0');
}
