/** Runs commands in this process, on files held in memory over those of the disk, and keeps what they say. */
import { readFileSync } from 'node:fs';
import { run } from '../../src/cli/run.ts';

export interface Heard {
  readonly code: number;
  readonly out: string;
  readonly errors: string[];
}

export function heard(args: readonly string[], files: Readonly<Record<string, string>> = {}): Heard {
  let out = '';
  let errors = '';
  const code = run(args, {
    version: '9.8.7',
    readText: (path) => files[path] ?? readFileSync(path, 'utf8'),
    write: (text) => {
      out += text;
    },
    error: (text) => {
      errors += text;
    },
  });
  return { code, out, errors: errors.split('\n').slice(0, -1) };
}
