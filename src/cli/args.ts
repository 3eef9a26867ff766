/** What was typed after `craft`, made a command, or one sentence on what is wrong with it. */
import { parseArgs } from 'node:util';
import type { UnitSystem } from '../units/units.ts';
import { type PlaceOptions, placeOptions } from './placeOptions.ts';
import { type TurnOptions, turnOptions } from './turnOptions.ts';

export type Command =
  | { readonly kind: 'balance'; readonly file: string; readonly json: boolean; readonly units: UnitSystem }
  | { readonly kind: 'check'; readonly files: readonly string[] }
  | {
      readonly kind: 'plan';
      readonly file: string;
      readonly robust: boolean;
      readonly json: boolean;
      readonly units: UnitSystem;
      /** s */
      readonly timeLimit: number;
      /** Where the planned craft goes; null for nowhere. */
      readonly write: string | null;
    }
  | {
      readonly kind: 'carry';
      readonly file: string;
      readonly json: boolean;
      readonly units: UnitSystem;
      readonly line: string;
    }
  | ({ readonly kind: 'turn'; readonly file: string; readonly json: boolean } & TurnOptions & {
        readonly units: UnitSystem;
      })
  | ({ readonly kind: 'place'; readonly file: string; readonly json: boolean } & PlaceOptions & {
        readonly units: UnitSystem;
      })
  | { readonly kind: 'help' }
  | { readonly kind: 'version' }
  | { readonly kind: 'misuse'; readonly why: string };

const OPTIONS = {
  json: { type: 'boolean' },
  units: { type: 'string' },
  robust: { type: 'boolean' },
  write: { type: 'string' },
  'time-limit': { type: 'string' },
  line: { type: 'string' },
  vector: { type: 'string' },
  throttle: { type: 'string' },
  speed: { type: 'string' },
  planned: { type: 'boolean' },
  all: { type: 'boolean' },
  part: { type: 'string' },
  stations: { type: 'string' },
  csv: { type: 'boolean' },
  help: { type: 'boolean', short: 'h' },
  version: { type: 'boolean' },
} as const;

type Values = ReturnType<typeof split>['values'];

const split = (args: string[]) =>
  parseArgs({ args: withNegatives(args), options: OPTIONS, allowPositionals: true });

/** "--vector -30" is "--vector=-30": the parser would take -30 for an option of its own. */
function withNegatives(args: readonly string[]): string[] {
  const at = args.findIndex((arg, i) => /^--\w+$/.test(arg) && /^-[\d.]/.test(args[i + 1] ?? ''));
  if (at < 0 || args.slice(0, at).includes('--')) return [...args];
  return [...args.slice(0, at), `${args[at]}=${args[at + 1]}`, ...withNegatives(args.slice(at + 2))];
}

const WORDS = 'balance, check, plan, carry, turn, place, help';

/** The options that a command takes besides --help and --version. */
const TAKEN: Readonly<Record<string, readonly string[]>> = {
  balance: ['json', 'units'],
  check: [],
  plan: ['json', 'units', 'robust', 'write', 'time-limit'],
  carry: ['json', 'units', 'line'],
  turn: ['json', 'units', 'vector', 'throttle', 'speed', 'planned', 'all'],
  place: ['json', 'csv', 'units', 'part', 'stations', 'throttle'],
};

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
  if (word === 'help') return { kind: 'help' };
  if (word === undefined) return misuse(`No command given; allowed: ${WORDS}`);
  const taken = Object.hasOwn(TAKEN, word) ? TAKEN[word]! : null;
  if (!taken) return misuse(`Unknown command ${JSON.stringify(word)}; allowed: ${WORDS}`);
  const foreign = Object.keys(values).find((option) => !taken.includes(option));
  if (foreign) return misuse(`${word} takes no --${foreign}`);
  if (word === 'check') return check(files);
  return onOneFile(word as OnOneFile, files, values);
}

type OnOneFile = 'balance' | 'plan' | 'carry' | 'turn' | 'place';

function onOneFile(kind: OnOneFile, files: string[], values: Values): Command {
  const [file] = files;
  if (file === undefined || files.length > 1) {
    return misuse(`${kind} takes one craft file; found ${files.length}`);
  }
  const { json = false, units = 'metric', robust = false, write = null, line = 'keel' } = values;
  if (units !== 'metric' && units !== 'imperial') {
    return misuse(`--units: found ${JSON.stringify(units)}; allowed: metric, imperial`);
  }
  if (kind === 'balance') return { kind, file, json, units };
  if (kind === 'carry') return { kind, file, json, units, line };
  if (kind === 'turn') {
    const options = turnOptions(values);
    return typeof options === 'string' ? misuse(options) : { kind, file, json, units, ...options };
  }
  if (kind === 'place') {
    const options = placeOptions(values);
    return typeof options === 'string' ? misuse(options) : { kind, file, json, units, ...options };
  }
  const timeLimit = Number(values['time-limit'] ?? USUAL_SECONDS);
  if (!(timeLimit > 0 && timeLimit <= MOST_SECONDS)) {
    const found = JSON.stringify(values['time-limit']);
    return misuse(`--time-limit: found ${found}; allowed: seconds above 0 and up to ${MOST_SECONDS}`);
  }
  return { kind, file, json, units, robust, write, timeLimit };
}

const check = (files: string[]): Command =>
  files.length > 0 ? { kind: 'check', files } : misuse('check takes one craft file or more; found 0');

const USUAL_SECONDS = 20;
const MOST_SECONDS = 3600;
