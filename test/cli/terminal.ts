/** Runs commands in this process, on files held in memory over those of the disk, and keeps what they say. */
import { readFileSync } from 'node:fs';
import type { Io } from '../../src/cli/io.ts';
import { run } from '../../src/cli/run.ts';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';

export interface Heard {
  readonly code: number;
  readonly out: string;
  readonly errors: string[];
}

/** A terminal that listens; what is written to files goes into `files`. Files under /dev cannot be written. */
function listener(files: Record<string, string>) {
  const said = { out: '', errors: '' };
  const io: Io = {
    version: '9.8.7',
    readText: (path) => files[path] ?? readFileSync(path, 'utf8'),
    writeText: (path, text) => {
      if (path.startsWith('/dev/')) throw new Error('no such place');
      files[path] = text;
    },
    solver: () => loadHighs(),
    write: (text) => {
      said.out += text;
    },
    error: (text) => {
      said.errors += text;
    },
  };
  const heard = (code: number): Heard => ({
    code,
    out: said.out,
    errors: said.errors.split('\n').slice(0, -1),
  });
  return { io, heard };
}

/** For the commands that answer at once. */
export function heard(args: readonly string[], files: Readonly<Record<string, string>> = {}): Heard {
  const { io, heard } = listener({ ...files });
  const code = run(args, io);
  if (typeof code !== 'number') throw new Error('this command answers later');
  return heard(code);
}

/** For those that load the solver; `files` takes what they write. */
export async function heardLater(
  args: readonly string[],
  files: Record<string, string> = {},
): Promise<Heard> {
  const { io, heard } = listener(files);
  return heard(await run(args, io));
}
